export default {
  clock: {
    title: 'Clock face, seen from above; 12 o’clock faces the V-door',
    'low-side': 'low side',
    reads: '{quarter} o’clock reads {value}.',
    'not-read': '{quarter} o’clock has not been read.',
    'low-side-at': 'The low side is {degrees} clockwise from 12 o’clock.',
  },
  plan: {
    title: 'The flange from above, with the straightedge through two bolt holes',
    substructure: 'substructure beam, V-door side; lean drawn 10 : 1',
    straightedge: 'between measuring points {length}',
    faces: 'The valve faces: {direction}.',
    'no-direction': 'No direction has been named.',
    offsets: 'Offsets to the substructure: {a} and {b}.',
    rotation: 'Two-hole error {rotation}.',
  },
};
