import type { Source, Verdict } from '../../shared/hold-points/verdict';
import { useSay } from './say';

export interface VerdictWords {
  /** `Outside by 1/16 in` */
  label(verdict: Verdict): string;
  /** `250 to 450 °F`; empty where the limit is a fact and not a range */
  limit(verdict: Verdict): string;
  source(source: Source): string;
  /** limit and source in one piece */
  limitAndSource(verdict: Verdict): string;
}

/** A verdict's short words: the sentence itself stands in its text. */
export function useVerdictWords(): VerdictWords {
  const { say, quantity } = useSay();

  const limit = ({ allowed }: Verdict): string => {
    if (allowed === null) return '';
    const { min, max, below, unit } = allowed;
    if (min !== null && max !== null)
      return min === max
        ? quantity(min, unit)
        : say('job.point.range', { min: quantity(min, unit), max: quantity(max, unit) });
    if (min !== null) return say('job.point.atLeast', { min: quantity(min, unit) });
    if (max === null) return '';
    return say(below ? 'job.point.below' : 'job.point.atMost', { max: quantity(max, unit) });
  };

  const source = ({ kind, ref }: Source): string => {
    if (kind === 'job' && ref !== null) return say('job.point.source.job-setting');
    return say(`job.point.source.${kind}`, { ref: ref ?? '' });
  };

  return {
    label: (verdict) => {
      if (verdict.outcome === 'within') return say('app.verdict.within');
      if (verdict.kind === 'advice') return say('job.point.advice');
      const { by } = verdict;
      return by === null || Number(by.value) === 0
        ? say('app.verdict.outside')
        : say('job.point.outsideBy', { by: { quantity: by.value, unit: by.unit, difference: true } });
    },
    limit,
    source,
    limitAndSource: (verdict) => {
      const range = limit(verdict);
      const from = source(verdict.source);
      return range === '' ? from : say('job.point.limitOf', { limit: range, source: from });
    },
  };
}
