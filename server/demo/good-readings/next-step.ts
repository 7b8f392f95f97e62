import { contextOf } from '../../../shared/hold-points/context';
import { gasMinutesLeft } from '../../../shared/hold-points/gas';
import { sitePoint } from '../../../shared/hold-points/site';
import type { RecordEntry } from '../../../shared/contracts/commands';
import { dueAt } from '../../../shared/job/due';
import type { Due } from '../../../shared/job/due';
import { reviewPoint } from '../../../shared/job/review';
import type { PointReview } from '../../../shared/job/review';
import type { JobState, PointState } from '../../../shared/job/state';
import { goodReadings, goodSiteReadings } from './index';

/** What a recorder does next at an open point, and how long it takes in minutes. */
export type Step =
  | { do: 'record'; point: string; entries: RecordEntry[]; minutes: number }
  | { do: 'begin-act' | 'end-act'; act: string; minutes: number }
  | { do: 'add-photo'; shot: string; minutes: number };

/** Minutes that an act lasts. */
const lasts: Record<string, number> = { preheat: 25, pass: 14, 'pressure-test': 20 };

const freshenAir = (state: JobState, point: PointState, review: PointReview, name: string, at: string): Step | null => {
  if (!review.acts.some((one) => one.key === name && one.flame)) return null;
  const context = contextOf(state, point);
  const permitEnds = Date.parse(context.value('permit.expires') ?? '') - Date.parse(at);
  const permitRuns = permitEnds > 10 * 60_000;
  if ((gasMinutesLeft(context, at) ?? 0) > 10 && permitRuns) return null;
  const entries = goodSiteReadings(state, at, permitRuns ? 'air' : 'air-and-permit');
  return { do: 'record', point: sitePoint, entries, minutes: 1 };
};

function stepOf(state: JobState, point: PointState, review: PointReview, due: Due, at: string): Step | null {
  switch (due.due) {
    case 'act':
      return (
        freshenAir(state, point, review, due.act, at) ?? { do: 'begin-act', act: due.act, minutes: lasts[due.act] ?? 6 }
      );
    case 'optional-act':
      return null;
    case 'shot':
      return { do: 'add-photo', shot: due.shot, minutes: 1 };
    case 'fields': {
      const asked = new Set(due.fields.map((field) => field.key));
      const entries = goodReadings(state, point, at).filter((one) => asked.has(one.field));
      return entries.length > 0 ? { do: 'record', point: point.place.id, entries, minutes: 2 } : null;
    }
  }
}

/** The next step at an open point on the way to presenting it, all within limits; null when nothing is missing. */
export function nextStep(state: JobState, point: PointState, at: string): Step | null {
  const review = reviewPoint(state, point);
  const running = point.acts.find((run) => run.ended === null);
  if (running) return { do: 'end-act', act: running.act, minutes: 1 };
  for (const due of dueAt(review, point)) {
    const step = stepOf(state, point, review, due, at);
    if (step) return step;
  }
  return null;
}
