/** Words of the look over a weld, the same at a hot pass and at the cold weld. */
const one = (state: string) => ({ state, clock: 'At which hour of the clock', how: 'How it was repaired' });
const hours = Object.fromEntries(Array.from({ length: 12 }, (_, index) => [index + 1, `${index + 1} o’clock`]));
const answers = { state: { none: 'None', repaired: 'Repaired', present: 'Present' }, clock: hours };

export const lookGroupWords = {
  'look-porosity': 'Porosity',
  'look-slag': 'Slag inclusion',
  'look-overlap': 'Overlap',
  'look-arc-strike': 'Arc strike',
  'look-crack': 'Crack',
};

export const lookFieldWords = {
  porosity: one('Porosity'),
  slag: one('Slag inclusion'),
  overlap: one('Overlap'),
  'arc-strike': one('Arc strike'),
  crack: one('Crack'),
};

export const lookChoiceWords = {
  porosity: answers,
  slag: answers,
  overlap: answers,
  'arc-strike': answers,
  crack: answers,
};
