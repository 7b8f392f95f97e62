const repair = 'Bleed to zero. The company representative opens a repair round; never tighten under pressure.';

/** Limits of point 11: what may be pumped, whether it held, and that everything is put back. */
export default {
  'target-over-flange': {
    within: 'The test pressure of {measured} is not over the flange’s rating of {max}.',
    outside:
      'The test pressure of {measured} is {by} over the flange’s rating of {max}. It is not pumped: the terms of the job have to change.',
  },
  'target-over-collapse': {
    within: 'The test pressure of {measured} is not over the casing’s collapse of {max}.',
    outside:
      'The test pressure of {measured} is {by} over the casing’s collapse of {max}. It is not pumped: the casing would collapse. The terms of the job have to change.',
  },
  'over-collapse-share': {
    within:
      'Test pressure and highest reading stay at {measured}, not over the {max} that this job lets the casing bear.',
    outside:
      'Test pressure or highest reading is {measured}, {by} over the {max} that this job lets the casing bear. Test lower if the programme lets you, or let the company representative concede it.',
  },
  'over-seal': {
    within: 'Test pressure and highest reading stay at {measured}, not over the seal’s {max}.',
    outside:
      'Test pressure or highest reading is {measured}, {by} over the seal’s rating of {max}. Test lower if the programme lets you, or let the company representative concede it.',
  },
  'highest-collapse': {
    within: 'The highest pressure of {measured} stayed below the casing’s collapse of {max}.',
    outside:
      'The highest pressure of {measured} reached the casing’s collapse of {max}. The casing may have collapsed: bleed to zero, run a gauge through the bore and record it before anything else.',
  },
  'bore-gauged': {
    within: 'The pressure reached the casing’s collapse; a gauge has since passed through the bore.',
    outside: 'The bore has not been gauged. Run a gauge through it before anything else.',
  },
  'hold-usable': {
    within: 'The hold can be judged from its readings.',
    outside:
      'The hold cannot be judged: fewer than two readings lie between its start and its end, or one of them cannot be right. Check the times and the pressures.',
  },
  'hold-lowest': {
    within: 'The pressure never fell below {measured}; the test asks for {min}.',
    outside:
      'The pressure fell to {measured} during the hold, {by} below the {min} of the test. Find out why, pressure up and hold again for the whole time.',
  },
  'hold-drop': {
    within: 'The pressure fell by {measured}; {max} is allowed.',
    outside:
      'The pressure fell by {measured}, {by} more than the {max} allowed. Look for the leak from outside the exclusion, let it settle, and hold again for the whole time.',
  },
  'hold-drop-corrected': {
    within: 'The pressure fell by {measured} beyond what the temperature explains; {max} is allowed.',
    outside:
      'The pressure fell by {measured} beyond what the temperature explains, {by} more than the {max} allowed. Look for the leak from outside the exclusion, and hold again for the whole time.',
  },
  'hold-time': {
    within: 'It was held for {measured}; the test asks for {min}.',
    outside: 'It was held for {measured}, {by} short of {min}. Hold again for the whole time.',
  },
  'hold-covered': {
    within: 'The readings cover the hold from its start to its end.',
    outside:
      'There is no reading within a minute of the start or of the end of the hold. Enter those that were taken, or hold again and read at both ends.',
  },
  leak: {
    within: 'No leak was seen.',
    outside: `A leak was seen. ${repair}`,
  },
  'leak-weld': { within: 'No leak at the weld.', outside: `The weld leaks. ${repair}` },
  'leak-port': {
    within: 'No leak at the port.',
    outside:
      'The port leaks. Bleed to zero, make the fitting up again, and test again from the start; never tighten under pressure.',
  },
  'leak-seal': {
    within: 'No leak at the seal.',
    outside:
      'The seal leaks. Bleed to zero. A seal cannot be got at once the head is welded: the company representative decides what is done.',
  },
  'gauge-range': {
    within: 'The test pressure of {measured} lies in the good part of this gauge, {min} to {max}.',
    outside:
      'The test pressure of {measured} lies {by} outside the good part of a gauge of {scale}, {min} to {max}. Take a gauge whose middle it falls in.',
  },
  'gauge-range-unknown': {
    within: 'The gauge’s full scale is known.',
    outside: 'The full scale of the gauge cannot be right. Read it off its face again.',
  },
  'plug-back': {
    within: 'The plug of port {port} is back.',
    outside:
      'The plug of port {port} is not back. Put it back: until then it stands in somebody’s keeping and the test is not finished.',
  },
  'plug-replaced': {
    within: 'The plug of port {port} is back.',
    outside:
      'The plug of port {port} was lost and another one put in. Show that thread and rating are the same; the company representative decides.',
  },
  'volume-before-nitrogen': {
    within: 'The volume is there, and with it the distance to stand off.',
    outside:
      'The volume with hoses is not there, so nobody knows how far to stand off. Enter it before nitrogen goes in.',
  },
  'exclusion-nitrogen': {
    within: 'The exclusion zone is set.',
    outside: 'No exclusion zone is recorded. No nitrogen before everybody is out of the distance and it is kept clear.',
  },
  'exclusion-oil': {
    within: 'The exclusion zone is set.',
    outside: 'No exclusion zone is recorded. Keep everybody away from fittings and plugs while pressure is on.',
  },
  'port-probed': {
    within: 'The port was probed clear.',
    outside:
      'The port has not been probed clear. Probe it: a port plugged with slag or grease shows a test that never reached the void.',
  },
  'fitting-in': {
    within: 'The test fitting is in.',
    outside: 'The test fitting is not in. Make it up before any pressure.',
  },
};
