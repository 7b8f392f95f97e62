import type { PointKind, PointPlace } from './points';
import { pointKinds } from './points';

/** A repair round: how many passes it takes. Opened by the company representative from point 10 or 11. */
export interface RepairRound {
  round: number;
  passes: number;
}

const repairKinds: readonly PointKind[] = [
  'test-plug-removed',
  'preheat-reached',
  'pass-inspected',
  'cooled-to-touch',
  'pressure-test-held',
];

const place = (kind: PointKind, pass: number | null, round: number): PointPlace => {
  const base = kind === 'pass-inspected' ? `pass-${pass}-inspected` : kind;
  return { id: round === 0 ? base : `${base}-r${round}`, kind, pass, round };
};

const placesOf = (kinds: readonly PointKind[], passes: number, round: number): PointPlace[] =>
  kinds.flatMap((kind) =>
    kind === 'pass-inspected'
      ? Array.from({ length: passes }, (_, index) => place(kind, index + 1, round))
      : [place(kind, null, round)],
  );

/**
 * A job's hold points in order: the fixed sequence with the procedure's passes, then the points of each repair round.
 * @example sequenceOf(1, []).map((point) => point.id)[8] // 'pass-1-inspected'
 */
export const sequenceOf = (passes: number, rounds: readonly RepairRound[]): PointPlace[] => [
  ...placesOf(pointKinds, passes, 0),
  ...rounds.flatMap((round) => placesOf(repairKinds, round.passes, round.round)),
];
