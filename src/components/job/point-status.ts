import type { PointState } from '../../../shared/job/state';
import type { PointStatus } from '../app/chips';

/** A point as its chip shows it: open again after being sent back says so until it is presented. */
export const shownStatus = (point: PointState): PointStatus => {
  const back = point.sentBack.at(-1);
  const isBack =
    point.status === 'open' &&
    back !== undefined &&
    (point.openedAt === null || back.at.corrected >= point.openedAt.corrected);
  return isBack && point.presentation === null ? 'sent-back' : point.status;
};
