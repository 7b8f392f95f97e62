import type { PointContext } from '../../../shared/hold-points/context';
import { definitionOf } from '../../../shared/hold-points/definitions';
import type { FieldDefinition } from '../../../shared/hold-points/definition';
import { judgeFlame } from '../../../shared/hold-points/gas';
import { pointKinds, type PointKind } from '../../../shared/hold-points/points';
import { judgeResume, siteGroups } from '../../../shared/hold-points/site';
import type { Verdict } from '../../../shared/hold-points/verdict';
import type { JobPlan } from '../../../shared/job/plan';
import { reviewPoint, type PointReview } from '../../../shared/job/review';
import type { JobState } from '../../../shared/job/state';
import { aPlan, carbonAlone, toolPusher, welder, type PlanOverrides } from '../a-plan';
import { aPointContext, noon, type ReadingSpecs } from '../a-point';

/** Plans that ask for every kind of answer: datum, seals, welds, ports, medium, examination, chemistry. */
const overrides: PlanOverrides[] = [
  {},
  { terms: { datum: 'base', test: { medium: 'nitrogen' } }, procedure: { surfaceExam: 'penetrant' } },
  {
    terms: { datum: 'outlet', test: { pressurePsi: 2400 } },
    head: { seals: 0, sealAboveBaseIn: [], sealRatedPsi: null },
    procedure: {
      preheatDistance: 'iso-13916',
      chemistry: { composition: carbonAlone('0.42'), thicknessMm: '12', hydrogenMl: '5', heatInputKjPerMm: '1' },
    },
  },
  {
    terms: { test: { pressurePsi: 4000 } },
    head: { seals: 2, sealAboveBaseIn: ['7.75', '6'], welds: 'outside-and-inside', ports: 2 },
    procedure: { insideLegIn: '0.375', surfaceExam: 'magnetic-particle' },
  },
  { casing: { collapsePsi: 9000 } },
  { casing: { collapsePsi: 9000 }, head: { sealRatedPsi: 1800 } },
];

const oldMeter = {
  id: 'meter-old',
  kind: 'gas-meter',
  name: 'Old meter',
  serial: 'GM-1',
  calibratedUntil: '2026-01-31',
  fullScalePsi: null,
} as const;
const oldGauge = { ...oldMeter, id: 'gauge-old', kind: 'gauge', name: 'Old gauge', fullScalePsi: 2000 } as const;
const tape = { ...oldMeter, id: 'tape-1', kind: 'tape', name: 'Steel tape' } as const;
const level = { ...oldMeter, id: 'level-1', kind: 'level', name: 'Machinist’s level' } as const;

const plans = overrides.map((own): JobPlan => {
  const plan = aPlan(own);
  return { ...plan, instruments: [...plan.instruments, oldMeter, oldGauge, tape, level] };
});

/** The same answers on every run. */
const dice = (seed: number) => {
  let at = seed;
  return <T>(choices: readonly T[]): T => {
    at = (Math.imul(at, 1_103_515_245) + 12_345) >>> 0;
    return choices[Math.floor((at / 4_294_967_296) * choices.length)] as T;
  };
};
type Pick = ReturnType<typeof dice>;

const minutes = (count: number): string => new Date(Date.parse(noon) + count * 60_000).toISOString();
const classes = ['E8018-C3', 'E7018', 'E6010'];
const instruments = ['meter-1', 'meter-old', 'pyrometer-1', 'gauge-1', 'gauge-old', 'somebody’s own'];

const near = ({ likely }: FieldDefinition): string[] =>
  likely === undefined ? [] : [String(likely.min), String((likely.min + likely.max) / 2), String(likely.max)];

const answerTo = (field: FieldDefinition, pick: Pick): string => {
  const { of, key } = field;
  switch (of.type) {
    case 'quantity':
      return pick([
        '0',
        '0.0312',
        '0.25',
        '1',
        '2',
        '3',
        '25',
        '310',
        '1500',
        '2600',
        '20000',
        '-200',
        ...near(field),
        ...near(field),
      ]);
    case 'count':
      return pick(['1', '4']);
    case 'check':
      return pick(['yes', 'no']);
    case 'choice':
      return pick(of.choices);
    case 'time':
      return minutes(pick([-900, -30, -8, 0, 5, 8, 15, 20]));
    case 'instrument':
      return pick(instruments);
    case 'welders':
      return welder.accountId;
    case 'names':
    case 'text':
      return key.endsWith('.class') ? pick(classes) : pick(['11', '3000', 'H-4471']);
  }
};

