const stakes = { a: 'String above ground at stake A, again', b: 'String above ground at stake B, again' };

export default {
  title: 'Final cut',
  lead: 'Check fluid and string, cut on the mark, then measure down from the string at four places.',
  groups: {
    fluid: 'Fluid in the casing',
    'string-again': 'The string again',
    cut: 'The cut from the string, down is plus, with a level straightedge',
    visual: 'The look',
  },
  fields: {
    fluid: {
      'below-weld': 'Fluid below the lowest weld',
      'no-water': 'No water from cellar or annulus can reach the weld until it is cool',
    },
    string: stakes,
    cut: { '12': '12 o’clock', '3': '3 o’clock', '6': '6 o’clock', '9': '9 o’clock' },
    visual: 'Cut clean, no gouge',
  },
  shots: {
    'wraparound-on-mark': 'The wraparound on the mark, all of its edge that can be seen',
    'finished-cut': 'The finished cut from above',
  },
  acts: { 'final-cut': 'Final cut' },
  statements: {},
  cautions: {
    'no-way-back':
      'A low cut cannot be put back. Cut on the high side of the line and dress down; when it is measured low, nobody cuts again.',
    torch:
      'Gas in the casing or behind it can flash under the torch, and the ring cut off is heavy and hot. The site’s hot work permit and its lifting rules come first.',
  },
  computed: {
    'cut-elevation': 'Cut elevation above ground',
    mark: 'Cut mark from the string, down is plus',
    mean: 'Mean from the string, down is plus',
    spread: 'Spread',
    tilt: 'Tilt of the cut',
    'low-side': 'Low side, degrees clockwise from 12 o’clock',
    'lands-mean': 'Datum will land, by the mean, above ground',
    'lands-high': 'Datum will land, by the high point, above ground',
    'allowance-used': 'Cut off since the stub was measured',
  },
  choices: {},
};
