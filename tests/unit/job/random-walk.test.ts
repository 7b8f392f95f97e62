import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { recordPoint, walkTo } from '../../support/drive';
import { canonicalJson } from '../../../shared/ledger/canonical-json';
import { foldEvents } from '../../../shared/job/evolve';
import { handIsIn } from '../../../shared/job/decide-release';
import { reviewPoint } from '../../../shared/job/review';
import { concessionTotal } from '../../../shared/job/decide-failure';
import { ownerOf } from '../../../shared/hold-points/points';
import type { Role } from '../../../shared/permissions/roles';
import { aJob, type TestJob } from '../../support/a-job';
import { aPhoto, cleanAir } from '../../support/clearance';

const roles: readonly Role[] = ['welder', 'company_rep', 'tool_pusher', 'coordinator'];

/** One step of a careless crowd: anything that anybody could send at this moment, most of it out of turn. */
const step = fc.record({
  what: fc.constantFrom(
    'good',
    'good',
    'good',
    'good',
    'record',
    'photo',
    'begin',
    'end',
    'present',
    'present',
    'present',
    'withdraw',
    'release',
    'release',
    'release',
    'concede',
    'concede',
    'send-back',
    'reopen',
    'reopen',
    'repair',
    'stop',
    'resume',
    'direction',
    'seal',
    'wait',
  ),
  who: fc.constantFrom(...roles, ...Array<'right'>(8).fill('right')),
  where: fc.nat({ max: 40 }),
  minutes: fc.integer({ min: 1, max: 80 }),
});
type Step = typeof step extends fc.Arbitrary<infer S> ? S : never;

/** Whose it would be to send this, so that the crowd also gets somewhere. */
const rightFor = (what: Step['what'], owner: Role): Role => {
  if (what === 'release' || what === 'send-back') return owner;
  if (what === 'direction') return 'tool_pusher';
  return ['concede', 'reopen', 'repair', 'resume', 'seal'].includes(what) ? 'company_rep' : 'welder';
};

/** The good way may be shut by what was sent before: then this step does nothing. */
const tryTo = (go: () => void): void => {
  try {
    go();
  } catch (error) {
    if (!(error instanceof Error) || !/was refused|never became complete/.test(error.message)) throw error;
  }
};

/** Sends one command, whether it fits or not; the rules must take it or refuse it, never break. */
const take = (job: TestJob, { what, who, where, minutes }: Step): void => {
  const points = job.job.points;
  const current = points.find((point) => point.status === 'open' || point.status === 'presented');
  // most of the steps go where the work is, the others anywhere
  const target = where % 4 !== 0 && current ? current : points[where % points.length]!;
  const point = target.place.id;
  const actor = job.person(who === 'right' ? rightFor(what, ownerOf[target.place.kind]) : who);
  const reason = 'Because it was so on site.';
  const review = reviewPoint(job.job, target);
  switch (what) {
    case 'good':
      if (current?.status === 'open' && !job.job.stopped) tryTo(() => recordPoint(job, current.place.id));
      return;
    case 'record':
      job.try(
        'record',
        {
          point,
          entries: [
            {
              field: review.fields[where % review.fields.length]?.key ?? 'x',
              typed: '8',
              unit: 'in',
              measuredBy: null,
            },
          ],
        },
        actor,
      );
      return;
    case 'photo':
      job.try('add-photo', { point, ...aPhoto(review.shots[0]?.key ?? 'x', where + 1) }, actor);
      return;
    case 'begin':
      job.try('begin-act', { point, act: review.acts[0]?.key ?? 'x' }, actor);
      return;
    case 'end':
      job.try('end-act', { point, act: review.acts[0]?.key ?? 'x' }, actor);
      return;
    case 'present':
      job.try('present', { point, ...job.signing(point) }, actor);
      return;
    case 'withdraw':
      job.try('withdraw', { point, reason: null }, actor);
      return;
    case 'release':
      job.try('release', { point, ...job.signing(point), statements: [...review.statements] }, actor);
      return;
    case 'concede': {
      const items = review.verdicts.slice(0, 3).map(({ limit, basis }) => ({ limit, basis, reason }));
      if (items.length > 0)
        job.try(
          'concede',
          {
            point,
            items:
              review.unconceded.length > 0
                ? review.unconceded.map(({ limit, basis }) => ({ limit, basis, reason }))
                : items,
            ...job.signing(point),
          },
          actor,
        );
      return;
    }
    case 'send-back':
      job.try('send-back', { point, reason, contentHash: target.presentation?.contentHash ?? '0'.repeat(64) }, actor);
      return;
    case 'reopen':
      job.try('reopen', { point, reason, ...job.signing(point) }, actor);
      return;
    case 'repair':
      job.try('open-repair-round', { reason, passes: 1, ...job.signingJob() }, actor);
      return;
    case 'stop':
      job.try('stop-work', { reason }, actor);
      return;
    case 'resume':
      job.try('record', { point: 'site', entries: cleanAir() }, job.person('welder'));
      job.try('resume-work', { note: reason, ...job.signingJob() }, actor);
      return;
    case 'direction':
      job.try('name-direction', { direction: 'mud-tanks', words: null }, actor);
      return;
    case 'seal':
      job.try('seal', { concessions: concessionTotal(job.job), ...job.signingJob() }, actor);
      return;
    case 'wait':
      job.minutes(minutes);
  }
};

