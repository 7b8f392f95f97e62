import { printDay } from '../../shared/locales/print-instant';
import { usePreferencesStore } from '../stores/preferences';

/** Prints a day of the calendar, `10 Nov 2026`, from its ISO date: the same day everywhere, for it is no moment. */
export function usePrintedDay(): (day: string) => string {
  const preferences = usePreferencesStore();
  return (day) => printDay(day, preferences.language);
}
