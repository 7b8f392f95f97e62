import { describe, expect, it } from 'vitest';
import { aJob } from '../../support/a-job';
import { recordPoint, walkTo } from '../../support/drive';

const later = (now: number, minutes: number): string => new Date(now + minutes * 60_000).toISOString();

describe('a time that is typed', () => {
  it.each([
    ['cooled-to-touch', 'cooling.2.at', 600],
    ['pressure-test-held', 'hold.end', 600],
    ['pass-1-inspected', 'rods.1.out-of-oven', 600],
  ])('at %s, %s, may not lie ahead of when it was typed', (point, field, minutes) => {
    const job = aJob();
    walkTo(job, point);
    recordPoint(job, point, { [field]: later(job.now, minutes) });
    const decision = job.try('present', { point, ...job.signing(point) }, job.person('welder'));
    expect(decision).toMatchObject({ ok: false, refusal: { code: 'outside-stop' } });
    if (!decision.ok) expect(decision.refusal.blockers.map((verdict) => verdict.limit)).toContain(`${field}.ahead`);
  });

  it('is meant to lie ahead where a permit expires', () => {
    const job = aJob();
    recordPoint(job, 'hot-work-clearance', { 'permit.expires': later(job.now, 720) });
    expect(
      job.try('present', { point: 'hot-work-clearance', ...job.signing('hot-work-clearance') }, job.person('welder'))
        .ok,
    ).toBe(true);
  });
});
