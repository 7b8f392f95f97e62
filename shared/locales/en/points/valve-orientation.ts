import { orientationComputed, orientationFields, orientationGroupTitles } from './orientation-words';

export default {
  title: 'Valve orientation',
  hints: { faces: 'The tool pusher named: {direction}. Stand where you can see it.' },
  lead: 'Show that the valve faces where the tool pusher wants it, and that the flange is square, level and at its height.',
  groups: {
    facing: 'Which way it faces',
    ...orientationGroupTitles('set'),
    gap: 'Fit-up gap',
    'seal-again': 'The seal once more',
  },
  fields: {
    faces: 'The valve faces the named direction',
    set: orientationFields,
    gap: { '12': '12 o’clock', '3': '3 o’clock', '6': '6 o’clock', '9': '9 o’clock' },
    'seal-again': 'The seal, looked at again',
  },
  shots: {
    'valve-and-reference': 'The valve and the reference direction in one frame',
    'level-on-flange': 'The level on the flange, its reading visible',
  },
  acts: {},
  statements: {},
  cautions: {
    turning:
      'Turning the head on its seal rolls the seal. If it has to be turned, lift it off and look at the seal again.',
    'suspended-head':
      'A head on the hook or not yet tacked can tip and crush. Keep it on the lifting gear until the tacks hold; the site’s lift plan and its certified lifting people rule.',
  },
  computed: { set: orientationComputed, 'gap-to-add': 'Gap to add to the leg of the fillet' },
  choices: {
    'seal-again': { sound: 'Sound', 'not-sound': 'Not sound', 'not-done': 'Not looked at' },
    direction: {
      'v-door': 'the V-door',
      'mud-tanks': 'the mud tanks',
      'pipe-racks': 'the pipe racks',
      doghouse: 'the doghouse',
      'choke-manifold': 'the choke manifold',
      other: 'another direction, in words',
    },
  },
};
