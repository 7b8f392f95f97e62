const air = {
  oxygen: 'Oxygen',
  flammable: 'Flammable gas, % of the lower explosive limit',
  h2s: 'Hydrogen sulphide, H2S',
  co: 'Carbon monoxide, CO',
};

export default {
  title: 'Hot work clearance',
  lead: 'Read the air at three places, then the permit and the people.',
  groups: {
    'gas-cellar': 'Air in the cellar',
    'gas-bore': 'Air in the bore',
    'gas-annulus': 'Air in the annulus',
    'gas-meter': 'The meter',
    permit: 'Hot work permit',
    people: 'People in place',
    cellar: 'The cellar',
  },
  fields: {
    gas: {
      cellar: air,
      bore: air,
      annulus: air,
      meter: 'Gas meter',
      'bump-tested': 'Meter bump-tested today',
      monitor: 'Continuous monitor in place',
    },
    permit: { number: 'Permit number', issuer: 'Issued by', expires: 'Expires' },
    'fire-watch': 'Fire watch',
    attendant: 'Attendant at the cellar',
    crew: 'Crew at the safety talk',
    'water-level': 'Water in the cellar',
  },
  shots: { 'meter-at-cellar': 'The meter’s display, held at the cellar' },
  acts: {},
  statements: {
    'cement-wait-over': 'The wait on cement is over.',
    'float-holding': 'The float is holding.',
    'no-flow': 'There is no flow and no pressure in casing or annulus.',
    'casing-supported': 'The casing is supported.',
  },
  cautions: {
    cellar:
      'The cellar may be a permit-required confined space: bad air can kill within a breath. Water in it can drown and carries current. The site’s permit and the entry supervisor rule.',
    permit:
      'Hot work goes by the site’s permit and local codes. Headfast records the check; it does not declare the place safe.',
  },
  computed: {},
};
