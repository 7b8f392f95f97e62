import type { Command } from '../../shared/contracts/commands';
import type { Refusal } from '../../shared/job/refusal';
import type { Problem } from '../api/problem';

/** Why the server said no to an entry: a rule of the job with its sentence, or a door that stayed shut. */
export interface EntryRefusal {
  problem: Problem;
  refusal: Refusal | null;
}

interface EntryFrame {
  /** the order in which it goes out; given by the database */
  place: number;
  /** the command's id, or the file's hash in its job */
  id: string;
  accountId: string;
  jobId: string;
  createdAt: string;
  state: 'waiting' | 'refused';
  refused: EntryRefusal | null;
}

export type OutboxEntry = EntryFrame &
  ({ kind: 'command'; body: Command } | { kind: 'file'; body: { sha256: string; bytes: Blob } });

/** What is handed to the outbox; place, state and time are put on it there. */
export type OutboxItem = { kind: 'command'; body: Command } | { kind: 'file'; body: { sha256: string; bytes: Blob } };

export const itemId = (item: OutboxItem): string => (item.kind === 'command' ? item.body.id : item.body.sha256);
