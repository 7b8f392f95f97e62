/** What a clock on the wall at the site shows at an instant, as `2026-09-14T03:10`. */
export const siteLocal = (iso: string, zone: string): string => {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(new Date(iso));
  const at = (type: string): string => parts.find((part) => part.type === type)?.value ?? '';
  return `${at('year')}-${at('month')}-${at('day')}T${at('hour')}:${at('minute')}`;
};

/**
 * The instant at which the site's clock shows a local time; null when it is no time. In the hour that summer time
 * skips it is the hour after, in the one that it repeats the first.
 */
export const instantAtSite = (local: string, zone: string): string | null => {
  const asUtc = Date.parse(`${local}:00Z`);
  if (!/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/.test(local) || Number.isNaN(asUtc)) return null;
  const offsetAt = (ms: number): number => Date.parse(`${siteLocal(new Date(ms).toISOString(), zone)}:00Z`) - ms;
  const candidates = [asUtc - 86_400_000, asUtc + 86_400_000].map((day) => asUtc - offsetAt(day));
  const right = candidates.filter((ms) => siteLocal(new Date(ms).toISOString(), zone) === local);
  return new Date(Math.min(...(right.length > 0 ? right : candidates.map((ms) => ms)))).toISOString();
};
