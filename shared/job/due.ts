import { definitionOf } from '../hold-points/definitions';
import { wholeOrder } from '../hold-points/order';
import type { PlacedField, PointReview } from './review';
import type { PointState } from './state';

/** What a point waits for at one place of its order. */
export type Due =
  | { due: 'fields'; fields: PlacedField[] }
  | { due: 'shot'; shot: string }
  | { due: 'act'; act: string }
  /** may be done here or passed over; no longer offered once what comes after it is read */
  | { due: 'optional-act'; act: string };

/**
 * What is still to be done at a point, in the order of the work: what must be read before an act, the act, and what can
 * only be read after it. The recorder's main button and the walks of demo and tests follow it; what may not begin is for
 * the stops of `beforeAct` to say.
 */
export const dueAt = (review: PointReview, point: PointState): Due[] => {
  const isMissing = (key: string): boolean => review.missing.includes(key);
  const isRead = ({ key }: PlacedField): boolean => review.context.read(key) !== undefined;
  const placed = new Set<string>();
  const dues: Due[] = [];
  for (const part of wholeOrder(definitionOf(point.place.kind).order)) {
    if ('act' in part) {
      const act = review.acts.find((one) => one.key === part.act);
      if (isMissing(`act:${part.act}`)) dues.push({ due: 'act', act: part.act });
      else if (act && !point.acts.some((run) => run.act === act.key)) dues.push({ due: 'optional-act', act: act.key });
    } else if ('shot' in part) {
      const shots = review.shots.map(({ key }) => key).filter((key) => part.shot === null || key === part.shot);
      const here = shots.filter((shot) => !placed.has(shot) && isMissing(`shot:${shot}`));
      here.forEach((shot) => placed.add(shot));
      dues.push(...here.map((shot) => ({ due: 'shot' as const, shot })));
    } else {
      const here = review.fields.filter(({ key }) => !placed.has(key) && part.read.test(key));
      here.forEach(({ key }) => placed.add(key));
      const passedOver = here.some(isRead) && dues.at(-1)?.due === 'optional-act';
      if (passedOver) dues.pop();
      const fields = here.filter(({ key }) => isMissing(`field:${key}`));
      if (fields.length > 0) dues.push({ due: 'fields', fields });
    }
  }
  return dues;
};
