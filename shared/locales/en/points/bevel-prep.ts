const axes = (place: string) => ({
  x: `Outside diameter at the ${place}, along 12 to 6 o’clock`,
  y: `Outside diameter at the ${place}, along 3 to 9 o’clock`,
});
const byPlace = (what: string) => ({ seal: `${what} at the seal`, weld: `${what} at the weld` });

export default {
  title: 'Bevel prep',
  lead: 'Bevel the stub, clean it to bright metal, and gauge it where seal and weld will be.',
  groups: { bevel: 'The bevel', od: 'Outside diameter', clean: 'Clean length from the casing’s end', checks: 'Checks' },
  fields: {
    bevel: { angle: 'Bevel angle', land: 'Land' },
    od: { seal: axes('seal'), weld: axes('weld') },
    clean: { outside: 'Clean outside', inside: 'Clean inside' },
    'no-sharp-edge': 'No sharp edge left that can cut the seal',
    'inside-deburred': 'Inside deburred',
    'bright-metal': 'Scale and coating off to bright metal',
    'seal-area-smooth': 'Seal area smooth, a long seam flush',
  },
  shots: { bevel: 'The bevel with its land', 'seal-area': 'The seal area, cleaned' },
  acts: { bevel: 'Bevel' },
  statements: {},
  cautions: {
    grinding:
      'Sparks light gas, and a broken disc cuts to the bone. Face shield and guard on. The permit, the site’s rules and the written procedure come first.',
  },
  computed: {
    'od-mean': byPlace('Mean outside diameter'),
    'od-against-nominal': byPlace('Mean against nominal'),
    'out-of-round': byPlace('Out of round'),
  },
  choices: {},
};
