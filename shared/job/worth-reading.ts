import type { PointPlace } from '../hold-points/points';
import type { Verdict } from '../hold-points/verdict';
import { minutesBetween } from './actor';
import type { JobEvent } from './events';
import { strikesIn } from '../hold-points/rows';
import type { Chapter, Story } from './story';

/** What an outsider looks at first, in the order of weight. */
export const worthKinds = [
  'called-off',
  'concessions',
  'set-again',
  'repair-rounds',
  'reopened',
  'sent-back',
  'stops',
  'instruments',
  'late',
  'photos-aside',
  'rows-struck',
  'terms',
  'soonest',
] as const;
export type WorthKind = (typeof worthKinds)[number];

/** One thing worth reading: where it stands, in whose words, or by which verdict. */
export interface WorthItem {
  setting: number;
  place: PointPlace | null;
  says: string | null;
  verdict: Verdict | null;
}

export interface Worth {
  kind: WorthKind;
  /** how many; minutes for `soonest` */
  count: number;
  items: WorthItem[];
}

interface Placed {
  setting: number;
  chapter: Chapter;
}

const allChapters = ({ settings }: Story): Placed[] =>
  settings.flatMap(({ setting, sections }) =>
    sections.flatMap(({ chapter, superseded }) => [...superseded, chapter].map((one) => ({ setting, chapter: one }))),
  );

const item = (
  setting: number,
  place: PointPlace | null,
  says: string | null,
  verdict: Verdict | null = null,
): WorthItem => ({
  setting,
  place,
  says,
  verdict,
});

const counted = (kind: WorthKind, items: WorthItem[]): Worth => ({ kind, count: items.length, items });

const isOldInstrument = (verdict: Verdict): boolean =>
  verdict.outcome === 'outside' && verdict.limit.startsWith('calibration.');

/** The shortest time that an owner took between presented and released. */
const soonest = (placed: Placed[]): Worth => {
  const waits = placed
    .flatMap(({ setting, chapter: { point } }) =>
      point.release && point.presentation
        ? [
            {
              setting,
              place: point.place,
              minutes: minutesBetween(point.presentation.at.corrected, point.release.at.corrected),
            },
          ]
        : [],
    )
    .sort((a, b) => a.minutes - b.minutes);
  const first = waits[0];
  return {
    kind: 'soonest',
    count: first ? Math.round(first.minutes) : 0,
    items: first ? [item(first.setting, first.place, null)] : [],
  };
};

const fromEvents = (events: readonly JobEvent[], kind: WorthKind, tell: (event: JobEvent) => string | null): Worth =>
  counted(
    kind,
    events.flatMap((event) => {
      const says = tell(event);
      return says === null ? [] : [item(0, null, says)];
    }),
  );

/** Everything in a job's story that an outsider reads first; kinds that did not happen stand with a count of nought. */
export const worthReading = (story: Story, events: readonly JobEvent[]): Worth[] => {
  const placed = allChapters(story);
  const standing = placed.filter(({ chapter }) => chapter.ending !== 'superseded');
  const sections = story.settings.flatMap(({ setting, sections: all }) => all.map(({ point }) => ({ setting, point })));
  const { ended } = story.state;
  return [
    ...(ended?.kind === 'called-off' ? [counted('called-off', [item(story.state.setting, null, ended.reason)])] : []),
    counted(
      'concessions',
      standing.flatMap(({ setting, chapter: { point } }) =>
        point.concessions.map((one) => item(setting, point.place, one.reason, one.verdict)),
      ),
    ),
    counted(
      'set-again',
      story.settings.flatMap(({ setting, reason }) => (reason === null ? [] : [item(setting, null, reason)])),
    ),
    fromEvents(events, 'repair-rounds', (event) => (event.type === 'repair-round-opened' ? event.body.reason : null)),
    counted(
      'reopened',
      sections.flatMap(({ setting, point }) => point.reopened.map((one) => item(setting, point.place, one.reason))),
    ),
    counted(
      'sent-back',
      sections.flatMap(({ setting, point }) => point.sentBack.map((one) => item(setting, point.place, one.reason))),
    ),
    fromEvents(events, 'stops', (event) => (event.type === 'work-stopped' ? event.body.reason : null)),
    counted(
      'instruments',
      standing.flatMap(({ setting, chapter }) =>
        chapter.verdicts.filter(isOldInstrument).map((verdict) => item(setting, chapter.point.place, null, verdict)),
      ),
    ),
    counted(
      'late',
      standing.flatMap(({ setting, chapter: { point } }) =>
        [...Object.values(point.readings).flat(), ...point.photos]
          .filter((one) => one.late)
          .map(() => item(setting, point.place, null)),
      ),
    ),
    counted(
      'photos-aside',
      standing.flatMap(({ setting, chapter: { point } }) =>
        point.photos.flatMap((photo) => (photo.setAside ? [item(setting, point.place, photo.setAside.reason)] : [])),
      ),
    ),
    counted(
      'rows-struck',
      standing.flatMap(({ setting, chapter: { point } }) =>
        strikesIn(point).map(({ reason }) => item(setting, point.place, reason)),
      ),
    ),
    fromEvents(events, 'terms', (event) => (event.type === 'terms-changed' ? event.body.reason : null)),
    soonest(standing),
  ];
};