/** What must be true of a job whatever was sent to it. */
const holds = (job: TestJob): void => {
  const live = job.job.points.filter((point) => point.carriedInto === null);
  const firstUnreleased = live.findIndex((point) => point.status !== 'released');
  live.forEach((point, index) => {
    if (firstUnreleased >= 0 && index > firstUnreleased)
      expect(point.status, `${point.place.id} is ahead of its turn`).toBe('shut');
  });
  expect(live.filter((point) => point.status === 'open' || point.status === 'presented').length).toBeLessThanOrEqual(1);
  for (const point of live.filter((one) => one.status === 'released')) {
    expect(point.release?.by.role, 'released by its owner').toBe(ownerOf[point.place.kind]);
    expect(handIsIn(reviewPoint(job.job, point), point, point.release!.by), 'released by another hand').toBe(false);
    const outside = point.release!.judged.verdicts.filter((verdict) => verdict.outcome === 'outside');
    expect(
      outside.filter((verdict) => verdict.kind === 'stop'),
      'no stop was released',
    ).toEqual([]);
    for (const hold of outside.filter((verdict) => verdict.kind === 'hold'))
      expect(
        point.concessions.some((one) => one.limit === hold.limit),
        `${hold.limit} was conceded`,
      ).toBe(true);
  }
  if (job.job.status === 'sealed') expect(live.every((point) => point.status === 'released')).toBe(true);
};

describe('whatever is sent to a job', () => {
  it('keeps order and ownership, and its events fold to the same job again', { timeout: 120_000 }, () => {
    const happened = new Map<string, number>();
    const starts = ['hot-work-clearance', 'final-cut', 'valve-orientation', 'pass-1-inspected', 'cooled-to-touch'];
    fc.assert(
      fc.property(fc.constantFrom(...starts), fc.array(step, { minLength: 25, maxLength: 45 }), (start, steps) => {
        const job = aJob();
        walkTo(job, start);
        const before = job.events.length;
        for (const one of steps) {
          take(job, one);
          holds(job);
        }
        for (const { type } of job.events.slice(before)) happened.set(type, (happened.get(type) ?? 0) + 1);
        expect(canonicalJson(foldEvents(job.id, job.events))).toBe(canonicalJson(job.job));
      }),
      { numRuns: 50 },
    );
    // the crowd is careless, not idle: what matters most has happened, or the walk has proved nothing
    for (const type of ['point-presented', 'point-released', 'work-stopped'])
      expect(happened.get(type) ?? 0, type).toBeGreaterThan(0);
  });
});
