import type { JobEvent, JobEventOf } from './events';
import { changePoint } from './points';
import type { Custody, JobState, Reading } from './state';

/** One copy for a whole command: a recorder's file brings hundreds of readings, and a fold runs over every event. */
const append = (readings: Record<string, Reading[]>, added: Reading[]): Record<string, Reading[]> => {
  const all = { ...readings };
  for (const reading of added) all[reading.field] = [...(all[reading.field] ?? []), reading];
  return all;
};

const plugField = /^plug\.(\d)\.(out|where|holder|back)$/;

/** Plug custody is the job's own: it survives the reopening of the point that it was recorded at. */
const takeCustody = (custody: Custody[], readings: Reading[]): Custody[] =>
  readings.reduce((all, { field, value }) => {
    const match = plugField.exec(field);
    if (!match) return all;
    const change = (item: Custody): Custody => {
      switch (match[2]) {
        case 'out':
          return { ...item, out: value === 'yes', back: value === 'yes' ? null : item.back };
        case 'where':
          return { ...item, where: value };
        case 'holder':
          return { ...item, holder: value };
        default:
          return value === 'same' || value === 'replaced'
            ? { ...item, back: value, out: false }
            : { ...item, back: null };
      }
    };
    return all.map((item) => (item.port === Number(match[1]) ? change(item) : item));
  }, custody);

const recorded = (state: JobState, event: JobEventOf<'readings-recorded'>): JobState => {
  const { entries, actor, at, late, point } = event.body;
  const asReading = ({ site: _site, ...entry }: (typeof entries)[number], isLate: boolean): Reading => ({
    ...entry,
    typedBy: actor,
    at,
    late: isLate,
    struck: null,
  });
  const ofSite = entries.filter((entry) => entry.site).map((entry) => asReading(entry, false));
  const ofPoint = entries.filter((entry) => !entry.site).map((entry) => asReading(entry, late));
  const withSite = ofSite.length === 0 ? state : { ...state, site: append(state.site, ofSite) };
  if (ofPoint.length === 0) return withSite;
  return {
    ...changePoint(withSite, point, (one) => ({ ...one, readings: append(one.readings, ofPoint) })),
    custody: late ? withSite.custody : takeCustody(withSite.custody, ofPoint),
  };
};

const rowStruck = (state: JobState, event: JobEventOf<'row-struck'>): JobState => {
  const { point, readings, reason, actor, at } = event.body;
  const named = new Set(readings);
  const strike = (one: Reading): Reading => (named.has(one.id) ? { ...one, struck: { reason, by: actor, at } } : one);
  return changePoint(state, point, (one) => ({
    ...one,
    readings: Object.fromEntries(Object.entries(one.readings).map(([field, all]) => [field, all.map(strike)])),
  }));
};

/** Evidence arrives: readings, photos, acts, concessions. Nothing that was there is taken away. */
export const evolveEvidence = (state: JobState, event: JobEvent): JobState => {
  switch (event.type) {
    case 'readings-recorded':
      return recorded(state, event);
    case 'row-struck':
      return rowStruck(state, event);
    case 'photo-added': {
      const { photo, shot, sha256, previewSha256, width, height, takenAt, late, actor, at, point } = event.body;
      const added = {
        id: photo,
        shot,
        sha256,
        previewSha256,
        width,
        height,
        takenAt,
        late,
        by: actor,
        at,
        setAside: null,
      };
      return changePoint(state, point, (one) => ({ ...one, photos: [...one.photos, added] }));
    }
    case 'photo-set-aside': {
      const { photo, reason, actor, at, point } = event.body;
      return changePoint(state, point, (one) => ({
        ...one,
        photos: one.photos.map((item) => (item.id === photo ? { ...item, setAside: { reason, by: actor, at } } : item)),
      }));
    }
    case 'act-begun': {
      const { act, verdicts, actor, at, commandId, point } = event.body;
      const run = { id: commandId, act, begun: { by: actor, at }, ended: null, verdicts };
      const next = changePoint(state, point, (one) => ({ ...one, acts: [...one.acts, run] }));
      return act === 'set-head' ? { ...next, headSet: true } : next;
    }
    case 'act-ended': {
      const { act, actor, at, point } = event.body;
      return changePoint(state, point, (one) => ({
        ...one,
        acts: one.acts.map((run) =>
          run.act === act && run.ended === null ? { ...run, ended: { by: actor, at } } : run,
        ),
      }));
    }
    case 'reading-conceded': {
      const { items, actor, at, signature, point } = event.body;
      const added = items.map((item) => ({ ...item, by: actor, at, signature }));
      return changePoint(state, point, (one) => ({ ...one, concessions: [...one.concessions, ...added] }));
    }
    default:
      return state;
  }
};
