const quarters = { 12: '12 o’clock', 3: '3 o’clock', 6: '6 o’clock', 9: '9 o’clock' };

export default {
  title: 'Preheat reached',
  lead: 'Heat the joint all the way round, then read head and casing at four places.',
  groups: {
    excavated: 'The ground-out place',
    'preheat-head': 'Temperature of the head',
    'preheat-casing': 'Temperature of the casing',
    'preheat-how': 'How it was read',
    joint: 'The joint',
  },
  fields: {
    'excavated-cracks': 'Cracks left in the ground-out place',
    preheat: {
      head: quarters,
      casing: quarters,
      'seal-level': 'Temperature at the seal’s level',
      distance: 'Read this far from the joint',
      by: 'Read with',
      instrument: 'Which pyrometer',
    },
    'joint-dry': 'Joint dry',
    'joint-sheltered': 'Joint sheltered from wind and rain',
    fluid: { 'below-weld': 'Fluid in the casing, below the lowest weld' },
  },
  shots: { 'instrument-on-metal': 'The stick mark or the pyrometer on the metal, its reading legible' },
  acts: { excavation: 'Grinding or gouging out', preheat: 'Preheat' },
  statements: {},
  cautions: {
    'hot-metal':
      'The whole head burns skin and lights grease and rags, also where no flame touched it. Keep hands, hoses and fuel away.',
    'seal-heat': 'Too much heat at the seal’s level ruins the seal, and nobody can see it until the test.',
    'procedure-governs':
      'The written welding procedure governs the preheat, always. A computed advice is for whoever is licensed or certified to judge it.',
  },
  computed: {
    lowest: 'Lowest reading',
    highest: 'Highest reading',
    'carbon-equivalent': 'Carbon equivalent of this steel by IIW',
    'advice-preheat': 'Preheat advised for this steel by EN 1011-2 method B',
  },
  choices: {
    'excavated-cracks': { none: 'None seen', found: 'Found' },
    preheat: { by: { stick: 'Temperature-indicating stick', pyrometer: 'Contact pyrometer' } },
  },
};
