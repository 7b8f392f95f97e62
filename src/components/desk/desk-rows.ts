import type { PlacedField, PointReview } from '../../../shared/job/review';
import type { Verdict } from '../../../shared/hold-points/verdict';
import { verdictsAt, verdictsUnder } from '../hold-point/placed-verdicts';

/** A field in the desk's table with the limits that it was held against, the ones outside first. */
export interface DeskReading {
  readonly field: PlacedField;
  readonly verdicts: readonly Verdict[];
}

export interface DeskGroup {
  readonly key: string;
  readonly readings: readonly DeskReading[];
  /** what rests on several readings together: said once below them */
  readonly together: readonly Verdict[];
}

const outsideFirst = (one: Verdict, other: Verdict): number =>
  Number(other.outcome === 'outside') - Number(one.outcome === 'outside');

/** The other end of the same range: both within, one from below and one from above, by the same source. */
const isOtherEnd = (one: Verdict, other: Verdict): boolean =>
  one.outcome === 'within' &&
  other.outcome === 'within' &&
  one.allowed !== null &&
  other.allowed !== null &&
  one.allowed.unit === other.allowed.unit &&
  one.source.kind === other.source.kind &&
  one.source.ref === other.source.ref &&
  (one.allowed.min === null) !== (other.allowed.min === null) &&
  (one.allowed.max === null) !== (other.allowed.max === null);

const asRange = (one: Verdict, other: Verdict): Verdict => ({
  ...one,
  allowed: {
    min: one.allowed?.min ?? other.allowed?.min ?? null,
    max: one.allowed?.max ?? other.allowed?.max ?? null,
    unit: one.allowed?.unit ?? '',
  },
});

/** Two verdicts that are the ends of one range stand in one line, as the procedure writes it. */
export const inRanges = (verdicts: readonly Verdict[]): Verdict[] =>
  verdicts.reduce<Verdict[]>((lines, verdict) => {
    const at = lines.findIndex((line) => isOtherEnd(line, verdict));
    const line = lines[at];
    return line === undefined ? [...lines, verdict] : lines.with(at, asRange(line, verdict));
  }, []);

/** What was read at a point, group by group, each reading with its verdicts; groups with something outside come first. */
export function deskGroups(review: PointReview): DeskGroup[] {
  const lines = (verdicts: readonly Verdict[]) => inRanges(verdicts).sort(outsideFirst);
  const groups = review.groups.map(({ key }): DeskGroup => {
    const placed = review.fields.filter((field) => field.group === key && review.context.read(field.key) !== undefined);
    return {
      key,
      readings: placed.map((field) => ({ field, verdicts: lines(verdictsAt(review.verdicts, field.key)) })),
      together: verdictsUnder(
        review.verdicts,
        placed.map((field) => field.key),
      ).sort(outsideFirst),
    };
  });
  const isOut = ({ readings, together }: DeskGroup) =>
    [...together, ...readings.flatMap(({ verdicts }) => verdicts)].some(({ outcome }) => outcome === 'outside');
  return groups
    .filter(({ readings }) => readings.length > 0)
    .sort((one, other) => Number(isOut(other)) - Number(isOut(one)));
}
