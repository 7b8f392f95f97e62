/**
 * The calendar day (ISO date) of an instant where the job is: in the evening on site it is already tomorrow in UTC,
 * and a qualification or a calibration runs out by the site's calendar.
 * @example siteDay('America/Chicago', '2026-09-15T01:30:00.000Z') // '2026-09-14'
 */
export const siteDay = (zone: string, instant: string): string => {
  const parts = new Intl.DateTimeFormat('en-US', { timeZone: zone, year: 'numeric', month: '2-digit', day: '2-digit' })
    .formatToParts(new Date(instant))
    .reduce<Record<string, string>>((found, part) => ({ ...found, [part.type]: part.value }), {});
  return `${parts.year}-${parts.month}-${parts.day}`;
};
