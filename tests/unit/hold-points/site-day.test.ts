import { expect, it } from 'vitest';
import { siteDay } from '../../../shared/hold-points/site-day';

it.each([
  ['America/Chicago', '2026-09-15T04:59:59.000Z', '2026-09-14'],
  ['America/Chicago', '2026-09-15T05:00:00.000Z', '2026-09-15'],
  ['UTC', '2026-01-01T00:00:00.000Z', '2026-01-01'],
  ['Asia/Tokyo', '2026-12-31T15:00:00.000Z', '2027-01-01'],
])('in %s it is on %s the day %s', (zone, instant, day) => {
  expect(siteDay(zone, instant)).toBe(day);
});
