import type { PointPlace } from '../../../shared/hold-points/points';

/** Where a hold point of a setting stands: every setting has its own, so that a link never means two places. */
export const anchorOf = (setting: number, place: Pick<PointPlace, 'id'>): string =>
  setting === 1 ? place.id : `setting-${setting}-${place.id}`;
