import type { OutboxShelf } from './outbox';
import type { OutboxEntry } from './outbox-entry';
import type { Sent } from './send-entry';

/** The world that the sender works in, handed in so that a test can hold the clock and the link. */
export interface SenderWorld {
  shelf: OutboxShelf;
  send(entry: OutboxEntry): Promise<Sent>;
  /** whose entries may go out: the person whom the server knows on this device now; null while nobody is */
  whoSends(): Promise<string | null>;
  /** runs the work while no other tab does; says false when another one does */
  alone(work: () => Promise<void>): Promise<boolean>;
  /** after every change of the shelf */
  changed(entry: OutboxEntry, sent: Sent): Promise<void> | void;
  after(ms: number, work: () => void): () => void;
}

export interface Sender {
  /** tries now; a run under way takes what was put meanwhile along */
  kick(): Promise<void>;
  stop(): void;
}

const FIRST_WAIT_MS = 2_000;
const LONGEST_WAIT_MS = 60_000;

/**
 * Empties the outbox, one entry at a time, the oldest of each job first. What is refused stops its own job's line and
 * no other; what is kept waits, longer each time, and goes at once when somebody kicks (a signal, a look, a new entry).
 */
export function makeSender(world: SenderWorld): Sender {
  let running: Promise<void> | undefined;
  let again = false;
  let wait = FIRST_WAIT_MS;
  let forgetTimer: (() => void) | undefined;

  async function run(): Promise<void> {
    do {
      again = false;
      const outcome: { left: boolean; waitS: number | null } = { left: false, waitS: null };
      const mine = await world.alone(async () => {
        Object.assign(outcome, await emptyLines(world));
      });
      if (!outcome.left && mine) wait = FIRST_WAIT_MS;
      else plan(outcome.waitS);
    } while (again);
  }

  function plan(waitS: number | null): void {
    forgetTimer?.();
    forgetTimer = world.after(Math.max(wait, (waitS ?? 0) * 1000), () => void kick());
    wait = Math.min(wait * 2, LONGEST_WAIT_MS);
  }

  function kick(): Promise<void> {
    again = running !== undefined;
    forgetTimer?.();
    running ??= run().finally(() => (running = undefined));
    return running;
  }

  return { kick, stop: () => forgetTimer?.() };
}

/** Goes through the lines until each is empty or stands still. `left`: something waits that another try may move. */
async function emptyLines(world: SenderWorld): Promise<{ left: boolean; waitS: number | null }> {
  const accountId = await world.whoSends();
  if (accountId === null) return { left: true, waitS: null };
  const still = new Set<string>();
  let kept = false;
  let waitS: number | null = null;
  for (;;) {
    const entry = firstToGo(await world.shelf.of(accountId), still);
    if (entry === undefined) return { left: kept, waitS };
    const sent = await world.send(entry);
    if (sent.is === 'arrived') await world.shelf.take(entry.place);
    else still.add(entry.jobId);
    if (sent.is === 'refused') await world.shelf.refuse(entry.place, sent.refused);
    await world.changed(entry, sent);
    if (sent.is !== 'kept') continue;
    kept = true;
    waitS = Math.max(waitS ?? 0, sent.retryAfterS ?? 0) || null;
    if (sent.signedOut) return { left: true, waitS };
  }
}

/** The oldest entry whose job's line moves: nothing refused stands in front of it. */
export function firstToGo(entries: readonly OutboxEntry[], still: ReadonlySet<string>): OutboxEntry | undefined {
  const stopped = new Set(still);
  for (const entry of entries) {
    if (stopped.has(entry.jobId)) continue;
    if (entry.state === 'waiting') return entry;
    stopped.add(entry.jobId);
  }
  return undefined;
}
