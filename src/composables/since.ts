import type { Text } from '../../shared/locales/text';

const MINUTE = 60_000;

/** How long ago a moment was, short enough for a list: `26 min`, `3 h 12 min`, `4 d 2 h`. Never less than nothing. */
export function since(from: string, now: string): Text {
  const minutes = Math.max(0, Math.floor((Date.parse(now) - Date.parse(from)) / MINUTE));
  const hours = Math.floor(minutes / 60);
  const days = Math.floor(hours / 24);
  if (days > 0) return { key: 'jobs.since.days', params: { days, hours: hours % 24 } };
  if (hours > 0) return { key: 'jobs.since.hours', params: { hours, minutes: minutes % 60 } };
  return { key: 'jobs.since.minutes', params: { minutes } };
}
