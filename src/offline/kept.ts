import type { RecordEntry } from '../../shared/contracts/commands';
import type { WireEvent } from '../api/job';

/** A job as the server last told it to one person. */
export interface CachedJob {
  accountId: string;
  jobId: string;
  events: WireEvent[];
}

/** Readings typed for a point before it opened, the newest of each field. They are no evidence until they are recorded. */
export interface PointDraft {
  accountId: string;
  jobId: string;
  point: string;
  entries: RecordEntry[];
}
