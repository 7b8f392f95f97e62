const look = (what: string, doNow: string) => ({
  within: `${what}: none left.`,
  outside: `${what} left in the pass at {clock} o’clock. ${doNow}`,
});
const coldLook = (what: string) => ({
  within: `${what}: none at the cold weld.`,
  outside: `${what} at {clock} o’clock of the cold weld. Repair it in a repair round, or let the company representative concede it.`,
});

/** Limits of points 7 to 10: the plug out, the joint hot, each pass, the weld cold. */
export default {
  'bled-to-zero': {
    within: 'Bled to zero.',
    outside:
      'The pressure has not been bled to zero. Bleed it through the fitting and watch the gauge go to zero; nothing is loosened before.',
  },
  drained: {
    within: 'Drained of the test medium.',
    outside: 'The void has not been drained. Drain it: oil left in it burns and boils under the flame.',
  },
  'plug-out': {
    within: 'The test plug is out.',
    outside:
      'A test plug is still in. Take it out before any heat: what is trapped behind it can crack the head and blow it out.',
  },
  'plug-back-in': {
    within: 'No plug is in port {port}.',
    outside:
      'The plug of port {port} was put back since. No heat while it is in: reopen the hold point of the test plug, take it out and record it again.',
  },
  'tacked-first': {
    within: 'The head is tacked.',
    outside: 'The head has not been tacked. Tack it, then read level, two-hole and height before the arc is struck.',
  },
  'plug-custody': {
    within: 'The plug of port {port} is kept: {where}, held by {holder}.',
    outside: 'Nobody holds the plug of port {port}, or nobody knows where it is. Name the place and the person.',
  },
  'port-clear': {
    within: 'The port is open and clear.',
    outside: 'The port is not clear. Probe it open before any heat; the void must be able to breathe.',
  },
  'bore-covered': {
    within: 'The bore is covered against dropped objects.',
    outside: 'The bore is open to dropped objects. Cover it before work goes on over it.',
  },
  'bore-vented': {
    within: 'The bore is vented.',
    outside: 'The bore is shut tight. Give it a vent so that heat and gas cannot build up under the cover.',
  },
  'excavated-cracks': {
    within: 'No crack is left in the ground-out place.',
    outside:
      'The ground-out place has not been found free of cracks. Take out more, look again, and heat only when none is seen.',
  },
  'preheat-metal': {
    within: 'The metal is {measured}, between {min} and {max}.',
    outside: 'The metal is {measured}, outside {min} to {max} by {by}. Heat it further or let it cool, and read again.',
  },
  'preheat-seal-level': {
    within: 'The seal’s level is {measured}; the seal is rated to {max}.',
    outside:
      'The seal’s level is {measured}, {by} over the seal’s rating of {max}. Take the flame away, let it cool and read again.',
  },
  'preheat-distance': {
    within: 'Read {measured} from the joint, at or beyond {min}.',
    outside: 'Read {measured} from the joint; the rule asks for {min} or more. Read again, {by} farther out or more.',
  },
  'joint-dry': {
    within: 'The joint is dry.',
    outside: 'The joint is wet. Dry it and find where the water comes from: hydrogen from it cracks the weld.',
  },
  'joint-sheltered': {
    within: 'The joint is sheltered.',
    outside: 'The joint stands in wind or rain. Shelter it before any welding.',
  },
  'fluid-still-below-weld': {
    within: 'The fluid stands {measured} below the lowest weld.',
    outside:
      'The fluid stands {measured} below the lowest weld, {by} short of {min}. Lower it and read again: it takes the heat out of the joint.',
  },
  'preheat-advised': {
    within: 'The coldest place is {measured}; this steel’s advice is {min}.',
    outside:
      'The coldest place is {measured}, {by} under the {min} that this steel’s chemistry advises. The procedure governs; ask whoever wrote it.',
  },
  'temps-fresh': {
    within: 'Head and casing were read {measured} before; that stands for {max}.',
    outside:
      'Head and casing were read {measured} ago, {by} more than the {max} allowed. Read both again, then strike the arc.',
  },
  'temps-missing': {
    within: 'Head and casing have been read.',
    outside: 'Head and casing have not both been read. Read them right before the arc is struck.',
  },
  'pass-cold': {
    within: 'The metal is {measured}, not below {min}.',
    outside: 'The metal is {measured}, {by} under the procedure’s {min}. Do not weld: heat it again and read again.',
  },
  'pass-hot': {
    within: 'The metal is {measured}, not over {max}.',
    outside:
      'The metal is {measured}, {by} over the interpass limit of {max}. Wait until it has cooled to the limit and read again.',
  },
  'welders-qualified': {
    within: '{names}: qualified for {process} and in practice.',
    outside:
      '{names}: not qualified for {process}, or more than six months without it. Somebody who is qualified welds this pass; the office can enter a later use of the process.',
  },
  'rods-class': {
    within: 'The rods are {used}, as the procedure asks.',
    outside:
      'The rods are {used}; the procedure asks for {asked}. Put them away and take the right ones; what was laid with them has to come out.',
  },
  'rods-amps': {
    within: 'The current was {measured}, between {min} and {max}.',
    outside:
      'The current was {measured}, outside {min} to {max} by {by}. Set the machine for the rods to come; this row needs a concession or its metal comes out.',
  },
  'rods-volts': {
    within: 'The voltage was {measured}, between {min} and {max}.',
    outside:
      'The voltage was {measured}, outside {min} to {max} by {by}. Mind the arc’s length for the rods to come; this row needs a concession or its metal comes out.',
  },
  'rods-heat-input': {
    within: 'The heat input was {measured}, between {min} and {max}.',
    outside:
      'The heat input was {measured}, outside {min} to {max} by {by}. Check arc time and length first; then change the travel speed for the rods to come.',
  },
  'rods-out-of-oven': {
    within: 'The rods left the oven at {out}, before they were used.',
    outside: 'The rods are said to have left the oven at {out}, after the pass they were used in. Read the time again.',
  },
  'rods-exposure': {
    within: 'The rods were out of the oven for {measured}; {class} may be out for {max}.',
    outside:
      'The rods were out of the oven for {measured}, {by} longer than the {max} that {class} may be out. Put what is left back to dry; this row needs a concession or its metal comes out.',
  },
  'look-porosity': look('Porosity', 'Grind it out and weld it again, or let the company representative concede it.'),
  'look-slag': look(
    'Slag',
    'Chip and grind it out before the next pass covers it, or let the company representative concede it.',
  ),
  'look-overlap': look('Overlap', 'Grind it back to a sound toe, or let the company representative concede it.'),
  'look-arc-strike': look(
    'An arc strike',
    'Grind it smooth and look for cracks, or let the company representative concede it.',
  ),
  'look-crack': look(
    'A crack',
    'Nothing goes over it: take it out to its ends, look again and repair it by the procedure.',
  ),
  'look-crack-repaired': {
    within: 'No crack was repaired.',
    outside:
      'A crack at {clock} o’clock was repaired. Find out why it cracked; the company representative decides whether the pass stands.',
  },
  'cold-look-porosity': coldLook('Porosity'),
  'cold-look-slag': coldLook('Slag'),
  'cold-look-overlap': coldLook('Overlap'),
  'cold-look-arc-strike': coldLook('An arc strike'),
  'cold-look-crack': {
    within: 'No crack at the cold weld.',
    outside:
      'A crack at {clock} o’clock of the cold weld. No test over it: the company representative opens a repair round.',
  },
  undercut: {
    within: 'The deepest undercut is {measured}, at or under {max}.',
    outside:
      'The deepest undercut is {measured}, {by} over {max}. Dress it or fill it by the procedure and measure again.',
  },
  'fillet-leg': {
    within: 'The leg is {measured}; the plan asks for {min}.',
    outside:
      'The leg is {measured}, {by} short of {min} (the procedure’s leg and what the gap adds). Lay more weld by the procedure while it is hot, and measure again.',
  },
  'cooled-last': {
    within: 'The weld is down to {measured}.',
    outside:
      'The weld is still {measured}, {by} over {max}. Leave it covered and read again later; nothing is poured on it.',
  },
  quenched: {
    within: 'It cooled by itself.',
    outside:
      'It was quenched or cooled by force: the weld and the metal beside it may crack now or hours later. Look again after a wait and have the surface examined; the company representative decides.',
  },
  'surface-exam': {
    within: 'The surface examination passed.',
    outside: 'The surface examination failed. No test over it: the company representative opens a repair round.',
  },
};
