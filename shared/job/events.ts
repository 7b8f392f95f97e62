import type { Verdict } from '../hold-points/verdict';
import type { PointId } from '../hold-points/points';
import type { Role } from '../permissions/roles';
import type { Shown } from '../contracts/commands';
import type { ActorStamp, PersonRef, Times } from './actor';
import type { Head, Instrument, JobPerson, JobPlan, Terms } from './plan';

/** What a signature says and what it is bound to (printed name, time and meaning stand in every form of the record). */
export interface Signature {
  printedName: string;
  role: Role;
  /** message key of the meaning, e.g. `signature.release` */
  meaning: string;
  contentHash: string;
  shown: Shown;
}

export interface RecordedEntry {
  /** command id and place in the command: the same on the phone and on the server */
  id: string;
  field: string;
  typed: string;
  unit: string | null;
  /** as understood: decimal in the field's own unit, `yes`/`no`, a choice's code, an ISO instant, or the text */
  value: string;
  /** belongs to the site and not to the point that it was typed at */
  site: boolean;
  measuredBy: PersonRef;
}

/** Verdicts and versions as they stood when it was judged; nothing sealed is judged again. */
export interface AsJudged {
  verdicts: Verdict[];
  definition: { kind: string; version: number };
  calculations: { id: string; version: number }[];
}

interface EventBodies {
  'job-planned': { plan: JobPlan; definitions: number };
  'readings-recorded': { point: PointId; entries: RecordedEntry[]; late: boolean };
  'photo-added': {
    point: PointId;
    photo: string;
    shot: string;
    sha256: string;
    previewSha256: string | null;
    width: number;
    height: number;
    takenAt: string | null;
    late: boolean;
  };
  'photo-set-aside': { point: PointId; photo: string; reason: string };
  'row-struck': { point: PointId; group: string; row: number; readings: string[]; reason: string };
  'act-begun': { point: PointId; act: string; verdicts: Verdict[] };
  'act-ended': { point: PointId; act: string };
  'point-presented': { point: PointId; contentHash: string; judged: AsJudged };
  'presentation-withdrawn': { point: PointId; reason: string | null; cause: 'recorder' | 'late-evidence' };
  'point-released': {
    point: PointId;
    readings: string[];
    photos: string[];
    statements: string[];
    judged: AsJudged;
    signature: Signature;
  };
  'point-sent-back': { point: PointId; reason: string; contentHash: string };
  'reading-conceded': {
    point: PointId;
    items: { limit: string; basis: string[]; reason: string; verdict: Verdict }[];
    signature: Signature;
  };
  'point-reopened': { point: PointId; reason: string; signature: Signature };
  'repair-round-opened': { round: number; passes: number; from: PointId; reason: string; signature: Signature };
  'setting-begun': { setting: number; head: Head; targetHeightIn: string; reason: string; signature: Signature };
  'direction-named': { direction: string; words: string | null };
  'direction-proposed': { direction: string };
  'work-stopped': { reason: string };
  'work-resumed': { note: string; verdicts: Verdict[]; signature: Signature };
  'terms-changed': { terms: Terms; reason: string; signature: Signature | null };
  'shift-handed-over': { line: string; to: string | null };
  'instrument-added': { instrument: Instrument };
  'person-assigned': { person: JobPerson };
  'person-removed': { accountId: string; name: string; role: Role; reason: string };
  'job-called-off': { reason: string; signature: Signature };
  'job-sealed': { concessions: number; signature: Signature };
}

export type JobEventType = keyof EventBodies;

/** What stands in every event's body beside its own content. */
export interface EventFrame {
  actor: ActorStamp;
  at: Times;
  /** the command that it came from */
  commandId: string;
}

export type JobEventOf<T extends JobEventType> = { type: T; schema: 1; body: EventBodies[T] & EventFrame };
/** A fact of the job. Append only; a correction is a new event. Numbers are integers or decimal strings. */
export type JobEvent = { [T in JobEventType]: JobEventOf<T> }[JobEventType];
