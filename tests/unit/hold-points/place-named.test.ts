import { describe, expect, it } from 'vitest';
import { placeNamed } from '../../../shared/hold-points/place-named';
import { sequenceOf } from '../../../shared/hold-points/sequence';

describe('the place that a hold point’s name says', () => {
  it('is its place in the sequence, for every point of a job with passes and repair rounds', () => {
    const sequence = sequenceOf(12, [
      { round: 1, passes: 2 },
      { round: 2, passes: 12 },
    ]);
    expect(sequence.map(({ id }) => placeNamed(id))).toEqual(sequence);
  });

  it('is none for a name that no sequence has', () => {
    for (const name of ['', 'pass-inspected', 'pass-x-inspected', 'final-cut-r', 'constructor', 'final-cut-2'])
      expect(placeNamed(name)).toBeNull();
  });
});
