import { computed, watchEffect, type ComputedRef } from 'vue';
import en from '../../shared/locales/en';
import type { Messages } from '../../shared/locales/say';
import { usePreferencesStore, type Language } from '../stores/preferences';

/** Every language with its messages. One translator, `say`, speaks them here and on the server. */
const languages: Partial<Record<Language, Messages>> = { en };

/** Languages whose messages are complete: half a language is none. */
export const spokenLanguages = Object.keys(languages) as Language[];

/** The messages in the person's language; English where it is not spoken yet. */
export function useMessages(): ComputedRef<Messages> {
  const preferences = usePreferencesStore();
  return computed(() => languages[preferences.language] ?? en);
}

/** Tells the page, and whoever reads it aloud, which language it is in. */
export function useLanguage(): void {
  const preferences = usePreferencesStore();
  watchEffect(() => {
    document.documentElement.lang = preferences.language in languages ? preferences.language : 'en';
  });
}
