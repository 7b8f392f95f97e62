const measureAgain =
  'Have a third person measure without knowing the two; if the three do not settle it, measure all again.';
const neverCut = 'Do not cut more.';

/** Limits of points 2 to 4: the height takeoff, the final cut, the bevel. */
export default {
  'readings-usable': {
    within: 'The readings can be worked with.',
    outside:
      'These readings cannot be right: nothing can be worked out from them. Read them again and type them with their unit.',
  },
  'nameplate-size': {
    within: 'The nameplate says {read}, the size of the job’s head.',
    outside:
      'The nameplate says {read}; the job’s head is {planned}. This is another head: hold the work, and let the office and the company representative settle which one is set.',
  },
  'nameplate-pressure': {
    within: 'The nameplate says {read}, the rating of the job’s head.',
    outside:
      'The nameplate says {read}; the job’s head is rated {planned}. This is another head: hold the work, and let the office and the company representative settle which one is set.',
  },
  'takeoff-agree': {
    within: 'The tapes on the head agree within {max}.',
    outside: `The tapes on the head are {measured} apart, {by} more than the {max} allowed. The drawing’s takeoff stays in force. ${measureAgain}`,
  },
  'takeoff-drawing': {
    within: 'Face to shoulder measures {measured}, the drawing’s {drawing} within tolerance.',
    outside:
      'Face to shoulder measures {measured}; the drawing says {drawing}, and it is {by} outside {min} to {max}. Check that the tape stood square and on the shoulder. If it is so, the head is not as drawn: the mark goes by the measured length, and the company representative decides.',
  },
  'socket-agree': {
    within: 'The tapes in the socket agree within {max}.',
    outside: `The tapes in the socket are {measured} apart, {by} more than the {max} allowed. The drawing’s socket depth stays in force. ${measureAgain}`,
  },
  'socket-drawing': {
    within: 'The socket measures {measured}, the drawing’s {drawing} within tolerance.',
    outside:
      'The socket measures {measured}; the drawing says {drawing}, and it is {by} outside {min} to {max}. Check that the tape stood square and on the shoulder. If it is so, the head is not as drawn: the mark goes by the measured depth, and the company representative decides.',
  },
  'string-height': {
    within: 'The height of the string at the casing is known.',
    outside:
      'The height of the string at the casing cannot be worked out: the casing has to stand between the stakes. Check both heights, the distance between the stakes and the distance from stake A to the casing.',
  },
  'mark-agree': {
    within: 'The two readings of the mark agree within {max}.',
    outside: `The two readings of the mark are {measured} apart, {by} more than the {max} allowed. No cut before they agree. ${measureAgain}`,
  },
  'mark-computed': {
    within: 'The mark stands at {measured} from the string, the computed {mark} within tolerance.',
    outside:
      'The mark stands at {measured} from the string; computed is {mark}, and it is {by} outside {min} to {max}. Check the string, set the mark again and measure it again.',
  },
  'stub-below-mark': {
    within: 'The stub ends at or above the mark.',
    outside:
      'The stub ends {by} below the mark: nothing is left to cut off. Do not cut. Measure stub, string and mark again; if it is so, the choices are another target height, a longer head, or an extension by procedure, and they are the company representative’s.',
  },
  'stub-above-mark': {
    within: 'The stub stands {measured} above the mark, at least {min}.',
    outside:
      'The stub stands {measured} above the mark, {by} less than the {min} asked for. Do not rough cut any further; the company representative decides whether the final cut can be made from here.',
  },
  collar: {
    within: 'The next collar or centraliser is {measured} below the mark, clear of socket and weld.',
    outside:
      'The next collar or centraliser is {measured} below the mark; socket and weld need {min}, so it is {by} too close. The head would land on it or the weld would meet it. No cut: the company representative settles another height or the removal of the centraliser.',
  },
  'room-below-base': {
    within: 'There is {measured} under the head’s base to weld in.',
    outside:
      'There is {measured} under the head’s base, {by} less than the {min} a welder needs to see and reach the joint. Cut the conductor lower before the head is set.',
  },
  'lowest-cut': {
    within: 'Cut nothing lower than {lowest} from the ground (up is plus): the planned cut and the allowance over it.',
    outside: 'The lowest height that may be cut is not known.',
  },
  'lowest-cut-from-string': {
    within:
      'Cut nothing lower than {fromString} from the string, which is {lowest} from the ground (up is plus): the planned cut and the allowance over it.',
    outside: 'The lowest height that may be cut is not known.',
  },
  'fluid-below-weld': {
    within: 'The fluid stands {measured} below the lowest weld.',
    outside:
      'The fluid stands {measured} below the lowest weld, {by} short of {min}. Pump or bail it down and keep it down until the weld is cool.',
  },
  'fluid-no-water': {
    within: 'No water from cellar or annulus can reach the weld.',
    outside:
      'Water from cellar or annulus can reach the weld. Pump the cellar down and keep the pump there until the weld is cool.',
  },
  'string-moved': {
    within: 'The string stands where it stood when the mark was set.',
    outside:
      'The string has moved by {measured} since the mark was set. The cut is worked out with its new height: check both stakes before you believe it.',
  },
  'cut-high': {
    within: 'The mean of the cut is no more than {max} above the cut elevation.',
    outside:
      'The cut is high by {size}, {by} over the {max} allowed. It can be cut again: mark it again, dress it down and measure again.',
  },
  'cut-low': {
    within: 'The mean of the cut is no more than {allowed} below the cut elevation.',
    outside: `The cut is low by {size}, {by} more than the {allowed} allowed. ${neverCut} The casing cannot be put back: pulling it up takes a spear and may hurt the well. Measure again. The choices are to accept it, a longer head, or an extension by procedure, and they are the company representative’s.`,
  },
  'cut-spread': {
    within: 'The four heights lie within {measured}.',
    outside:
      'The four heights are {measured} apart, {by} more than {max}. Measure again. Dress the high side only if the cut is not low; otherwise present it as it is.',
  },
  'cut-visual': {
    within: 'The cut is clean and without a gouge.',
    outside:
      'The cut is not clean, or it is gouged. Dress it by grinding; a gouge into the seal’s or the weld’s area is for the company representative to decide.',
  },
  'stub-stands-above-mark': {
    within: 'The stub stands above the mark.',
    outside:
      'By the height takeoff the stub does not stand above the mark, so there is nothing to cut off. Do not cut; have the height takeoff reopened and measured again.',
  },
  'no-second-cut': {
    within: 'The cut is not low.',
    outside: `The cut was measured low. ${neverCut} Measure again, or present it: the company representative decides.`,
  },
  'bevel-angle': {
    within: 'The bevel is {measured}, between {min} and {max}.',
    outside:
      'The bevel is {measured}, {by} outside {min} to {max} of the procedure. Grind it to the angle and measure again.',
  },
  'bevel-land': {
    within: 'The land is {measured}, between {min} and {max}.',
    outside:
      'The land is {measured}, {by} outside {min} to {max} of the procedure. Dress it and measure again, and mind that the top of the casing stays where it is.',
  },
  'casing-od': {
    within: 'The outside diameter is {measured}, between {min} and {max}.',
    outside:
      'The outside diameter is {measured}, {by} outside {min} to {max}. Clean the place and measure again; if it stays, seal and fit-up are in doubt and the company representative decides.',
  },
  'clean-outside': {
    within: 'The outside is clean over {measured}, past the head’s base.',
    outside: 'The outside is clean over {measured}, {by} short of {min}. Clean on down to bright metal.',
  },
  'clean-inside': {
    within: 'The inside is clean over {measured}.',
    outside: 'The inside is clean over {measured}, {by} short of {min}. Clean on down to bright metal.',
  },
  'no-sharp-edge': {
    within: 'No sharp edge is left.',
    outside: 'A sharp edge is left that can cut the seal. Break it and feel round the whole circle with a gloved hand.',
  },
  'inside-deburred': {
    within: 'The inside is deburred.',
    outside: 'The inside is not deburred. Grind the burr off, or tools will hang on it.',
  },
  'bright-metal': {
    within: 'Scale and coating are off to bright metal.',
    outside: 'Scale or coating is left. Take it off to bright metal where seal and weld will be.',
  },
  'seal-area-smooth': {
    within: 'The seal area is smooth, a long seam flush.',
    outside: 'The seal area is not smooth. Grind a long seam flush and polish pits and scores, then look again.',
  },
};
