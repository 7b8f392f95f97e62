import type { Command } from '../../shared/contracts/commands';
import type { ResponseOf } from '../../shared/contracts/contract';
import type { JobEvents, sendCommand as commandRoute, WireEvent } from '../../shared/contracts/jobs';
import type { SigningSecrets } from './signing';
import { ask } from './client';
import type { Answer } from './problem';

export type { WireEvent };
/** What the server made of a command; `replayed` when the same command had arrived before. */
export type CommandAnswer = ResponseOf<typeof commandRoute>;

const place = (jobId: string) => `/api/jobs/${encodeURIComponent(jobId)}`;

/** The job's events after a sequence number. */
export const readEvents = (jobId: string, after: number): Promise<Answer<JobEvents>> =>
  ask('GET', `${place(jobId)}/events`, { query: { after } });

/** Sends a command; the secrets of a signature travel beside it. A wrong PIN is an answer and ends no session. */
export const sendCommand = (
  jobId: string,
  command: Command,
  signing?: SigningSecrets,
): Promise<Answer<CommandAnswer>> =>
  ask('POST', `${place(jobId)}/commands`, {
    body: signing === undefined ? { command } : { command, signing },
    expects401: signing !== undefined,
  });

/** Sends a file's bytes under their hash; sending them again changes nothing. */
export const sendFile = (jobId: string, sha256: string, bytes: Blob): Promise<Answer<unknown>> =>
  ask('PUT', `${place(jobId)}/files/${sha256}`, { body: bytes });

/** Where a photo of the job is fetched. */
export const fileAddress = (jobId: string, sha256: string): string => `${place(jobId)}/files/${sha256}`;
