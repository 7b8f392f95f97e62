import { beginSetting } from './begin-setting';
import { evolveEvidence } from './evolve-evidence';
import { evolveSequence } from './evolve-sequence';
import type { JobEvent, JobEventOf } from './events';
import type { JobState } from './state';

const planned = (jobId: string, event: JobEventOf<'job-planned'>): JobState => {
  const { plan, definitions, at } = event.body;
  return {
    id: jobId,
    status: 'planned',
    plan,
    definitions,
    setting: 1,
    ...beginSetting(plan, at),
    earlierSettings: [],
    direction: null,
    proposedDirection: plan.proposedDirection,
    stopped: null,
    handovers: [],
    termsChanges: [],
    people: plan.people,
    ended: null,
    eventCount: 0,
    lastAt: at,
  };
};

/** Events that set work going: a planned job is running from the first of them. */
const startsWork = new Set<JobEvent['type']>(['readings-recorded', 'photo-added', 'act-begun']);

const evolveJob = (state: JobState, event: JobEvent): JobState => {
  switch (event.type) {
    case 'direction-named': {
      const { direction, words, actor, at } = event.body;
      return { ...state, direction: { direction, words, by: actor, at } };
    }
    case 'direction-proposed':
      return { ...state, proposedDirection: event.body.direction };
    case 'work-stopped':
      return { ...state, stopped: { reason: event.body.reason, by: event.body.actor, at: event.body.at } };
    case 'work-resumed':
      return { ...state, stopped: null };
    case 'terms-changed': {
      const { terms, reason, actor, at, signature } = event.body;
      return {
        ...state,
        plan: { ...state.plan, terms },
        termsChanges: [...state.termsChanges, { reason, by: actor, at, signature }],
      };
    }
    case 'shift-handed-over': {
      const { line, to, actor, at } = event.body;
      return { ...state, handovers: [...state.handovers, { line, to, by: actor, at }] };
    }
    case 'instrument-added': {
      const instruments = [...state.plan.instruments, event.body.instrument];
      return { ...state, plan: { ...state.plan, instruments } };
    }
    case 'person-assigned':
      return { ...state, people: [...state.people, event.body.person] };
    case 'person-removed': {
      const { accountId, role } = event.body;
      return { ...state, people: state.people.filter((one) => one.accountId !== accountId || one.role !== role) };
    }
    case 'job-called-off':
    case 'job-sealed': {
      const kind = event.type === 'job-sealed' ? ('sealed' as const) : ('called-off' as const);
      const reason = event.type === 'job-called-off' ? event.body.reason : null;
      const { actor, at, signature } = event.body;
      return { ...state, status: kind, stopped: null, ended: { kind, reason, by: actor, at, signature } };
    }
    default:
      return evolveSequence(evolveEvidence(state, event), event);
  }
};

/**
 * The job after one more event. Pure: the same events give the same state on the phone and on the server.
 * The first event must be `job-planned`; anything else without a state is a programming fault and throws.
 */
export const evolve = (jobId: string, state: JobState | null, event: JobEvent): JobState => {
  if (state === null) {
    if (event.type !== 'job-planned') throw new Error(`a job begins with job-planned, not with ${event.type}`);
    return { ...planned(jobId, event), eventCount: 1 };
  }
  const next = evolveJob(state, event);
  return {
    ...next,
    status: next.status === 'planned' && startsWork.has(event.type) ? 'running' : next.status,
    eventCount: state.eventCount + 1,
    lastAt: event.body.at,
  };
};

/** Folds a whole chain. Null when there are no events. */
export const foldEvents = (jobId: string, events: readonly JobEvent[]): JobState | null =>
  events.reduce<JobState | null>((state, event) => evolve(jobId, state, event), null);
