import { contextOf } from '../../../shared/hold-points/context';
import { gasMinutesLeft } from '../../../shared/hold-points/gas';
import type { PointKind } from '../../../shared/hold-points/points';
import { sitePoint } from '../../../shared/hold-points/site';
import type { RecordEntry } from '../../../shared/contracts/commands';
import { reviewPoint } from '../../../shared/job/review';
import type { PointReview } from '../../../shared/job/review';
import type { JobState, PointState } from '../../../shared/job/state';
import { goodReadings, goodSiteReadings } from './index';

/** What a recorder does next at an open point, and how long it takes in minutes. */
export type Step =
  | { do: 'record'; point: string; entries: RecordEntry[]; minutes: number }
  | { do: 'begin-act' | 'end-act'; act: string; minutes: number }
  | { do: 'add-photo'; shot: string; minutes: number };

type Part = { act: string } | { read: RegExp };

const act = (name: string): Part => ({ act: name });
const read = (pattern: RegExp): Part => ({ read: pattern });
const rest = read(/./);

/** The order of the work at a point: what must be read before fire is lit, and what can only be read after. */
const order: Record<PointKind, readonly Part[]> = {
  'hot-work-clearance': [rest],
  'height-takeoff': [rest],
  'final-cut': [act('final-cut'), rest],
  'bevel-prep': [act('bevel'), rest],
  'seal-greased-and-checked': [read(/^(direction|seal\.(part|condition|sound)|grease)/), act('set-head'), rest],
  'valve-orientation': [rest],
  'test-plug-removed': [rest],
  'preheat-reached': [act('excavation'), read(/^excavated/), act('preheat'), rest],
  'pass-inspected': [act('tacks'), read(/^tacked/), read(/^temps/), act('pass'), rest],
  'cooled-to-touch': [rest],
  'pressure-test-held': [read(/^(port-probed|fitting-in|exclusion)$/), act('pressure-test'), rest],
};

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

function stepOf(state: JobState, point: PointState, review: PointReview, part: Part, at: string): Step | null {
  if ('act' in part) {
    if (!review.missing.includes(`act:${part.act}`)) return null;
    return (
      freshenAir(state, point, review, part.act, at) ?? {
        do: 'begin-act',
        act: part.act,
        minutes: lasts[part.act] ?? 6,
      }
    );
  }
  const entries = goodReadings(state, point, at, part.read).filter((one) =>
    review.missing.includes(`field:${one.field}`),
  );
  return entries.length > 0 ? { do: 'record', point: point.place.id, entries, minutes: 2 } : null;
}

/** The next step at an open point on the way to presenting it, all within limits; null when nothing is missing. */
export function nextStep(state: JobState, point: PointState, at: string): Step | null {
  const review = reviewPoint(state, point);
  const running = point.acts.find((run) => run.ended === null);
  if (running) return { do: 'end-act', act: running.act, minutes: 1 };
  for (const part of order[point.place.kind]) {
    const step = stepOf(state, point, review, part, at);
    if (step) return step;
  }
  const shot = review.missing.find((key) => key.startsWith('shot:'));
  return shot ? { do: 'add-photo', shot: shot.slice('shot:'.length), minutes: 1 } : null;
}
