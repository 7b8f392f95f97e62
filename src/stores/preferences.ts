import { defineStore } from 'pinia';
import { computed, ref } from 'vue';
import { keep, kept } from './kept';

export type ThemeWish = 'day' | 'night' | 'system';
export type UnitSystem = 'imperial' | 'metric';
export type Language = 'en' | 'es';

export interface Preferences {
  readonly language: Language;
  readonly units: UnitSystem;
  readonly theme: ThemeWish;
}

/**
 * How this person reads: language, units, theme. The server keeps them for all devices; a copy on this one lets the
 * first paint and a start without a signal be right.
 */
export const usePreferencesStore = defineStore('preferences', () => {
  const language = ref<Language>(kept('language', ['en', 'es']) ?? 'en');
  const units = ref<UnitSystem>(kept('units', ['imperial', 'metric']) ?? 'imperial');
  const theme = ref<ThemeWish>(kept('theme', ['day', 'night', 'system']) ?? 'system');

  const all = computed<Preferences>(() => ({ language: language.value, units: units.value, theme: theme.value }));

  function adopt(wish: Partial<Preferences>): void {
    if (wish.language !== undefined) language.value = keep('language', wish.language);
    if (wish.units !== undefined) units.value = keep('units', wish.units);
    if (wish.theme !== undefined) theme.value = keep('theme', wish.theme);
  }

  return { language, units, theme, all, adopt };
});
