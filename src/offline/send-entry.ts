import type { Refusal } from '../../shared/job/refusal';
import { sendCommand, sendFile, type CommandAnswer } from '../api/job';
import type { Problem } from '../api/problem';
import type { EntryRefusal, OutboxEntry } from './outbox-entry';

/** What came of sending an entry: it arrived, the server refused it for good, or it stays and is tried again. */
export type Sent =
  | { is: 'arrived'; answer: CommandAnswer | null }
  | { is: 'refused'; refused: EntryRefusal }
  | { is: 'kept'; retryAfterS: number | null; signedOut: boolean };

/** Sends one entry. Only an answer that the server meant for this very entry lets go of it. */
export async function sendEntry(entry: OutboxEntry): Promise<Sent> {
  const answer =
    entry.kind === 'command'
      ? await sendCommand(entry.jobId, entry.body)
      : await sendFile(entry.jobId, entry.body.sha256, entry.body.bytes);
  if (!answer.ok) return judgeProblem(answer.problem);
  if (entry.kind === 'file') return { is: 'arrived', answer: null };
  // A page in front of the server (a hotel's sign-in) may answer 200 with something else.
  return isAnswer(answer.value)
    ? { is: 'arrived', answer: answer.value }
    : { is: 'kept', retryAfterS: null, signedOut: false };
}

const isAnswer = (value: unknown): value is CommandAnswer =>
  typeof value === 'object' && value !== null && 'events' in value && Array.isArray(value.events);

/** Answers that say nothing about the entry itself: no signal, not signed in, too fast, server unwell, a proxy's page. */
const passing = new Set([0, 401, 408, 421, 425, 429]);

export function judgeProblem(problem: Problem): Exclude<Sent, { is: 'arrived' }> {
  const anonymous = problem.code === `http-${problem.status}`;
  if (passing.has(problem.status) || problem.status >= 500 || anonymous)
    return { is: 'kept', retryAfterS: problem.retryAfterS ?? null, signedOut: problem.status === 401 };
  return { is: 'refused', refused: { problem, refusal: refusalIn(problem) } };
}

/** The rule that stood in the way, when the server named one. */
export function refusalIn(problem: Problem): Refusal | null {
  const refusal = problem.more['refusal'];
  return typeof refusal === 'object' && refusal !== null && 'code' in refusal && 'text' in refusal
    ? (refusal as Refusal)
    : null;
}
