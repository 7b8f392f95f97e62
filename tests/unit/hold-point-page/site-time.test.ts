import { describe, expect, it } from 'vitest';
import { instantAtSite, siteLocal } from '../../../src/components/hold-point/site-time';

const chicago = 'America/Chicago';

describe('a time at the site', () => {
  it('is the wall clock there, whatever the device’s own zone', () => {
    expect(siteLocal('2026-09-14T12:05:00.000Z', chicago)).toBe('2026-09-14T07:05');
    expect(instantAtSite('2026-09-14T07:05', chicago)).toBe('2026-09-14T12:05:00.000Z');
  });

  it('crosses midnight with its date', () => {
    expect(siteLocal('2026-09-15T03:30:00.000Z', chicago)).toBe('2026-09-14T22:30');
    expect(instantAtSite('2026-09-14T22:30', chicago)).toBe('2026-09-15T03:30:00.000Z');
  });

  it('takes the first of an hour that the end of summer time repeats', () => {
    expect(instantAtSite('2026-11-01T01:30', chicago)).toBe('2026-11-01T06:30:00.000Z');
  });

  it('knows the hour that summer time skips', () => {
    expect(instantAtSite('2026-03-08T02:30', chicago)).toMatch(/^2026-03-08T0[78]:30:00\.000Z$/);
  });

  it('says so when it is no time', () => {
    expect(instantAtSite('', chicago)).toBeNull();
    expect(instantAtSite('2026-13-40T07:05', chicago)).toBeNull();
  });
});
