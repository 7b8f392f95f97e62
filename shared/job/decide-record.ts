import { fieldOf, reviewPoint, standingPhotos } from './review';
import { contextAsOf, type PointContext } from '../hold-points/context';
import { judgeFlame } from '../hold-points/gas';
import { commonPractice, judgeFact } from '../hold-points/judging';
import { siteGroups, sitePoint } from '../hold-points/site';
import type { Verdict } from '../hold-points/verdict';
import { definitionOf } from '../hold-points/definitions';
import type { FieldDefinition } from '../hold-points/definition';
import type { RecordEntry } from '../contracts/commands';
import { clockIsDoubtful, samePerson, type PersonRef, type Times } from './actor';
import { accept, event, pointNamed, refuse, type Decider, type Decision, type Deciding } from './decision';
import type { RecordedEntry } from './events';
import { strikeOver } from './decide-strike';
import { runningAct } from './points';
import type { JobState, PointState } from './state';
import { understand } from './understand';

/** Where evidence that arrives now stands: it counts, it withdraws a presentation, or it came too late. */
type Standing = { late: boolean; withdraws: boolean } | Decision;

const isDecision = (standing: Standing): standing is Decision => 'ok' in standing;

/** A reading captured before presenting that arrives later is kept: it withdraws, or stands flagged as late. */
const standingOf = (point: PointState, correctedAt: string): Standing => {
  const before = (time: string | undefined): boolean =>
    time !== undefined && Date.parse(correctedAt) < Date.parse(time);
  switch (point.status) {
    case 'open':
      return { late: false, withdraws: false };
    case 'shut':
      return refuse('point-shut');
    case 'presented':
      return before(point.presentation?.at.corrected)
        ? { late: false, withdraws: true }
        : refuse('point-presented', { since: point.presentation });
    case 'released':
      return before(point.presentation?.at.corrected)
        ? { late: true, withdraws: false }
        : refuse('point-already-released', { since: point.release });
  }
};

/** The points of a second setting carry the names of the first's: what was taken before it began is none of theirs. */
const settingOver = (state: JobState, at: Times): Decision | null => {
  const begun = state.earlierSettings.at(-1)?.ended;
  const before = begun && !clockIsDoubtful(at) && Date.parse(at.corrected) < Date.parse(begun.at.corrected);
  return before ? refuse('of-earlier-setting', { since: begun }) : null;
};

const withdrawal = (input: Deciding<'record'> | Deciding<'add-photo'>, point: string) =>
  event(input, 'presentation-withdrawn', { point, reason: null, cause: 'late-evidence' });

interface Read {
  entry: RecordEntry;
  field: FieldDefinition;
  value: string;
  measuredBy: PersonRef;
}

/** Who measured, under the name that the job knows; undefined for an account that is not on the job. */
const measurerOf = ({ state, stamp }: Deciding<'record'>, named: PersonRef | null): PersonRef | undefined => {
  const self = { accountId: stamp.accountId, name: stamp.name };
  if (named === null || named.accountId === stamp.accountId) return self;
  if (named.accountId === null) return named;
  const person = state.people.find((one) => one.accountId === named.accountId);
  return person && { accountId: person.accountId, name: person.name };
};

/** Understands every entry or says at the first that is not, which one and why. */
const readEntries = (
  input: Deciding<'record'>,
  find: (key: string) => FieldDefinition | undefined,
): Read[] | Decision => {
  const read: Read[] = [];
  for (const entry of input.command.body.entries) {
    const field = find(entry.field);
    const measuredBy = measurerOf(input, entry.measuredBy);
    if (!measuredBy) return refuse('measurer-not-on-job', { params: { name: entry.measuredBy?.name ?? '' } });
    if (!field) return refuse('no-such-field', { params: { field: entry.field } });
    const understood = understand(field, entry.typed, entry.unit);
    if (!understood.ok)
      return refuse('not-understood', {
        params: { typed: entry.typed, why: { key: `entry.${understood.reason}` } },
        missing: [`field:${entry.field}`],
      });
    read.push({ entry, field, value: understood.value, measuredBy });
  }
  return read;
};

/**
 * A second measurement needs its first, and another hand than the first's; so does a first that is taken again after
 * the second. `fields` are all that the point asks for.
 */
const secondHandWrong = (
  read: Read[],
  fields: readonly FieldDefinition[],
  measured: (field: string) => PersonRef | undefined,
): Decision | null => {
  const now = (key: string): PersonRef | undefined =>
    read.findLast((one) => one.field.key === key)?.measuredBy ?? measured(key);
  const touched = (key: string): boolean => read.some((one) => one.field.key === key);
  for (const { key, confirms } of fields) {
    if (confirms === undefined || !(touched(key) || touched(confirms))) continue;
    const [first, second] = [now(confirms), now(key)];
    if (!first) return refuse('first-measurement-missing', { missing: [`field:${confirms}`] });
    if (second && samePerson(first, second)) return refuse('same-person-measured', { params: { name: second.name } });
  }
  return null;
};

const toEntries = (commandId: string, read: Read[]): RecordedEntry[] =>
  read.map(({ entry, field, value, measuredBy }, index) => ({
    id: `${commandId}:${index}`,
    field: entry.field,
    typed: entry.typed,
    unit: entry.unit,
    value,
    site: field.site === true,
    measuredBy,
  }));

