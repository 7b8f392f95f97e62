import { describe, expect, it } from 'vitest';
import { since } from '../../../src/composables/since';

const from = '2026-09-14T06:00:00.000Z';

describe('how long something waits', () => {
  it('is said in minutes, then hours, then days', () => {
    expect(since(from, '2026-09-14T06:26:40.000Z')).toEqual({ key: 'jobs.since.minutes', params: { minutes: 26 } });
    expect(since(from, '2026-09-14T09:12:00.000Z')).toEqual({
      key: 'jobs.since.hours',
      params: { hours: 3, minutes: 12 },
    });
    expect(since(from, '2026-09-18T08:00:00.000Z')).toEqual({ key: 'jobs.since.days', params: { days: 4, hours: 2 } });
  });

  it('is never less than nothing when a clock runs ahead', () => {
    expect(since(from, '2026-09-14T05:59:00.000Z').params).toEqual({ minutes: 0 });
  });
});
