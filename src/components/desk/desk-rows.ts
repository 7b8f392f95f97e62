import type { PlacedField, PointReview } from '../../../shared/job/review';
import type { Verdict } from '../../../shared/hold-points/verdict';

/** A field in the desk's table with the limits that it was held against, the ones outside first. */
export interface DeskReading {
  readonly field: PlacedField;
  readonly verdicts: readonly Verdict[];
}

export interface DeskGroup {
  readonly key: string;
  readonly readings: readonly DeskReading[];
}

const outsideFirst = (one: Verdict, other: Verdict): number =>
  Number(other.outcome === 'outside') - Number(one.outcome === 'outside');

/** A limit stands once, at the first of its fields; one that is outside at every field that it is about. */
const isShownAt = (verdict: Verdict, key: string): boolean =>
  verdict.about[0] === key || (verdict.outcome === 'outside' && verdict.about.includes(key));

/** What was read at a point, group by group, each reading with its verdicts; groups with something outside come first. */
export function deskGroups(review: PointReview): DeskGroup[] {
  const groups = review.groups.map((group) => ({
    key: group.key,
    readings: review.fields
      .filter((field) => field.group === group.key && review.context.read(field.key) !== undefined)
      .map((field) => ({
        field,
        verdicts: review.verdicts.filter((verdict) => isShownAt(verdict, field.key)).sort(outsideFirst),
      })),
  }));
  const isOut = ({ readings }: DeskGroup) =>
    readings.some(({ verdicts }) => verdicts.some(({ outcome }) => outcome === 'outside'));
  return groups
    .filter(({ readings }) => readings.length > 0)
    .sort((one, other) => Number(isOut(other)) - Number(isOut(one)));
}
