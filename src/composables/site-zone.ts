import { inject, provide, toValue, type InjectionKey, type MaybeRefOrGetter } from 'vue';

const zoneKey: InjectionKey<MaybeRefOrGetter<string | undefined>> = Symbol('site zone');

/** Everything below this component reads moments on the site's clock. A job's page calls it with the job's zone. */
export function provideSiteZone(zone: MaybeRefOrGetter<string | undefined>): void {
  provide(zoneKey, zone);
}

/** The zone in force here: the site's, or the device's where no site is meant. */
export function useSiteZone(): () => string {
  const site = inject(zoneKey, undefined);
  return () => toValue(site) ?? Intl.DateTimeFormat().resolvedOptions().timeZone;
}
