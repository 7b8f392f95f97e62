import type { Shown } from '../contracts/commands';
import type { PointPlace } from '../hold-points/points';
import type { RepairRound } from '../hold-points/sequence';
import type { Verdict } from '../hold-points/verdict';
import type { ActorStamp, PersonRef, Times } from './actor';
import type { AsJudged, Signature } from './events';
import type { JobPerson, JobPlan } from './plan';

export type JobStatus = 'planned' | 'running' | 'sealed' | 'called-off';
export type PointStatus = 'shut' | 'open' | 'presented' | 'released';

/** A reading with all that is kept of it. The newest of a field counts; those before it stay on record. */
export interface Reading {
  id: string;
  field: string;
  typed: string;
  unit: string | null;
  value: string;
  measuredBy: PersonRef;
  typedBy: ActorStamp;
  at: Times;
  /** arrived after the release that it came too late for */
  late: boolean;
  /** its row was begun by mistake: it stays on record and counts no more */
  struck: { reason: string; by: ActorStamp; at: Times } | null;
}

export interface Photo {
  id: string;
  shot: string;
  sha256: string;
  previewSha256: string | null;
  width: number;
  height: number;
  takenAt: string | null;
  by: ActorStamp;
  at: Times;
  late: boolean;
  setAside: { reason: string; by: ActorStamp; at: Times } | null;
}

/** One go of an act: every flame has its begun and ended, and may be repeated. */
export interface ActRun {
  id: string;
  act: string;
  begun: { by: ActorStamp; at: Times };
  ended: { by: ActorStamp; at: Times } | null;
  /** as judged at begun */
  verdicts: Verdict[];
}

export interface Concession {
  limit: string;
  basis: string[];
  reason: string;
  verdict: Verdict;
  by: ActorStamp;
  at: Times;
  signature: Signature;
}

export interface Release {
  by: ActorStamp;
  at: Times;
  readings: string[];
  photos: string[];
  statements: string[];
  judged: AsJudged;
  signature: Signature;
}

export interface Presentation {
  by: ActorStamp;
  at: Times;
  contentHash: string;
  judged: AsJudged;
}

/** Everything recorded at a point between two reopenings. */
export interface Evidence {
  readings: Record<string, Reading[]>;
  photos: Photo[];
  acts: ActRun[];
  concessions: Concession[];
  presentation: Presentation | null;
  release: Release | null;
}

export interface SentBack {
  reason: string;
  by: ActorStamp;
  at: Times;
  /** readings and photos that stood when it was sent back, so that the owner sees what changed since */
  contentHash: string;
}

export interface PointState extends Evidence {
  place: PointPlace;
  status: PointStatus;
  /** all sendings back, the newest last; on top of an open point until it is presented again */
  sentBack: SentBack[];
  /** presentations taken back before they were answered, the newest last */
  withdrawn: { by: ActorStamp; at: Times }[];
  reopened: { reason: string; by: ActorStamp; at: Times }[];
  superseded: Evidence[];
  /** the repair round that carried this unreleased point's work on, if one did */
  carriedInto: number | null;
  /** when it last became open */
  openedAt: Times | null;
}

export interface Custody {
  port: number;
  out: boolean;
  where: string | null;
  holder: string | null;
  /** how it was closed again */
  back: 'same' | 'replaced' | null;
}

export interface Direction {
  direction: string;
  words: string | null;
  by: ActorStamp;
  at: Times;
}

export interface EarlierSetting {
  setting: number;
  reason: string;
  points: PointState[];
  /** readings of the site that it was done on; the next one reads the air anew */
  site: Record<string, Reading[]>;
  ended: { by: ActorStamp; at: Times };
}

/** A job as its events make it. Nothing here is stored; it is folded from the chain on every side. */
export interface JobState {
  id: string;
  status: JobStatus;
  plan: JobPlan;
  definitions: number;
  setting: number;
  rounds: RepairRound[];
  points: PointState[];
  /** readings that belong to the site and not to one point: gas checks, permit, the look before resuming */
  site: Record<string, Reading[]>;
  /** points of settings whose head was cut off again */
  earlierSettings: EarlierSetting[];
  direction: Direction | null;
  proposedDirection: string | null;
  custody: Custody[];
  /** the head has been lifted over the stub: turning it now rolls the seal */
  headSet: boolean;
  stopped: { reason: string; by: ActorStamp; at: Times } | null;
  handovers: { line: string; to: string | null; by: ActorStamp; at: Times }[];
  termsChanges: { reason: string; by: ActorStamp; at: Times; signature: Signature | null }[];
  people: JobPerson[];
  ended: {
    kind: 'sealed' | 'called-off';
    reason: string | null;
    by: ActorStamp;
    at: Times;
    signature: Signature;
  } | null;
  eventCount: number;
  lastAt: Times;
}

export type { Shown };
