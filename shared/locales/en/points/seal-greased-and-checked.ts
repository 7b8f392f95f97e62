export default {
  title: 'Seal greased and checked',
  lead: 'Direction marked, seal looked at and greased; then the head goes on, and the seal is looked at again.',
  groups: {
    direction: 'Before the lift',
    'seal-before': 'Every seal before setting',
    grease: 'Grease',
    'seal-after': 'Every seal with the head set',
  },
  fields: {
    'direction-marked': 'The named direction is marked on head and casing',
    seal: {
      part: 'Seal part number',
      condition: 'Condition as found',
      sound: 'Seal sound before setting',
      sight: 'How the seal was checked with the head set (eye, mirror or borescope counts as seen)',
      'state-after': 'State of the seal with the head set',
    },
    grease: { product: 'Grease product', clear: 'Grease kept clear of the weld by' },
    greased: { casing: 'Casing greased', head: 'Head bore and seal greased' },
  },
  shots: {
    'seal-before': 'The seal in its groove before setting',
    'seal-after': 'The seal with the head set, by eye, mirror or borescope',
  },
  acts: { 'set-head': 'Head set' },
  statements: {},
  cautions: {
    'suspended-head':
      'A head that slips crushes. Nobody under or beside a suspended head, no hand between head and casing. The site’s lift plan and its certified lifting people rule.',
    grease: 'Grease burns. Keep it clear of the weld, and wipe off what was smeared before any heat.',
  },
  computed: {},
  choices: {
    seal: {
      sight: { seen: 'Seen', felt: 'Felt', 'not-seen': 'Could not be seen' },
      'state-after': { sound: 'Sound', 'rolled-or-cut': 'Rolled or cut' },
    },
  },
};
