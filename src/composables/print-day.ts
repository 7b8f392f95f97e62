import { printInstant } from '../../shared/locales/print-instant';
import { usePreferencesStore } from '../stores/preferences';

/** Prints a day of the calendar, `10 Nov 2026`, from its ISO date: the same day everywhere, for it is no moment. */
export function usePrintedDay(): (day: string) => string {
  const preferences = usePreferencesStore();
  return (day) => printInstant(`${day}T00:00:00Z`, 'UTC', preferences.language).replace(/ \d\d:\d\d$/, '');
}
