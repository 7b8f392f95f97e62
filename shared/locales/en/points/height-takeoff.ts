const bySomeoneElse = 'second person, without seeing the first';
const third = 'third person, where the two do not agree';

export default {
  title: 'Height takeoff',
  lead: 'Measure head, string and mark. Two people, two tapes, neither knowing the other’s figure.',
  groups: {
    nameplate: 'The head’s nameplate',
    tapes: 'The tapes',
    takeoff: 'Face to shoulder by tape',
    socket: 'Base to shoulder by tape',
    string: 'The string',
    mark: 'Cut mark from the string, down is plus',
    stub: 'What stands in the cellar',
  },
  fields: {
    nameplate: { serial: 'Serial number', size: 'Flange size', pressure: 'Pressure rating' },
    tape: { first: 'Tape of the first person', second: 'Tape of the second person' },
    takeoff: {
      first: 'Face to shoulder, first person',
      second: `Face to shoulder, ${bySomeoneElse}`,
      third: `Face to shoulder, ${third}`,
    },
    socket: {
      first: 'Base to shoulder, first person',
      second: `Base to shoulder, ${bySomeoneElse}`,
      third: `Base to shoulder, ${third}`,
    },
    string: {
      a: 'String above ground at stake A',
      b: 'String above ground at stake B',
      apart: 'Between the stakes',
      'from-a': 'Stake A to the casing’s centre (half way when left open)',
    },
    mark: {
      first: 'Mark from the string, first person',
      second: `Mark from the string, ${bySomeoneElse}`,
      third: `Mark from the string, ${third}`,
    },
    'stub-top': 'Top of the stub from the string, up is plus',
    'conductor-top': 'Top of the conductor from the string, up is plus',
    collar: 'From the mark down to the next collar or centraliser (as far as the casing is clear)',
    plumb: {
      x: 'Casing out of plumb along 12 to 6 o’clock, plus when it leans to 12',
      y: 'Casing out of plumb along 3 to 9 o’clock, plus when it leans to 3',
    },
  },
  shots: {
    nameplate: 'The head’s nameplate, every figure readable',
    'tape-on-head': 'The tape on the head, both ends and the figure in the frame',
    'tape-at-string': 'The tape at the string on the casing, with the mark',
  },
  acts: { 'conductor-cut': 'Conductor cut', 'rough-cut': 'Rough cut' },
  statements: {},
  cautions: {
    'rough-cut':
      'Gas behind conductor or casing can flash when it is cut, and the piece cut off falls or springs. Cut nothing lower than the height shown. The site’s hot work permit and its lifting rules come first.',
    string: 'A string that is walked into moves the whole job. Look along it before every measurement.',
  },
  computed: {
    'takeoff-by-drawing': 'Takeoff in force: the drawing’s, until both tapes agree',
    'takeoff-by-tape': 'Takeoff in force: as measured, both tapes agree',
    'lowest-cut': 'Lowest height that may be cut, above ground: the drawing’s cut and the allowance',
    'lowest-cut-from-string': 'Lowest height that may be cut, from the string, up is plus',
    'cut-elevation': 'Cut elevation above ground, by the takeoff in force',
    mark: 'Cut mark from the string, down is plus, by the takeoff in force',
    'left-to-cut': 'Left to cut off above the mark',
    'lands-at': 'Where the datum lands when cut on the mark, above ground',
    'room-below-base': 'Room under the head’s base to weld',
  },
  choices: {},
};
