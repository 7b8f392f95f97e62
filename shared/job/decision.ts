import type { CommandOf, CommandType, Shown } from '../contracts/commands';
import type { HashText } from '../ledger/chain';
import type { Role } from '../permissions/roles';
import type { ActorStamp, Times } from './actor';
import { contentHashOf, jobContentHashOf } from './content';
import type { EventFrame, JobEvent, JobEventOf, JobEventType, Signature } from './events';
import { findPoint } from './points';
import { refusal, type Refusal, type RefusalCode } from './refusal';
import type { JobState, PointState } from './state';

/** Somebody acting on a job: the roles are those that he holds on it. */
export interface JobActor {
  accountId: string;
  name: string;
  roles: readonly Role[];
}

export type Decision = { ok: true; events: JobEvent[] } | { ok: false; refusal: Refusal };

/** What every rule gets to decide one command of type `T` on a job that exists. */
export interface Deciding<T extends CommandType> {
  state: JobState;
  command: CommandOf<T>;
  actor: JobActor;
  /** the role under which it is done */
  stamp: ActorStamp;
  at: Times;
  hash: HashText;
}

export type Decider<T extends CommandType> = (input: Deciding<T>) => Decision;

export const refuse = (code: RefusalCode, extra?: Parameters<typeof refusal>[1]): Decision => ({
  ok: false,
  refusal: refusal(code, extra),
});

export const accept = (...events: JobEvent[]): Decision => ({ ok: true, events });

type Framed = { stamp: ActorStamp; at: Times; command: { id: string } };

/** Puts who, when and which command round an event's own content. */
export const event = <T extends JobEventType>(
  frame: Framed,
  type: T,
  body: Omit<JobEventOf<T>['body'], keyof EventFrame>,
): JobEvent =>
  ({
    type,
    schema: 1,
    body: { ...body, actor: frame.stamp, at: frame.at, commandId: frame.command.id },
  }) as unknown as JobEvent;

/** The signature of this actor for a meaning, bound to the content's hash. */
export const signature = (input: Framed, meaning: string, body: { contentHash: string; shown: Shown }): Signature => ({
  printedName: input.stamp.name,
  role: input.stamp.role,
  meaning: `signature.${meaning}`,
  contentHash: body.contentHash,
  shown: body.shown,
});

/** The signed content must be the content as it stands: otherwise somebody was faster. */
export const contentMoved = (
  input: { state: JobState; hash: HashText },
  point: PointState,
  body: { contentHash: string; shown: Shown },
): Decision | null =>
  contentHashOf(input.state, point, body.shown, input.hash) === body.contentHash
    ? null
    : refuse('content-changed', { since: lastChangeOf(input.state, point) });

export const jobContentMoved = (
  input: { state: JobState; hash: HashText },
  body: { contentHash: string; shown: Shown },
): Decision | null =>
  jobContentHashOf(input.state, body.shown, input.hash) === body.contentHash ? null : refuse('content-changed');

/** Who touched a point's evidence last, so that the loser of a race is told. */
export const lastChangeOf = (state: JobState, point: PointState): { by: ActorStamp; at: Times } | null => {
  const all = [
    ...Object.values(point.readings)
      .flat()
      .flatMap((one) => [{ by: one.typedBy, at: one.at }, ...(one.struck ? [one.struck] : [])]),
    ...Object.values(state.site)
      .flat()
      .map((one) => ({ by: one.typedBy, at: one.at })),
    ...point.photos.flatMap((one) => (one.setAside ? [one, one.setAside] : [one])),
    ...point.concessions,
    ...point.acts.flatMap((run) => (run.ended ? [run.begun, run.ended] : [run.begun])),
    ...(point.presentation ? [point.presentation] : []),
  ];
  const last = all.sort((a, b) => (a.at.received ?? '').localeCompare(b.at.received ?? '')).at(-1);
  return last ? { by: last.by, at: last.at } : null;
};

/** The point named in a command, or the refusal that says there is none. */
export const pointNamed = (state: JobState, id: string): PointState | null => findPoint(state, id) ?? null;
