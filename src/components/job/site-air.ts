import { contextOf, readingThatCounts } from '../../../shared/hold-points/context';
import { gasMinutesLeft, oldestGasReading } from '../../../shared/hold-points/gas';
import { minutesBetween } from '../../../shared/job/actor';
import { currentPoint } from '../../../shared/job/points';
import type { JobState } from '../../../shared/job/state';

/** How old the air check is and how long it still stands, in whole minutes; null while it was not read in full. */
export interface AirAge {
  ageMin: number;
  leftMin: number;
}

export const airAge = (state: JobState, now: string): AirAge | null => {
  const point = currentPoint(state) ?? state.points.at(-1);
  if (point === undefined) return null;
  const context = contextOf(state, { ...point, release: null });
  const oldest = oldestGasReading(context);
  const left = gasMinutesLeft(context, now);
  return oldest === undefined || left === undefined
    ? null
    : { ageMin: Math.max(0, Math.floor(minutesBetween(oldest, now))), leftMin: Math.floor(left) };
};

/** The answer that counts to a question of the site. */
export const siteValue = (state: JobState, field: string): string | undefined =>
  readingThatCounts(state.site[field])?.value;