const answersTo = (fields: readonly FieldDefinition[], pick: Pick): ReadingSpecs =>
  Object.fromEntries(
    fields
      .flatMap((field) =>
        field.key.includes('.#.')
          ? [1, 2, 3].map((row) => ({ ...field, key: field.key.replace('#', String(row)) }))
          : [field],
      )
      .filter(() => pick([true, true, true, true, true, true, true, false]))
      .map((field) => {
        const at = minutes(pick([-3000, -70, -3, 0]));
        return [field.key, { value: answerTo(field, pick), at, doubtMs: pick([500, 500, 500, 500, 500, null]) }];
      }),
  );

const fieldsOf = (context: PointContext): FieldDefinition[] =>
  definitionOf(context.point.place.kind)
    .groups(context)
    .flatMap((group) => group.fields);

const siteFields = siteGroups().flatMap((group) => group.fields);

const earlierOf = (kind: PointKind, plan: JobPlan, pick: Pick) =>
  pointKinds
    .slice(0, pointKinds.indexOf(kind))
    .map((one) => ({ kind: one, readings: answersTo(fieldsOf(aPointContext({ kind: one, plan })), pick) }));

const someState = (plan: JobPlan, pick: Pick): Partial<JobState> => ({
  stopped: pick([
    null,
    {
      reason: 'The crane swings.',
      by: { ...toolPusher, role: 'tool_pusher' },
      at: { device: minutes(-4), corrected: minutes(-4), received: minutes(-4), doubtMs: 300 },
    },
  ]),
  ...pick([{}, { direction: null }]),
  custody: Array.from({ length: plan.head.ports }, (_, index) => ({
    port: index + 1,
    out: true,
    where: 'tray 2',
    holder: 'J. Ostrom',
    back: pick([null, 'same', 'replaced'] as const),
  })),
});

const aContext = (kind: PointKind, plan: JobPlan, round: number, seed: number): PointContext => {
  const pick = dice(seed);
  const pass = kind === 'pass-inspected' ? { pass: round > 0 ? 1 : pick([1, 2, plan.procedure.passes.length]) } : {};
  const spec = { kind, plan, round, ...pass };
  const empty = aPointContext(spec);
  const act = pick(['pass', 'pass', 'tacks']);
  const acts = kind === 'pass-inspected' ? [{ act, begun: minutes(-4), ended: minutes(pick([3, -40])) }] : [];
  return aPointContext({
    ...spec,
    readings: answersTo(fieldsOf(empty), pick),
    site: answersTo(siteFields, pick),
    earlier: earlierOf(kind, plan, pick),
    state: someState(plan, pick),
    acts,
  });
};

const inRounds: PointKind[] = [
  'test-plug-removed',
  'preheat-reached',
  'pass-inspected',
  'cooled-to-touch',
  'pressure-test-held',
];

/** One point of one job, filled in by chance, with everything that can be said of it. */
export interface AnyPoint {
  context: PointContext;
  review: PointReview;
  verdicts: Verdict[];
}

const reviewed = (context: PointContext): AnyPoint => {
  const review = reviewPoint(context.state, context.point);
  const definition = definitionOf(context.point.place.kind);
  const begins = review.acts.flatMap((act) => definition.beforeAct?.(context, act.key, noon) ?? []);
  const site = [...judgeFlame(context, noon), ...judgeResume(context.state, noon)];
  return { context, review, verdicts: [...review.verdicts, ...begins, ...site] };
};

/** Every kind of point under every plan and in a repair round, each filled in `times` over. */
export const anyPoints = (times: number): AnyPoint[] =>
  pointKinds.flatMap((kind) =>
    plans.flatMap((plan, index) =>
      (inRounds.includes(kind) ? [0, 1] : [0]).flatMap((round) =>
        Array.from({ length: times }, (_, n) =>
          reviewed(aContext(kind, plan, round, 7919 * (n + 1) + 31 * index + round)),
        ),
      ),
    ),
  );