const recordAtSite = (input: Deciding<'record'>): Decision => {
  const groups = siteGroups();
  const read = readEntries(input, (key) => fieldOf({ groups }, key));
  if (!Array.isArray(read)) return read;
  return accept(
    event(input, 'readings-recorded', { point: sitePoint, entries: toEntries(input.command.id, read), late: false }),
  );
};

export const decideRecord: Decider<'record'> = (input) => {
  const { state, command, at } = input;
  if (command.body.point === sitePoint) return recordAtSite(input);
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  const review = reviewPoint(state, point);
  const read = readEntries(input, (key) => fieldOf(review, key));
  if (!Array.isArray(read)) return read;
  if (read.every(({ field }) => field.site)) return recordAtSite(input);
  const standing = settingOver(state, at) ?? standingOf(point, at.corrected);
  if (isDecision(standing)) return standing;
  const struck = strikeOver(
    point,
    read.map(({ field }) => field.key),
  );
  if (struck) return refuse('row-struck', { since: struck });
  const wrongHand = secondHandWrong(read, review.fields, (field) => review.context.read(field)?.measuredBy);
  if (wrongHand) return wrongHand;
  const recorded = event(input, 'readings-recorded', {
    point: point.place.id,
    entries: toEntries(command.id, read),
    late: standing.late,
  });
  return standing.withdraws ? accept(withdrawal(input, point.place.id), recorded) : accept(recorded);
};

export const decideAddPhoto: Decider<'add-photo'> = (input) => {
  const { state, command, at } = input;
  const { point: id, takenAt, ...rest } = command.body;
  const point = pointNamed(state, id);
  if (!point) return refuse('no-such-point');
  const review = reviewPoint(state, point);
  if (!review.shots.some((shot) => shot.key === rest.shot))
    return refuse('no-such-shot', { params: { shot: rest.shot } });
  const standing = settingOver(state, at) ?? standingOf(point, at.corrected);
  if (isDecision(standing)) return standing;
  const added = event(input, 'photo-added', { point: id, photo: command.id, ...rest, takenAt, late: standing.late });
  return standing.withdraws ? accept(withdrawal(input, id), added) : accept(added);
};

export const decideSetPhotoAside: Decider<'set-photo-aside'> = (input) => {
  const { state, command } = input;
  const point = pointNamed(state, command.body.point);
  if (!point) return refuse('no-such-point');
  if (point.status !== 'open') return refuse('point-not-open', { since: point.release ?? point.presentation });
  if (!standingPhotos(point.photos).some((photo) => photo.id === command.body.photo)) return refuse('no-such-photo');
  return accept(event(input, 'photo-set-aside', command.body));
};

/** Without a sure time nobody knows how old the air is: a stop for fire; every other act is held by its times later. */
const judgeActClock = (context: PointContext, flame: boolean): Verdict[] =>
  judgeFact(context, {
    limit: 'act-clock',
    kind: flame ? 'stop' : 'advice',
    about: [],
    source: commonPractice,
    holds: false,
  });

/**
 * What would be judged if this act began at `at` (ISO): the screen asks the same before the tap. Null where the point
 * has no such act. `doubtful`: the clock that says `at` is in doubt.
 */
export const judgeActBegin = (
  state: JobState,
  point: PointState,
  act: string,
  at: string,
  doubtful = false,
): Verdict[] | null => {
  const context = contextAsOf(state, point, at);
  const definition = definitionOf(point.place.kind);
  const found = definition.acts(context).find((one) => one.key === act);
  if (!found) return null;
  return [
    ...(doubtful ? judgeActClock(context, found.flame) : []),
    ...(found.flame ? judgeFlame(context, at) : []),
    ...(definition.beforeAct?.(context, act, at) ?? []),
  ];
};

export const decideBeginAct: Decider<'begin-act'> = (input) => {
  const { state, command, at } = input;
  const { point: id, act } = command.body;
  const point = pointNamed(state, id);
  if (!point) return refuse('no-such-point');
  if (state.stopped) return refuse('work-stopped', { since: state.stopped });
  const over = settingOver(state, at);
  if (over) return over;
  if (point.status === 'shut') return refuse('point-shut');
  if (point.status !== 'open') return refuse('point-not-open', { since: point.release ?? point.presentation });
  const running = runningAct(state);
  if (running) return refuse('act-running', { since: running.begun });
  const verdicts = judgeActBegin(state, point, act, at.corrected, clockIsDoubtful(at));
  if (verdicts === null) return refuse('no-such-act');
  const blockers = verdicts.filter((verdict) => verdict.kind === 'stop' && verdict.outcome === 'outside');
  if (blockers.length > 0) return refuse('act-not-ready', { blockers });
  return accept(event(input, 'act-begun', { point: id, act, verdicts }));
};

export const decideEndAct: Decider<'end-act'> = (input) => {
  const { state, command } = input;
  const { point: id, act } = command.body;
  const point = pointNamed(state, id);
  if (!point) return refuse('no-such-point');
  if (!point.acts.some((run) => run.act === act && run.ended === null)) return refuse('act-not-running');
  return accept(event(input, 'act-ended', command.body));
};
