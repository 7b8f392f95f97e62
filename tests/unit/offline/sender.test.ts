import { describe, expect, it } from 'vitest';
import type { OutboxShelf } from '../../../src/offline/outbox';
import type { OutboxEntry, OutboxItem } from '../../../src/offline/outbox-entry';
import { itemId } from '../../../src/offline/outbox-entry';
import { judgeProblem, type Sent } from '../../../src/offline/send-entry';
import { makeSender, type SenderWorld } from '../../../src/offline/sender';

const file = (name: string): OutboxItem => ({ kind: 'file', body: { sha256: name, bytes: new Blob([name]) } });
const arrived: Sent = { is: 'arrived', answer: null };
const kept: Sent = { is: 'kept', retryAfterS: null, signedOut: false };
const refused: Sent = {
  is: 'refused',
  refused: { problem: { status: 422, code: 'job.refused', more: {} }, refusal: null },
};

/** A shelf in memory and a link that answers what it is told to. */
function aWorld(answers: (id: string, tries: number) => Sent = () => arrived, sender: string | null = 'me') {
  let entries: OutboxEntry[] = [];
  let place = 0;
  const sent: string[] = [];
  const timers: (() => void)[] = [];
  const waits: number[] = [];
  const shelf: OutboxShelf = {
    async put(accountId, jobId, items, createdAt) {
      for (const item of items) {
        entries.push({
          ...item,
          id: itemId(item),
          place: ++place,
          accountId,
          jobId,
          createdAt,
          state: 'waiting',
          refused: null,
        } as OutboxEntry);
      }
    },
    of: async (accountId) => entries.filter((one) => one.accountId === accountId),
    async take(at) {
      entries = entries.filter((one) => one.place !== at);
    },
    async refuse(at, why) {
      entries = entries.map((one) => (one.place === at ? { ...one, state: 'refused', refused: why } : one));
    },
    async replace(at, item) {
      entries = entries.map((one) =>
        one.place === at
          ? ({ ...one, ...item, id: itemId(item), state: 'waiting', refused: null } as OutboxEntry)
          : one,
      );
    },
  };
  const world: SenderWorld = {
    shelf,
    async send(entry) {
      sent.push(entry.id);
      return answers(entry.id, sent.filter((id) => id === entry.id).length);
    },
    whoSends: async () => sender,
    async alone(work) {
      await work();
      return true;
    },
    changed: () => undefined,
    after(ms, work) {
      waits.push(ms);
      timers.push(work);
      return () => undefined;
    },
  };
  const put = (jobId: string, ...names: string[]) =>
    shelf.put('me', jobId, names.map(file), '2026-09-14T12:00:00.000Z');
  return { world, shelf, sent, waits, timers, put, left: () => entries.map((one) => one.id) };
}

describe('the sender', () => {
  it('sends the oldest of a job first and lets go of what arrived', async () => {
    const { world, put, sent, left } = aWorld();
    await put('a', 'one', 'two', 'three');
    await makeSender(world).kick();
    expect(sent).toEqual(['one', 'two', 'three']);
    expect(left()).toEqual([]);
  });

  it('keeps an entry that found no server, and everything behind it, and plans another try', async () => {
    const { world, put, sent, left, waits } = aWorld(() => kept);
    await put('a', 'one', 'two');
    await makeSender(world).kick();
    expect(sent).toEqual(['one']);
    expect(left()).toEqual(['one', 'two']);
    expect(waits).toEqual([2000]);
  });

  it('stops a refused entry’s own line and no other job’s', async () => {
    const { world, put, sent, left } = aWorld((id) => (id === 'one' ? refused : arrived));
    await put('a', 'one', 'two');
    await put('b', 'other');
    await makeSender(world).kick();
    expect(sent).toEqual(['one', 'other']);
    expect(left()).toEqual(['one', 'two']);
  });

  it('goes on behind a refused entry once a person has let go of it', async () => {
    const { world, shelf, put, left } = aWorld((id) => (id === 'one' ? refused : arrived));
    await put('a', 'one', 'two');
    const sender = makeSender(world);
    await sender.kick();
    await shelf.take(1);
    await sender.kick();
    expect(left()).toEqual([]);
  });

  it('waits longer after each try in vain, up to a minute', async () => {
    const { world, put, waits } = aWorld(() => kept);
    await put('a', 'one');
    const sender = makeSender(world);
    for (let tries = 0; tries < 7; tries++) await sender.kick();
    expect(waits).toEqual([2000, 4000, 8000, 16_000, 32_000, 60_000, 60_000]);
  });

  it('waits as long as the server asks', async () => {
    const { world, put, waits } = aWorld(() => ({ is: 'kept', retryAfterS: 30, signedOut: false }));
    await put('a', 'one');
    await makeSender(world).kick();
    expect(waits).toEqual([30_000]);
  });

  it('sends nothing while nobody is signed in', async () => {
    const { world, put, sent } = aWorld(undefined, null);
    await put('a', 'one');
    await makeSender(world).kick();
    expect(sent).toEqual([]);
  });

  it('sends only what belongs to the person whose session it is', async () => {
    const { world, put, sent, left } = aWorld(undefined, 'somebody else');
    await put('a', 'one');
    await makeSender(world).kick();
    expect(sent).toEqual([]);
    expect(left()).toEqual(['one']);
  });

  it('takes along what is put while it sends', async () => {
    const { world, put, sent } = aWorld();
    await put('a', 'one');
    const sender = makeSender(world);
    const first = sender.kick();
    await put('a', 'two');
    await Promise.all([first, sender.kick()]);
    expect(sent).toEqual(['one', 'two']);
  });
});

describe('an answer', () => {
  const problem = (status: number, code: string) => ({ status, code, more: {} });

  it.each([
    [0, 'no-signal'],
    [401, 'signed-out'],
    [429, 'too-often'],
    [500, 'internal'],
    [503, 'busy'],
    [404, 'http-404'],
    [403, 'http-403'],
  ])('of %i with %s says nothing about the entry, which stays', (status, code) => {
    expect(judgeProblem(problem(status, code)).is).toBe('kept');
  });

  it.each([
    [409, 'job.refused'],
    [422, 'job.refused'],
    [403, 'job.refused'],
    [400, 'request.not-understood'],
  ])('of %i with %s is a verdict, which a person resolves', (status, code) => {
    expect(judgeProblem(problem(status, code)).is).toBe('refused');
  });
});
