import { computed, toValue, type ComputedRef, type MaybeRefOrGetter } from 'vue';
import type { PointPlace } from '../../shared/hold-points/points';
import { useSay } from './say';

export interface PointWords {
  title: ComputedRef<string>;
  lead: ComputedRef<string>;
  field(key: string): string;
  group(key: string): string;
  shot(key: string): string;
  act(key: string): string;
  statement(key: string): string;
  caution(key: string): string;
  computed(key: string): string;
  choice(field: string, value: string): string;
  /** a reviewer's `field:…`, `shot:…`, `act:…`, `statement:…` in words */
  missing(key: string): string;
}

/** A hold point's name as it stands in a list; passes carry their number, repair rounds theirs. */
export function usePointTitle(): (place: PointPlace) => string {
  const { say } = useSay();
  return (place) => {
    const name = say(`points.${place.kind}.title`);
    const title = place.pass === null ? name : say('job.point.pass', { pass: place.pass });
    return place.round === 0 ? title : say('job.point.round', { title, round: place.round });
  };
}

/** Rows share their words: `rods.2.amps` is said as `rods.amps`. */
const withoutRow = (key: string): string => key.replace(/\.\d+\./, '.');

/** The words of one hold point, by the keys of its definition. Fields of the site have theirs where they are first asked. */
export function usePointWords(place: MaybeRefOrGetter<PointPlace>): PointWords {
  const { say, has } = useSay();
  const titleOf = usePointTitle();

  function find(area: string, key: string): string {
    const { kind } = toValue(place);
    const names = [key, withoutRow(key)].flatMap((name) => [
      `points.${kind}.${area}.${name}`,
      `points.hot-work-clearance.${area}.${name}`,
      `job.site${area[0]?.toUpperCase()}${area.slice(1)}.${name}`,
    ]);
    return say(names.find(has) ?? names[0] ?? key);
  }

  const words: PointWords = {
    title: computed(() => titleOf(toValue(place))),
    lead: computed(() => say(`points.${toValue(place).kind}.lead`)),
    field: (key) => find('fields', key),
    group: (key) => find('groups', key),
    shot: (key) => find('shots', key),
    act: (key) => find('acts', key),
    statement: (key) => find('statements', key),
    caution: (key) => find('cautions', key),
    computed: (key) => find('computed', key),
    choice: (field, value) => {
      const words = find('choices', `${field}.${value}`);
      // two bolt holes or a row's number have no words of their own
      return /^\d+$/.test(value) && words.startsWith('points.') ? value : words;
    },
    missing: (key) => {
      const [what, ...rest] = key.split(':');
      const name = rest.join(':');
      if (what === 'shot') return say('job.point.next.photo', { label: words.shot(name) });
      if (what === 'act') return words.act(name);
      if (what === 'act-end') return say('job.point.next.end', { label: words.act(name) });
      if (what === 'statement') return words.statement(name);
      if (what === 'term') return say(has(`settings.${name}`) ? `settings.${name}` : `job.terms.names.${name}`);
      return what === 'field' ? words.field(name) : name;
    },
  };
  return words;
}
