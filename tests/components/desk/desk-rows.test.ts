import { describe, expect, it } from 'vitest';
import type { Verdict } from '../../../shared/hold-points/verdict';
import { inRanges } from '../../../src/components/desk/desk-rows';

const verdict = (own: Partial<Verdict>): Verdict => ({
  limit: 'interpass-low',
  kind: 'hold',
  outcome: 'within',
  about: ['temperature'],
  basis: [],
  measured: { value: '280', unit: 'degF' },
  allowed: { min: '250', max: null, unit: 'degF' },
  by: null,
  source: { kind: 'procedure', ref: 'HF-2' },
  text: { key: 'limits.interpass' },
  ...own,
});
const high = verdict({ limit: 'interpass-high', allowed: { min: null, max: '450', unit: 'degF' } });

describe('limits on the desk', () => {
  it('stand in one line when they are the two ends of one range', () => {
    expect(inRanges([verdict({}), high]).map(({ allowed }) => allowed)).toEqual([
      { min: '250', max: '450', unit: 'degF' },
    ]);
  });

  it('stay apart when one is outside or another source has set it', () => {
    expect(inRanges([verdict({}), { ...high, outcome: 'outside' }])).toHaveLength(2);
    expect(inRanges([verdict({}), { ...high, source: { kind: 'job', ref: null } }])).toHaveLength(2);
  });
});
