const port = (number: number) => ({
  group: `Port ${number}`,
  plug: {
    out: `Plug out of port ${number}`,
    where: `Where the plug of port ${number} is kept`,
    holder: `Who holds the plug of port ${number}`,
  },
  port: { clear: `Port ${number} open and clear` },
});
const [first, second] = [port(1), port(2)];

export default {
  title: 'Test plug removed',
  lead: 'Take the plug out before any heat, and say who keeps it.',
  groups: {
    'made-safe': 'Before the plug comes out again',
    'port-1': first.group,
    'port-2': second.group,
    bore: 'The bore',
  },
  fields: {
    'bled-to-zero': 'Bled to zero',
    drained: 'Drained of the test medium',
    plug: { 1: first.plug, 2: second.plug },
    port: { 1: first.port, 2: second.port },
    'bore-covered': 'Bore covered against dropped objects',
    'bore-vented': 'Bore vented',
  },
  shots: {
    'open-port': 'The open port, light falling into it, so that nothing is seen to block it',
    'plug-kept': 'The plug in its keeping place',
  },
  acts: {},
  statements: {},
  cautions: {
    bleeding:
      'Pressure may still be shut in behind the plug: stand aside of it, bleed through the fitting and loosen nothing before the gauge stands at zero. Oil left in the void burns.',
    'trapped-heat':
      'Heat and moisture trapped behind a plug can crack the head and blow the plug out. No flame comes near the head while a plug is in.',
    procedure: 'The written procedure and the head’s own instructions rule how a plug is taken out and kept.',
  },
  computed: {},
  choices: {},
};
