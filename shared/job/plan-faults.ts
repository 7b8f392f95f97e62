import { flangeOf, odTolerance, qualificationContinuity, ratingsOf } from '../calculations';
import { pressureLimitsOf, type PressureBound } from '../hold-points/pressure-limits';
import type { Amount, LimitKind, Source, Verdict } from '../hold-points/verdict';
import type { TextParam } from '../locales/text';
import { onBothSides, type Role } from '../permissions/roles';
import { toDecimal } from '../units/decimal';
import { settingDefinitions } from './settings';
import { settingNames, type JobPlan } from './plan';

const standard = (ref: string): Source => ({ kind: 'standard', ref });
const commonPractice: Source = { kind: 'common-practice', ref: null };

interface Fault {
  limit: string;
  /** `stop` cannot work and is not planned; `hold` will need a concession; `advice` is worth a look */
  kind: LimitKind;
  /** names of the form's fields that it is shown at */
  about: string[];
  source: Source;
  params?: Record<string, TextParam>;
  measured?: Amount;
  max?: string;
}

const fault = ({ limit, kind, about, source, params, measured, max }: Fault): Verdict => ({
  limit,
  kind,
  outcome: 'outside',
  about,
  basis: [],
  measured: measured ?? null,
  allowed: max === undefined ? null : { min: null, max, unit: measured?.unit ?? 'count' },
  by: null,
  source,
  text: params ? { key: `planFaults.${limit}`, params } : { key: `planFaults.${limit}` },
});

const psi = (value: number) => ({ quantity: toDecimal(value), unit: 'psi' });
const inches = (value: number | string) => ({ quantity: toDecimal(Number(value)), unit: 'in' });

const pressureFaults = (plan: JobPlan): Verdict[] => {
  const limits = pressureLimitsOf(plan);
  const target = plan.terms.test.pressurePsi;
  const bounds: Record<PressureBound, { kind: LimitKind; value: number; source: Source }> = {
    flange: { kind: 'stop', value: limits.flangePsi, source: standard('API 6A') },
    collapse: { kind: 'stop', value: limits.collapsePsi, source: standard('API TR 5C3') },
    'collapse-share': {
      kind: 'hold',
      value: limits.collapseSharePsi,
      source: { kind: plan.terms.settings.collapseSharePct.source, ref: 'collapseSharePct' },
    },
    seal: { kind: 'hold', value: limits.sealPsi ?? Infinity, source: { kind: 'drawing', ref: plan.head.name } },
  };
  return limits.targetOver.map((bound) => {
    const { kind, value, source } = bounds[bound];
    return fault({
      limit: `pressure-over-${bound}`,
      kind,
      about: ['test.pressurePsi'],
      source,
      measured: { value: toDecimal(target), unit: 'psi' },
      max: toDecimal(value),
      params: { target: psi(target), limit: psi(value), by: psi(target - value) },
    });
  });
};

const headFaults = ({ head, casing, procedure }: JobPlan): Verdict[] => {
  const drawing: Source = { kind: 'drawing', ref: head.name };
  const faults: Verdict[] = [];
  if (Number(head.casingOdIn) !== Number(casing.odIn))
    faults.push(
      fault({
        limit: 'head-for-other-casing',
        kind: 'stop',
        about: ['headId', 'casing'],
        source: drawing,
        params: { head: inches(head.casingOdIn), casing: inches(casing.odIn) },
      }),
    );
  const tolerance = odTolerance({ nominalOdIn: Number(casing.odIn), measuredOdIn: Number(casing.odIn) });
  if (
    tolerance.ok &&
    Number(head.casingOdIn) === Number(casing.odIn) &&
    Number(head.socketBoreIn) < tolerance.largestIn
  )
    faults.push(
      fault({
        limit: 'socket-tight',
        kind: 'advice',
        about: ['headId'],
        source: standard('API 5CT'),
        params: { bore: inches(head.socketBoreIn), largest: inches(tolerance.largestIn) },
      }),
    );
  if (head.seals !== head.sealAboveBaseIn.length)
    faults.push(
      fault({
        limit: 'seals-miscounted',
        kind: 'stop',
        about: ['headId'],
        source: drawing,
        params: { seals: head.seals },
      }),
    );
  if (!flangeOf({ size: head.nominalSize, ratedPsi: head.ratedPressurePsi }).ok)
    faults.push(
      fault({
        limit: 'flange-unknown',
        kind: 'advice',
        about: ['headId'],
        source: standard('API 6A'),
        params: {
          size: head.nominalSize,
          rating: psi(head.ratedPressurePsi),
          known: ratingsOf(head.nominalSize).join(', ') || '–',
        },
      }),
    );
  const inside = procedure.passes.some((pass) => pass.weld === 'inside');
  if (inside !== (head.welds === 'outside-and-inside'))
    faults.push(
      fault({
        limit: inside ? 'inside-pass-without-weld' : 'inside-weld-without-pass',
        kind: 'stop',
        about: ['procedureId', 'headId'],
        source: { kind: 'procedure', ref: procedure.number },
      }),
    );
  return faults;
};

