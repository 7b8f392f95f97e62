import { LIMITS } from '../calculations/limits-data';
import { clockIsDoubtful, minutesBetween } from '../job/actor';
import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { check, instrument, quantity, time, words } from './fields';
import { judgeInstrument } from './instruments';
import { bySetting, commonPractice, judgeCheck, judgeFact, judgeRange, standard } from './judging';
import { siteDay } from './site-day';
import type { Verdict } from './verdict';

/** Where the air is sampled. */
export const gasPlaces = ['cellar', 'bore', 'annulus'] as const;
const gases = [
  { key: 'oxygen', unit: 'pct', likely: { min: 15, max: 25 } },
  { key: 'flammable', unit: 'pct', likely: { min: 0, max: 20 } },
  { key: 'h2s', unit: 'ppm', likely: { min: 0, max: 50 } },
  { key: 'co', unit: 'ppm', likely: { min: 0, max: 100 } },
] as const;

const readingKeys = gasPlaces.flatMap((place) => gases.map((gas) => `gas.${place}.${gas.key}`));

const meterField = instrument('gas.meter', ['gas-meter'], { site: true });

/** The gas check: of the site, read again whenever it has grown old. */
export const gasGroups = (): GroupDefinition[] => [
  ...gasPlaces.map((place) => ({
    key: `gas-${place}`,
    fields: gases.map((gas) => quantity(`gas.${place}.${gas.key}`, gas.unit, { site: true, likely: gas.likely })),
  })),
  {
    key: 'gas-meter',
    fields: [meterField, check('gas.bump-tested', { site: true }), check('gas.monitor', { site: true })],
  },
];

/** The hot work permit: of the site, since it may be renewed while the job runs. */
export const permitGroup = (): GroupDefinition => ({
  key: 'permit',
  fields: [
    words('permit.number', { site: true }),
    words('permit.issuer', { site: true }),
    time('permit.expires', { site: true }),
  ],
});

/** Less than none of a gas is a meter that was not zeroed: what it says of the air is worth nothing. */
const judgeZeroed = (context: PointContext, field: string, unit: 'pct' | 'ppm'): Verdict[] => {
  const measured = context.number(field);
  return judgeFact(context, {
    limit: `${field}.zeroed`,
    kind: 'stop',
    about: [field],
    source: commonPractice,
    says: 'gas-zeroed',
    params: { measured: { quantity: String(measured ?? 0), unit } },
    holds: measured === undefined ? undefined : measured >= 0,
  }).filter((verdict) => verdict.outcome === 'outside');
};

/** Every gas reading against its limit. A gas limit is a stop: nobody can concede it. */
export const judgeGas = (context: PointContext): Verdict[] =>
  gasPlaces.flatMap((place) => {
    const at = (gas: string) => `gas.${place}.${gas}`;
    const held = (gas: string) => ({
      limit: at(gas),
      kind: 'stop' as const,
      about: [at(gas)],
      measured: context.number(at(gas)),
      says: `gas-${gas}`,
    });
    return [
      ...gases.flatMap((gas) => judgeZeroed(context, at(gas.key), gas.unit)),
      ...judgeRange(context, {
        ...held('oxygen'),
        unit: 'pct',
        min: LIMITS.oxygenLow.value,
        max: LIMITS.oxygenHigh.value,
        source: standard(LIMITS.oxygenLow.source),
      }),
      ...judgeRange(context, {
        ...held('flammable'),
        unit: 'pct',
        max: Math.min(context.setting('lelMaxPct'), 9.9),
        source: bySetting(context, 'lelMaxPct'),
      }),
      ...judgeRange(context, {
        ...held('h2s'),
        unit: 'ppm',
        max: LIMITS.hydrogenSulphide.value,
        exclusiveMax: true,
        source: standard(`${LIMITS.hydrogenSulphide.source} for H2S`),
      }),
      ...judgeRange(context, {
        ...held('co'),
        unit: 'ppm',
        max: LIMITS.carbonMonoxide.value,
        exclusiveMax: true,
        source: standard(`${LIMITS.carbonMonoxide.source} for CO`),
      }),
    ];
  });

/** Today is the site's day on which the air was read: yesterday's bump test says nothing of it. */
const judgeBumpTest = (context: PointContext): Verdict[] => {
  const test = context.read('gas.bump-tested');
  const { zone } = context.state.plan;
  const airRead = oldestGasReading(context);
  const sameDay =
    test === undefined || airRead === undefined || siteDay(zone, test.at.corrected) >= siteDay(zone, airRead);
  return judgeFact(context, {
    limit: 'gas.bump-tested',
    kind: 'stop',
    about: ['gas.bump-tested'],
    source: commonPractice,
    holds: test === undefined ? undefined : test.value === 'yes' && sameDay,
  });
};

/** The meter bump-tested today, a continuous monitor in place, and no doubt about when the air was read. */
export const judgeGasMeter = (context: PointContext): Verdict[] => {
  const read = readingKeys.flatMap((key) => context.read(key) ?? []);
  return [
    ...judgeBumpTest(context),
    ...judgeCheck(context, 'gas.monitor', 'stop'),
    ...judgeFact(context, {
      limit: 'gas-clock',
      kind: 'stop',
      about: readingKeys.filter((key) => context.read(key)),
      source: commonPractice,
      holds: read.length === 0 ? undefined : !read.some((reading) => clockIsDoubtful(reading.at)),
    }),
  ];
};

/** When the oldest reading of the last gas check was taken, corrected; undefined while one is missing. */
export const oldestGasReading = (context: PointContext): string | undefined => {
  const times = readingKeys.map((key) => context.read(key)?.at.corrected);
  if (times.some((one) => one === undefined)) return undefined;
  return (times as string[]).sort()[0];
};

/** Minutes that the gas check still stands at `at`; negative when it has run out, undefined without one. */
export const gasMinutesLeft = (context: PointContext, at: string): number | undefined => {
  const oldest = oldestGasReading(context);
  return oldest === undefined ? undefined : context.setting('gasFreshMin') - minutesBetween(oldest, at);
};

/** Before fire is lit: the air read within the time that the job allows, every reading within, the permit in force. */
export const judgeFlame = (context: PointContext, at: string): Verdict[] => {
  const oldest = oldestGasReading(context);
  const expires = context.value('permit.expires');
  const air = judgeGas(context);
  return [
    ...(oldest === undefined
      ? judgeFact(context, {
          limit: 'gas-fresh',
          kind: 'stop',
          about: readingKeys,
          source: bySetting(context, 'gasFreshMin'),
          says: 'gas-missing',
          holds: false,
        })
      : judgeRange(context, {
          limit: 'gas-fresh',
          kind: 'stop',
          about: readingKeys,
          measured: minutesBetween(oldest, at),
          max: context.setting('gasFreshMin'),
          unit: 'min',
          source: bySetting(context, 'gasFreshMin'),
        })),
    ...air.filter((verdict) => verdict.outcome === 'outside'),
    ...[...judgeGasMeter(context), ...judgeInstrument(context, meterField)].filter(
      (verdict) => verdict.outcome === 'outside',
    ),
    ...judgeFact(context, {
      limit: 'permit-in-force',
      kind: 'stop',
      about: ['permit.expires'],
      source: commonPractice,
      ...(expires === undefined ? { says: 'permit-missing' } : { params: { expires: { instant: expires } } }),
      holds: expires !== undefined && Date.parse(expires) > Date.parse(at),
    }),
  ];
};
