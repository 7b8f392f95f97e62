import PrimeVue from 'primevue/config';
import type { App } from 'vue';
import { headfastPreset } from '../../assets/preset';

const done = new WeakSet<App>();

/**
 * Registers the component library once, for the views that earn its weight (tables, calendars). The first screens do
 * without it: import this only from a lazy view.
 */
export function installPrimeVue(app: App): void {
  if (done.has(app)) return;
  done.add(app);
  app.use(PrimeVue, {
    theme: {
      preset: headfastPreset,
      options: { darkModeSelector: '[data-theme="night"]', cssLayer: { name: 'primevue', order: 'primevue' } },
    },
  });
}
