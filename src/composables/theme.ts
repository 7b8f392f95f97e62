import { watchEffect } from 'vue';
import { usePreferencesStore } from '../stores/preferences';

/** Keeps the page in the wished theme, the system's when none is wished, and the browser's own bar in the ground's colour. */
export function useTheme(): void {
  const preferences = usePreferencesStore();
  const systemNight = matchMedia('(prefers-color-scheme: dark)');

  function apply(): void {
    const night = preferences.theme === 'night' || (preferences.theme === 'system' && systemNight.matches);
    document.documentElement.dataset['theme'] = night ? 'night' : 'day';
    barColour().content = getComputedStyle(document.documentElement).getPropertyValue('--ground').trim();
  }

  watchEffect(apply);
  systemNight.addEventListener('change', apply);
}

function barColour(): HTMLMetaElement {
  const found = document.querySelector<HTMLMetaElement>('meta[name="theme-color"]');
  if (found !== null) return found;
  const made = document.createElement('meta');
  made.name = 'theme-color';
  return document.head.appendChild(made);
}
