const locales = { en: 'en-US', es: 'es-MX' } as const;

/** Languages the house speaks. */
export type Language = keyof typeof locales;

const made = new Map<string, Intl.DateTimeFormat>();

/**
 * A moment as it is read on site: `02 Mar 2026 03:10`, on the clock of an IANA zone. What is no moment is shown as it
 * stands; an unknown zone falls back to UTC and says so.
 */
export function printInstant(iso: string, zone: string, language: Language): string {
  const moment = new Date(iso);
  if (Number.isNaN(moment.getTime())) return iso;
  const format = formatFor(zone, language);
  const parts = Object.fromEntries(
    (format ?? formatFor('UTC', language))?.formatToParts(moment).map(({ type, value }) => [type, value]) ?? [],
  );
  const month = (parts['month'] ?? '').replace('.', '');
  const printed = `${parts['day']} ${month} ${parts['year']} ${parts['hour']}:${parts['minute']}`;
  return format === undefined ? `${printed} UTC` : printed;
}

/** A day of the calendar: `31 Aug 2026`. */
export const printDay = (day: string, language: Language): string =>
  printInstant(`${day}T00:00:00Z`, 'UTC', language).replace(/ \d\d:\d\d$/, '');

function formatFor(zone: string, language: Language): Intl.DateTimeFormat | undefined {
  const key = `${language} ${zone}`;
  const found = made.get(key);
  if (found !== undefined) return found;
  try {
    const format = new Intl.DateTimeFormat(locales[language], {
      timeZone: zone,
      day: '2-digit',
      month: 'short',
      year: 'numeric',
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
    });
    made.set(key, format);
    return format;
  } catch {
    return undefined;
  }
}
