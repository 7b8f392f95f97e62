import { lookChoiceWords, lookFieldWords, lookGroupWords } from './look-words';
import { orientationComputed, orientationFields, orientationGroupTitles } from './orientation-words';

export default {
  title: 'Cooled to touch',
  lead: 'Let it come down by itself, look at it cold, and measure where the head stands.',
  groups: {
    cooling: 'Temperature over time',
    cover: 'How it cooled',
    ...lookGroupWords,
    'surface-exam': 'Surface examination',
    ...orientationGroupTitles('as-built'),
  },
  fields: {
    cooling: { at: 'Read at', temperature: 'Temperature of the weld' },
    'cooled-instrument': 'Pyrometer, where one was used',
    ambient: 'Temperature of the air',
    covered: 'Cover',
    'cover-off': 'Cover taken off at',
    quenched: 'Quenched or cooled by force',
    'fire-watch-ended': 'Fire watch ended at',
    look: lookFieldWords,
    'surface-exam': 'Magnetic particle or penetrant examination',
    'as-built': orientationFields,
  },
  shots: { 'finished-weld': 'The finished weld, clean and cold' },
  acts: {},
  statements: {},
  cautions: {
    'still-hot': 'The head looks cold long before it is. Read it before anybody puts a hand on it.',
    'late-cracks':
      'Water or wind on a hot weld cracks it, and cracks may open hours after it is cold. Leave it covered; where the programme asks for a wait before the examination, wait.',
    examiner:
      'Magnetic particle and penetrant results are those of a certified examiner; the programme and local codes say who that is.',
  },
  computed: {
    'cooling-constant': 'Cooling constant, per minute',
    'touch-after': 'From the first reading that counts to touch',
    'as-built': orientationComputed,
  },
  choices: {
    covered: { covered: 'Covered', wrapped: 'Wrapped', open: 'Open to the air' },
    quenched: { no: 'No', yes: 'Yes' },
    look: lookChoiceWords,
    'surface-exam': { pass: 'Passed', fail: 'Failed' },
  },
};