const needed: readonly Role[] = ['welder', 'company_rep', 'tool_pusher'];

const crewFaults = ({ people, procedure }: JobPlan, day: string): Verdict[] => {
  const processes = [...new Set(procedure.passes.map((pass) => pass.process))];
  const qualified = (process: string): boolean =>
    people.some(
      ({ role, qualifications }) =>
        role === 'welder' &&
        qualifications.some((one) => {
          const continuity = qualificationContinuity({ lastUsed: one.lastUsed, onDay: day });
          return one.process === process && continuity.ok && continuity.inForce;
        }),
    );
  const bothSides = people.filter(
    (person, index) =>
      people.findIndex((one) => one.accountId === person.accountId) === index &&
      onBothSides(people.filter((one) => one.accountId === person.accountId).map((one) => one.role)),
  );
  return [
    ...bothSides.map(({ name }) =>
      fault({ limit: 'on-both-sides', kind: 'stop', about: ['people'], source: commonPractice, params: { name } }),
    ),
    ...needed
      .filter((role) => !people.some((person) => person.role === role))
      .map((role) =>
        fault({
          limit: `nobody-is-${role.replace('_', '-')}`,
          kind: 'stop',
          about: ['people'],
          source: commonPractice,
        }),
      ),
    ...processes
      .filter((process) => !qualified(process))
      .map((process) =>
        fault({
          limit: 'nobody-qualified',
          kind: 'hold',
          about: ['people'],
          source: standard('ASME IX QW-322'),
          params: { process },
        }),
      ),
  ];
};

const instrumentFaults = ({ instruments }: JobPlan, day: string): Verdict[] => [
  ...instruments
    .filter((instrument) => instrument.calibratedUntil < day)
    .map((instrument) =>
      fault({
        limit: 'instrument-out-of-date',
        kind: 'hold',
        about: ['instrumentIds'],
        source: { kind: 'calibration', ref: instrument.serial },
        params: { name: instrument.name, until: { day: instrument.calibratedUntil } },
      }),
    ),
  ...(['gas-meter', 'gauge'] as const)
    .filter(
      (kind) =>
        !instruments.some(
          (instrument) => instrument.kind === kind || (kind === 'gauge' && instrument.kind === 'recorder'),
        ),
    )
    .map((kind) => fault({ limit: `no-${kind}`, kind: 'stop', about: ['instrumentIds'], source: commonPractice })),
];

const settingFaults = ({ terms }: JobPlan): Verdict[] =>
  settingNames
    .filter((name) => {
      const { min, max } = settingDefinitions[name];
      const value = Number(terms.settings[name].value);
      return value < Number(min) || value > Number(max);
    })
    .map((name) => {
      const { unit, min, max } = settingDefinitions[name];
      return fault({
        limit: 'setting-out-of-range',
        kind: 'stop',
        about: [`settings.${name}`],
        source: commonPractice,
        params: { name: { key: `settings.${name}` }, min: { quantity: min, unit }, max: { quantity: max, unit } },
      });
    });

const nitrogenFaults = ({ terms }: JobPlan): Verdict[] =>
  terms.test.medium === 'nitrogen'
    ? [fault({ limit: 'nitrogen', kind: 'advice', about: ['test.medium'], source: standard('ASME PCC-2 article 501') })]
    : [];

/**
 * What cannot work about a plan (`stop`: it is not planned), what will need a concession (`hold`) and what is worth a
 * look (`advice`), each with its numbers and source. `day` is the ISO date that dates are held against.
 */
export const planFaults = (plan: JobPlan, day: string): Verdict[] => [
  ...pressureFaults(plan),
  ...headFaults(plan),
  ...crewFaults(plan, day),
  ...instrumentFaults(plan, day),
  ...settingFaults(plan),
  ...nitrogenFaults(plan),
];
