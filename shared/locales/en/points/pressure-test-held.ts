const back = {
  same: 'Back, the same one',
  replaced: 'Lost; another one of the same thread and rating',
  'not-back': 'Not back',
};

export default {
  title: 'Pressure test held',
  lead: 'Probe the port, set the exclusion, pressure up, hold, bleed to zero, and put the plug back.',
  groups: {
    rigging: 'Before pressure',
    gauge: 'Gauge and volume',
    hold: 'The hold',
    'hold-readings': 'Readings during the hold',
    outcome: 'What came of it',
    'put-back': 'Bled and put back',
  },
  fields: {
    'port-probed': 'Port probed and clear',
    'fitting-in': 'Test fitting in',
    exclusion: 'Exclusion zone set, everybody out of it',
    gauge: 'Gauge or recorder',
    'full-scale': 'Full scale of the gauge',
    volume: 'Volume under test, with hoses',
    hold: { start: 'Hold started at', end: 'Hold ended at' },
    'hold-readings': { at: 'Read at', pressure: 'Pressure', temperature: 'Temperature' },
    highest: 'Highest pressure reached',
    'bore-gauged': 'Bore gauged through and clear',
    leak: 'Leak seen',
    'run-by': 'Test run by',
    'run-by-name': 'Name of who ran it',
    'bled-to-zero': 'Bled to zero',
    plug: { 1: { back: 'Plug of port 1' }, 2: { back: 'Plug of port 2' } },
  },
  shots: {
    'gauge-start': 'The gauge at the start of the hold',
    'gauge-end': 'The gauge at the end of the hold, or the chart',
  },
  acts: { 'pressure-test': 'Pressure on' },
  statements: {},
  cautions: {
    'nitrogen-distance':
      'Nitrogen under pressure throws metal when something lets go. Nobody is inside the distance while pressure is on: read the gauge at its edge or by camera.',
    'nitrogen-oxygen':
      'Nitrogen in a cellar takes the oxygen without a smell. After bleeding check oxygen before anybody goes back in.',
    'oil-jet':
      'A jet of oil under pressure goes through gloves and skin. Never feel for a leak by hand; stand aside of fittings and plugs.',
    'never-tighten': 'Never tighten under pressure. Bleed to zero first.',
    'test-procedure':
      'The operator’s written test procedure and local codes rule, and a licensed engineer where the casing’s rating was reached. Headfast computes; it does not declare the head fit for service.',
  },
  computed: {
    'safe-limit-flange': 'Test pressure limit, set by the flange’s rating',
    'safe-limit-collapse': 'Test pressure limit, set by the casing’s collapse',
    'safe-limit-seal': 'Test pressure limit, set by the seal’s rating',
    lowest: 'Lowest pressure during the hold',
    drop: 'Drop during the hold',
    rate: 'Lost per minute',
    'corrected-drop': 'Drop that temperature does not explain',
    'stored-energy': 'Energy stored in the nitrogen',
    'stand-off': 'Nobody nearer than',
    'oil-volume': 'Oil to pump into the full void',
    'oil-per-degree': 'What one degree Fahrenheit does to shut-in oil',
  },
  choices: {
    leak: { none: 'None', weld: 'At the weld', port: 'At the port', seal: 'At the seal' },
    'run-by': { welder: 'Welder', technician: 'Wellhead technician' },
    plug: { 1: { back }, 2: { back } },
  },
};
