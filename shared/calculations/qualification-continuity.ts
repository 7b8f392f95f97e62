import { addMonths, readDate, writeDate } from './calendar-date';
import { LIMITS } from './limits-data';
import { refuse, type Outcome } from './outcome';

export const qualificationContinuityInfo = {
  id: 'qualification-continuity',
  version: 1,
  formula:
    'in force through the same day six months after the process was last used; short months end on their last day',
  source: 'ASME IX QW-322; the end-of-month rule is a convention of the house',
  range: 'dates written YYYY-MM-DD',
} as const;

/** Whether a welder's qualification for a process is in force on a day, and the last day it is. Dates YYYY-MM-DD. */
export const qualificationContinuity = (welder: {
  lastUsed: string;
  onDay: string;
}): Outcome<{ lastDay: string; inForce: boolean }> => {
  const [lastUsed, onDay] = [readDate(welder.lastUsed), readDate(welder.onDay)];
  if (lastUsed === null) return refuse('date-not-understood', 'lastUsed');
  if (onDay === null) return refuse('date-not-understood', 'onDay');
  const lastDay = writeDate(addMonths(lastUsed, LIMITS.continuityMonths.value));
  return { ok: true, lastDay, inForce: writeDate(onDay) <= lastDay };
};
