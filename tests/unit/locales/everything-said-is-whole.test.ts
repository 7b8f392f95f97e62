import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { commandTypes } from '../../../shared/contracts/commands';
import { planView } from '../../../shared/drawing/plan-view';
import { quadrantClock } from '../../../shared/drawing/quadrant-clock';
import { decide } from '../../../shared/job/decide';
import { planFaults } from '../../../shared/job/plan-faults';
import { currentPoint } from '../../../shared/job/points';
import type { Refusal } from '../../../shared/job/refusal';
import type { PointState } from '../../../shared/job/state';
import { storyOf } from '../../../shared/job/story';
import { whatCounts } from '../../../shared/job/what-counts';
import { printDay, printInstant } from '../../../shared/locales/print-instant';
import { hasWords, say, type Formatters } from '../../../shared/locales/say';
import type { Text } from '../../../shared/locales/text';
import en from '../../../shared/locales/en';
import { printQuantity, type UnitSystem } from '../../../shared/units/format';
import { aJob, hash, type TestJob } from '../../support/a-job';
import { aPlan, welder, type PlanOverrides } from '../../support/a-plan';
import { aCalledOffJob, aSealedJob } from '../../support/a-sealed-job';
import { commandBodies } from '../../support/command-bodies';
import { recordPoint, walkTo } from '../../support/drive';
import { anyPoints } from '../../support/words/any-point';

const reader = (units: UnitSystem): Formatters => ({
  quantity: (value, unit, difference) => printQuantity(value, unit, units, difference),
  instant: (iso) => printInstant(iso, 'America/Chicago', 'en'),
  day: (date) => printDay(date, 'en'),
  number: String,
});

const areas = Object.keys(en).join('|');
/** A brace, a key, or a word of the machine's own on the screen; a gap where something was to stand. */
const broken = new RegExp(
  `[{}|]|\\b(${areas})\\.[a-z]|undefined|NaN|Infinity|null|\\d\\.\\d{5}|\\([\\s)]|\\s\\)| [.,;:]|  |–  `,
);

const wordsOf = (text: Text): string[] =>
  (['imperial', 'metric'] as const).map((units) => say(en, text, reader(units)));

/** Those of the texts that cannot be read as they stand. */
const unreadable = (texts: readonly Text[]): string[] => [
  ...new Set(
    texts.flatMap((text) => (hasWords(en, text.key) ? wordsOf(text).filter((said) => broken.test(said)) : [text.key])),
  ),
];

const ofRefusal = (refusal: Refusal): Text[] => [refusal.text, ...refusal.blockers.map(({ text }) => text)];

describe('everything that is said can be read as it stands', () => {
  const points = anyPoints(12);

  it('of readings against their limits', () => {
    expect(unreadable(points.flatMap(({ verdicts }) => verdicts.map(({ text }) => text)))).toEqual([]);
  });

  it('of what is outside: by how much is never nothing', () => {
    const missed = points
      .flatMap(({ verdicts }) => verdicts)
      .filter(({ by, outcome }) => outcome === 'outside' && Number(by?.value ?? 0) > 0);
    for (const { by } of missed)
      for (const units of ['imperial', 'metric'] as const)
        expect(printQuantity(by?.value ?? '', by?.unit ?? '', units, true)).not.toMatch(/^-?0(\.0+)?\D*$/);
  });

  it('of a plan that cannot work', () => {
    const plans: PlanOverrides[] = [
      {
        terms: { test: { pressurePsi: 4000, medium: 'nitrogen' }, settings: { touchF: '900' } },
        people: [],
        instruments: [],
      },
      { terms: { test: { pressurePsi: 2400 } }, head: { seals: 2, sealRatedPsi: 1800, socketBoreIn: '9.63' } },
      { head: { casingOdIn: '13.375', welds: 'outside-and-inside', nominalSize: '9', ratedPressurePsi: 2500 } },
      {
        people: [
          { ...welder, role: 'welder', qualifications: [] },
          { ...welder, role: 'company_rep', qualifications: [] },
        ],
      },
    ];
    const faults = plans.flatMap((own) => planFaults(aPlan(own), '2027-03-01'));
    expect(faults.length).toBeGreaterThan(15);
    expect(unreadable(faults.map(({ text }) => text))).toEqual([]);
  });

  it('of a job in its record', () => {
    for (const job of [aSealedJob(), aCalledOffJob()]) {
      const story = storyOf(job.id, job.events);
      const chapters = story?.settings.flatMap(({ sections }) =>
        sections.flatMap(({ chapter, superseded }) => [chapter, ...superseded]),
      );
      const lines = (chapters ?? []).flatMap((chapter) =>
        [whatCounts(chapter) ?? [], chapter.verdicts.map(({ text }) => text)].flat(),
      );
      expect(lines.length).toBeGreaterThan(5);
      expect(unreadable(lines)).toEqual([]);
    }
  });

  it('of a drawing, in words', () => {
    const few = fc.option(fc.double({ min: -40, max: 40, noNaN: true }), { nil: undefined });
    const some = few.map((value) => value ?? null);
    fc.assert(
      fc.property(few, few, some, some, some, (first, second, low, offset, turned) => {
        const values = { ...(first !== undefined && { '12': first }), ...(second !== undefined && { '3': second }) };
        const view = {
          boltHoles: 16,
          offsetAIn: offset,
          offsetBIn: low,
          lengthIn: 18,
          rotationDeg: turned,
          bearingDeg: null,
          outside: false,
          direction: null,
        };
        const drawn = [quadrantClock({ values, unit: 'in', lowSideDegrees: low }), planView(view)];
        expect(unreadable(drawn.flatMap(({ alternative }) => alternative))).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });
});

/** The first point, the one that is under way, and the last. */
const pointsToTry = (job: TestJob): PointState[] => {
  const { points } = job.job;
  return [points[0], currentPoint(job.job), points.at(-1)].filter((point) => point !== undefined);
};

/** Everything that anybody could send now, well-formed and mostly out of turn. */
const refusalsOf = (job: TestJob): Refusal[] =>
  commandTypes.flatMap((type) =>
    (['welder', 'company_rep', 'tool_pusher', 'coordinator'] as const).flatMap((role) =>
      pointsToTry(job).flatMap(({ place }) => {
        const known: object = commandBodies[type];
        const body = {
          ...known,
          ...('point' in known && { point: place.id }),
          ...('contentHash' in known && job.signing(place.id)),
        };
        const decision = decide(job.state, job.command(type, body as never), job.person(role), job.times(), hash);
        return decision.ok ? [] : [decision.refusal];
      }),
    ),
  );

describe('every refusal', () => {
  it.each([
    'hot-work-clearance',
    'final-cut',
    'seal-greased-and-checked',
    'pass-2-inspected',
    'pressure-test-held',
    'sealed',
  ])('of a job at %s can be read as it stands', (until) => {
    const job = until === 'sealed' ? aSealedJob() : aJob();
    if (until !== 'sealed') walkTo(job, until);
    const early = refusalsOf(job);
    if (until !== 'sealed') {
      job.try('name-direction', { direction: 'mud-tanks', words: null }, job.person('tool_pusher'));
      recordPoint(job, until);
      job.do('stop-work', { reason: 'The crane swings over the cellar.' }, job.person('tool_pusher'));
    }
    const texts = [...early, ...refusalsOf(job)].flatMap(ofRefusal);
    expect(new Set(texts.map(({ key }) => key)).size).toBeGreaterThan(until === 'sealed' ? 0 : 8);
    expect(unreadable(texts)).toEqual([]);
  });
});
