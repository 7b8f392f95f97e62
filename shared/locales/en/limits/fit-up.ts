/** Limits of points 5 and 6: the seal, the valve’s direction, the head as set; 9.1 and 10 share those of the position. */
export default {
  'direction-named': {
    within: 'The tool pusher named the direction: {direction}.',
    outside:
      'The tool pusher has not named the direction that the valve faces. No lift before he has: turning the head later rolls the seal.',
  },
  'direction-marked': {
    within: 'The direction is marked on head and casing.',
    outside:
      'The direction, as it was last named, is not marked on head and casing. Mark both before the lift: turning the head later rolls the seal.',
  },
  'seal-sound': {
    within: 'The seal was sound before setting.',
    outside: 'The seal was not sound before setting. Fit another one and look at it again before the head is lifted.',
  },
  'seal-sound-before-lift': {
    within: 'The seal was sound before setting.',
    outside:
      'Nobody has recorded a sound seal. Look at the seal all round and record it before the head is lifted over the stub.',
  },
  'seal-state-after': {
    within: 'The seal is sound with the head set.',
    outside:
      'The seal is rolled or cut. Lift the head off, fit a new seal, find the edge that did it, and set the head again.',
  },
  'seal-sight': {
    within: 'The seal was seen or felt with the head set.',
    outside:
      'The seal could not be seen with the head set. Try a mirror or a borescope; if it cannot be done, the company representative decides whether to go on to the weld.',
  },
  'greased-casing': {
    within: 'The casing is greased.',
    outside:
      'The casing is not greased. A dry seal rolls: grease it before the lift; once the head is set the company representative decides.',
  },
  'greased-head': {
    within: 'Head bore and seal are greased.',
    outside:
      'Head bore and seal are not greased. A dry seal rolls: grease them before the lift; once the head is set the company representative decides.',
  },
  'grease-clear': {
    within: 'The grease is kept {measured} clear of the weld.',
    outside:
      'The grease comes within {measured} of the weld, {by} closer than {min}. Wipe it back and clean the place with solvent before any heat: grease in the joint makes pores and cracks.',
  },
  rotation: {
    within: 'The head is turned {measured} by the two holes, no more than {max}.',
    outside:
      'The head is turned {measured} by the two holes, {by} more than {max}. Measure again. Before the tacks lift the head off and set it again, and look at the seal again: turning it on the seal rolls the seal. Once welded it stays, and the company representative decides.',
  },
  tilt: {
    within: 'The flange is out of level by {measured}, no more than {max}.',
    outside:
      'The flange is out of level by {measured}, {by} more than {max}. Check the level both ways round. Before the weld bring up the low side and measure again; once welded the company representative decides.',
  },
  'datum-height': {
    within: 'The datum stands {measured} above ground, between {min} and {max}.',
    outside:
      'The datum stands {measured} above ground, {by} outside {min} to {max}. Check the string and that the head sits on the stub all round; if it is so, the company representative decides.',
  },
  faces: {
    within: 'The valve faces the direction that the tool pusher named: {direction}.',
    outside:
      'The valve does not face the direction that the tool pusher named ({direction}). Lift the head and set it again; turning it on the seal rolls the seal.',
  },
  'faces-unnamed': {
    within: 'The direction is named.',
    outside: 'The tool pusher has named no direction, so nothing tells where the valve has to face. He names it first.',
  },
  'seal-again': {
    within: 'The seal was looked at again and is sound.',
    outside:
      'The seal was not looked at again, or is not sound. Look at it; a rolled or cut seal means lifting the head off and fitting a new one.',
  },
  gap: {
    within: 'The gap is {measured}, no more than {max}.',
    outside: 'The gap is {measured}, over {max}. The largest gap is added to the leg of the fillet.',
  },
};
