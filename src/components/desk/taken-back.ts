import type { PointState } from '../../../shared/job/state';

type TakenBack = { how: 'sentBack' | 'withdrawn' | 'reopened'; reason: string } & Pick<
  PointState['withdrawn'][number],
  'by' | 'at'
>;

/** Why a point that waited for its owner is open again: the newest of what can have opened it, by whom and when. */
export function takenBack({ sentBack, withdrawn, reopened }: PointState): TakenBack | undefined {
  const all: TakenBack[] = [
    ...sentBack.map((one) => ({ ...one, how: 'sentBack' as const })),
    ...withdrawn.map((one) => ({ ...one, how: 'withdrawn' as const, reason: '' })),
    ...reopened.map((one) => ({ ...one, how: 'reopened' as const })),
  ];
  return all
    .sort((a, b) => Date.parse(a.at.received ?? a.at.corrected) - Date.parse(b.at.received ?? b.at.corrected))
    .at(-1);
}
