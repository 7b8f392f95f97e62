import { placeNamed } from '../../shared/hold-points/place-named';
import { sitePoint } from '../../shared/hold-points/site';
import type { JobEvent } from '../../shared/job/events';
import type { Text, TextParam } from '../../shared/locales/text';
import { usePointTitle } from './point-words';
import { useSay } from './say';

/** Says what an event tells, in one line. */
export function useEventWords(): (event: JobEvent) => string {
  const { say, has } = useSay();
  const titleOf = usePointTitle();

  const title = (point: string): string => {
    if (point === sitePoint) return say('packets.event.site');
    const place = placeNamed(point);
    return place === null ? point : titleOf(place);
  };
  const pointWords = (point: string, area: string, key: string): string => {
    const named = `points.${placeNamed(point)?.kind ?? point}.${area}.${key}`;
    return has(named) ? say(named) : key;
  };
  const direction = (code: string, words: string | null): TextParam =>
    words ?? (has(`job.directions.${code}`) ? { key: `job.directions.${code}` } : code);

  const sentence = (event: JobEvent): Text => {
    const key = `packets.event.${event.type}`;
    switch (event.type) {
      case 'readings-recorded': {
        const { point, entries, late } = event.body;
        const params = { title: title(point), count: entries.length };
        return { key: late ? 'packets.event.readings-late' : key, params };
      }
      case 'photo-added': {
        const { point, shot, late } = event.body;
        const params = { title: title(point), shot: pointWords(point, 'shots', shot) };
        return { key: late ? 'packets.event.photo-late' : key, params };
      }
      case 'act-begun':
      case 'act-ended':
        return {
          key,
          params: { title: title(event.body.point), act: pointWords(event.body.point, 'acts', event.body.act) },
        };
      case 'presentation-withdrawn': {
        const late = event.body.cause === 'late-evidence';
        return { key: late ? `${key}-late` : key, params: { title: title(event.body.point) } };
      }
      case 'point-presented':
      case 'point-released':
        return { key, params: { title: title(event.body.point) } };
      case 'photo-set-aside':
      case 'point-sent-back':
      case 'point-reopened':
        return { key, params: { title: title(event.body.point), reason: event.body.reason } };
      case 'reading-conceded':
        return { key, params: { title: title(event.body.point), count: event.body.items.length } };
      case 'repair-round-opened':
        return { key, params: { round: event.body.round, reason: event.body.reason } };
      case 'setting-begun':
        return { key, params: { setting: event.body.setting, reason: event.body.reason } };
      case 'direction-named':
        return { key, params: { direction: direction(event.body.direction, event.body.words) } };
      case 'direction-proposed':
        return { key, params: { direction: direction(event.body.direction, null) } };
      case 'work-stopped':
      case 'terms-changed':
      case 'job-called-off':
        return { key, params: { reason: event.body.reason } };
      case 'work-resumed':
        return { key, params: { note: event.body.note } };
      case 'shift-handed-over': {
        const { line, to } = event.body;
        return to === null ? { key, params: { line } } : { key: `${key}-to`, params: { line, to } };
      }
      case 'row-struck': {
        const { point, row, reason } = event.body;
        return { key, params: { title: title(point), row, reason } };
      }
      case 'instrument-added': {
        const { name, serial } = event.body.instrument;
        return { key, params: { name, serial } };
      }
      case 'person-assigned': {
        const { name, role } = event.body.person;
        return { key, params: { name, role: { key: `app.role.${role}` } } };
      }
      case 'person-removed': {
        const { name, role, reason } = event.body;
        return { key, params: { name, role: { key: `app.role.${role}` }, reason } };
      }
      case 'job-sealed':
        return { key, params: { count: event.body.concessions } };
      case 'job-planned':
        return { key };
    }
  };
  return (event) => say(sentence(event));
}
