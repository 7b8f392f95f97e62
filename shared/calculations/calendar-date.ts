/** A day of the calendar, free of clocks and time zones. */
export interface CalendarDate {
  readonly year: number;
  readonly month: number;
  readonly day: number;
}

const daysIn = (year: number, month: number): number => {
  if (month === 2) return (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0 ? 29 : 28;
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
};

/** Reads `2026-08-31`; null for anything that is no day. */
export const readDate = (text: string): CalendarDate | null => {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  if (!match) return null;
  const [year, month, day] = [Number(match[1]), Number(match[2]), Number(match[3])];
  const real = month >= 1 && month <= 12 && day >= 1 && day <= daysIn(year, month);
  return real ? { year, month, day } : null;
};

/** Writes a day as `2026-08-31`. ISO dates sort as text. */
export const writeDate = ({ year, month, day }: CalendarDate): string =>
  `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;

/** The same day some months on; where that month is shorter, its last day (31 August and six months: end of February). */
export const addMonths = (date: CalendarDate, months: number): CalendarDate => {
  const count = date.year * 12 + (date.month - 1) + months;
  const [year, month] = [Math.floor(count / 12), (count % 12) + 1];
  return { year, month, day: Math.min(date.day, daysIn(year, month)) };
};
