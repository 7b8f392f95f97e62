import type { RecordEntry } from '../../../shared/contracts/commands';
import { contextOf } from '../../../shared/hold-points/context';
import type { FieldDefinition } from '../../../shared/hold-points/definition';
import type { PointKind } from '../../../shared/hold-points/points';
import { siteGroups } from '../../../shared/hold-points/site';
import { reviewPoint } from '../../../shared/job/review';
import type { JobState, PointState } from '../../../shared/job/state';
import type { Answers } from './answers';
import { goodBevel, goodCut, goodTakeoff } from './cut';
import { goodPlug, goodSeal, goodValve } from './head';
import { goodAir, goodClearance, goodPermit, goodResume } from './site';
import { goodTest } from './test';
import { goodCooling, goodPass, goodPreheat } from './weld';

const answers: Record<PointKind, Answers> = {
  'hot-work-clearance': goodClearance,
  'height-takeoff': goodTakeoff,
  'final-cut': goodCut,
  'bevel-prep': goodBevel,
  'seal-greased-and-checked': goodSeal,
  'valve-orientation': goodValve,
  'test-plug-removed': goodPlug,
  'preheat-reached': goodPreheat,
  'pass-inspected': goodPass,
  'cooled-to-touch': goodCooling,
  'pressure-test-held': goodTest,
};

/** Somebody other than the recorder, for what two people measure. */
const secondHand = ({ people }: JobState): NonNullable<RecordEntry['measuredBy']> => {
  const second = people.filter((one) => one.role === 'welder')[1];
  return second ? { accountId: second.accountId, name: second.name } : { accountId: null, name: 'P. Lindqvist' };
};

const entryOf = (state: JobState, field: FieldDefinition, typed: string): RecordEntry => ({
  field: field.key,
  typed,
  unit: field.of.type === 'quantity' ? field.of.unit : null,
  measuredBy: field.confirms ? secondHand(state) : null,
});

/**
 * Readings within every limit for all that a point asks for now, as they would be typed at `at` (ISO). Pure: the demo,
 * the tests and the walks through the browser record the same job.
 */
export function goodReadings(state: JobState, point: PointState, at: string): RecordEntry[] {
  const context = contextOf(state, point);
  const known = answers[point.place.kind](context, at);
  return reviewPoint(state, point)
    .fields.filter((field) => field.required)
    .flatMap((field) => {
      const typed = known[field.key];
      return typed === undefined ? [] : [entryOf(state, field, typed)];
    });
}

/** Readings of the site, which may be taken at any time: air and permit, or the look before stopped work goes on. */
export function goodSiteReadings(
  state: JobState,
  at: string,
  what: 'air' | 'air-and-permit' | 'resume',
): RecordEntry[] {
  const point = state.points.find((one) => one.status !== 'released') ?? state.points[0];
  if (!point) return [];
  const context = contextOf(state, point);
  const known = {
    ...(what === 'resume' ? goodResume(context, at) : goodAir(context, at)),
    ...(what === 'air-and-permit' ? goodPermit(context, at) : {}),
  };
  return siteGroups()
    .flatMap((group) => group.fields)
    .flatMap((field) => {
      const typed = known[field.key];
      return typed === undefined ? [] : [entryOf(state, field, typed)];
    });
}
