/** The words of the head’s position, the same wherever it is measured: as set, after the tacks, as built and cold. */
export const orientationFields = {
  holes: 'The two bolt holes that the straightedge goes through',
  offset: {
    a: 'Straightedge to the substructure at end A, your left hand as you face it',
    b: 'Straightedge to the substructure at end B, your right hand',
  },
  length: 'Between the two measuring points',
  level: {
    x: 'Level along 12 to 6 o’clock, plus when 12 is high',
    y: 'Level along 3 to 9 o’clock, plus when 3 is high',
  },
  instrument: 'Level that was used',
  height: 'Height of the datum above ground',
};

export const orientationComputed = {
  rotation: 'Two-hole rotation, plus when end A is farther out',
  'at-valve': 'Rotation at the valve',
  tilt: 'Flange tilt',
  'low-side': 'Low side of the flange, degrees clockwise from 12 o’clock',
  'datum-miss': 'Datum against target, plus is high',
};

/** Group titles for one prefix, such as `set`. */
export const orientationGroupTitles = <Prefix extends string>(prefix: Prefix) =>
  ({
    [`${prefix}-two-hole`]: 'Two-hole',
    [`${prefix}-level`]: 'Level on the flange',
    [`${prefix}-height`]: 'Height of the datum',
  }) as Record<`${Prefix}-two-hole` | `${Prefix}-level` | `${Prefix}-height`, string>;
