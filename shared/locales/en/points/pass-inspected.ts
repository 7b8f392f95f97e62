import { lookChoiceWords, lookFieldWords, lookGroupWords } from './look-words';
import { orientationComputed, orientationFields, orientationGroupTitles } from './orientation-words';

export default {
  title: 'Pass inspected',
  lead: 'Read the metal, strike the arc, then clean the pass and look it over.',
  groups: {
    temps: 'Right before the arc',
    ...orientationGroupTitles('tacked'),
    welders: 'Who welded it',
    rods: 'Rods',
    ...lookGroupWords,
    size: 'Measured on the pass',
  },
  fields: {
    temps: {
      head: 'Temperature of the head',
      casing: 'Temperature of the casing',
      instrument: 'Pyrometer, where one was used',
    },
    tacked: orientationFields,
    welders: 'Welder or welders',
    rods: {
      class: 'Electrode class, off the rod',
      lot: 'Lot',
      'out-of-oven': 'Out of the oven at',
      count: 'Rods used',
      amps: 'Current',
      volts: 'Voltage',
      'arc-time': 'Arc time of these rods together',
      'run-out': 'Length of weld laid by them',
    },
    look: lookFieldWords,
    undercut: 'Deepest undercut',
    'fillet-leg': 'Shortest fillet leg',
  },
  shots: {
    'pass-side-a': 'The whole cleaned pass, from one side',
    'pass-side-b': 'The whole cleaned pass, from the opposite side',
  },
  acts: { tacks: 'Tacks', pass: 'The pass' },
  statements: {},
  cautions: {
    'electric-shock':
      'Wet gloves and a live electrode holder can kill. Use dry gloves, stand on something dry, and keep the holder out of the water.',
    'eyes-and-fumes':
      'The arc burns eyes and skin of whoever looks on, and its fumes and the grease’s collect in a cellar. Screen it and keep air moving; the site’s permit rules.',
    'procedure-governs':
      'The written welding procedure governs. Whether a weld is accepted is for the certified inspector where the programme asks for one.',
  },
  computed: {
    'travel-speed': 'Travel speed, the slowest rods',
    'heat-input': 'Heat input, the highest',
    exposure: 'Out of the oven, the longest',
    beads: 'Passes laid so far',
    'weld-metal': 'Weld metal on this side so far',
    'weld-metal-plan': 'Weld metal that the plan asks for on this side',
    tacked: orientationComputed,
  },
  choices: { look: lookChoiceWords },
};
