import type { PasswordRefusal } from '../../../shared/account/password-rules';
import type { PinRefusal } from '../../../shared/account/pin-rules';
import { commandTypes, signedCommands } from '../../../shared/contracts/commands';
import { pointKinds } from '../../../shared/hold-points/points';
import type { Source } from '../../../shared/hold-points/verdict';
import type { JobEventType } from '../../../shared/job/events';
import {
  settingNames,
  type Datum,
  type InstrumentKind,
  type PassName,
  type TestMedium,
} from '../../../shared/job/plan';
import { refusalCodes } from '../../../shared/job/refusal';
import type { Chapter } from '../../../shared/job/story';
import { worthKinds } from '../../../shared/job/worth-reading';
import { roles } from '../../../shared/permissions/roles';
import { PHOTO_REFUSALS, RECORDER_REFUSALS, TRANSFER_REFUSALS } from '../../../shared/photos/refusals';
import type { ParseRefusal } from '../../../shared/units/parse-quantity';
import { allKeys } from './all-keys';
import { problemCodes } from './keys-in-source';

/** All values of a union: the compiler sees to it that none is forgotten. */
const all = <T extends string>(values: Record<T, true>): T[] => Object.keys(values) as T[];
const under = (before: string, names: readonly string[]): string[] => names.map((name) => `${before}.${name}`);

const parseRefusals = all<ParseRefusal>({
  'quantity-empty': true,
  'quantity-not-understood': true,
  'quantity-not-finite': true,
  'quantity-exponent': true,
  'quantity-many-commas': true,
  'quantity-comma-ambiguous': true,
  'quantity-zero-denominator': true,
  'quantity-fraction-not-on-tape': true,
  'quantity-fraction-not-proper': true,
  'quantity-fraction-needs-inches': true,
  'quantity-fraction-with-decimal': true,
  'quantity-inches-reach-a-foot': true,
  'quantity-feet-not-whole': true,
  'quantity-unit-unknown': true,
  'quantity-unit-of-another-kind': true,
  'quantity-too-many-digits': true,
});
const answers = ['answer-empty', 'count-not-whole', 'check-yes-or-no', 'choice-not-offered', 'time-not-understood'];

const password = all<PasswordRefusal>({
  'too-short': true,
  'too-long': true,
  common: true,
  'too-simple': true,
  'contains-you': true,
});
const pin = all<PinRefusal>({ 'not-digits': true, 'too-short': true, 'too-long': true, repeats: true, sequence: true });
const people = ['person-unknown', 'person-without-role', 'person-on-both-sides'];

/** What a field's fault is called: the reasons of the schema library, and those of planning. */
const fieldCodes = [
  ...['missing', 'invalid-type', 'invalid-format', 'invalid-value', 'invalid-union', 'too-small', 'too-big'],
  ...['unrecognized-keys', 'not-multiple-of', 'custom', 'unknown', 'person-twice', ...people],
];
const errorCodes = (): string[] => [
  ...problemCodes(),
  ...PHOTO_REFUSALS,
  ...RECORDER_REFUSALS,
  ...TRANSFER_REFUSALS,
  ...under('command', ['conflict', 'blocked', 'forbidden', ...people]),
  ...under('password', password),
  ...under('pin', pin),
  ...under('field', fieldCodes),
];

const datum = all<Datum>({ face: true, outlet: true, base: true });
const medium = all<TestMedium>({ 'hydraulic-oil': true, nitrogen: true });
const directions = ['v-door', 'mud-tanks', 'pipe-racks', 'doghouse', 'choke-manifold', 'other'];
const welds = ['outside', 'inside'];
const instruments = all<InstrumentKind>({
  'gas-meter': true,
  tape: true,
  level: true,
  pyrometer: true,
  gauge: true,
  recorder: true,
});
const sources = all<Source['kind']>({
  job: true,
  procedure: true,
  standard: true,
  'common-practice': true,
  drawing: true,
  calibration: true,
  'instrument-data': true,
});
const passNames = all<PassName>({ root: true, 'hot-pass': true, fill: true, cap: true });
const judgedAt = all<Chapter['judgedAt']>({ release: true, presentation: true, evidence: true });
const governing = ['flange', 'collapse', 'seal'];
const brokenBy = ['gap', 'prev', 'hash', 'unreadable'];
const systems = ['imperial', 'metric'];
const languages = ['en', 'es'];
const events = all<JobEventType>({
  'job-planned': true,
  'readings-recorded': true,
  'photo-added': true,
  'photo-set-aside': true,
  'row-struck': true,
  'act-begun': true,
  'act-ended': true,
  'point-presented': true,
  'presentation-withdrawn': true,
  'point-released': true,
  'point-sent-back': true,
  'reading-conceded': true,
  'point-reopened': true,
  'repair-round-opened': true,
  'setting-begun': true,
  'direction-named': true,
  'direction-proposed': true,
  'work-stopped': true,
  'work-resumed': true,
  'terms-changed': true,
  'shift-handed-over': true,
  'instrument-added': true,
  'person-assigned': true,
  'person-removed': true,
  'job-called-off': true,
  'job-sealed': true,
});
const planFaults = [
  ...['flange', 'collapse', 'collapse-share', 'seal'].map((bound) => `pressure-over-${bound}`),
  ...['head-for-other-casing', 'socket-tight', 'seals-miscounted', 'flange-unknown', 'inside-pass-without-weld'],
  ...['inside-weld-without-pass', 'on-both-sides', 'nobody-is-welder', 'nobody-is-company-rep'],
  ...['nobody-is-tool-pusher', 'nobody-qualified', 'instrument-out-of-date', 'no-gas-meter', 'no-gauge'],
  ...['setting-out-of-range', 'nitrogen'],
];
const ownCasing = under('ownCasing', [
  ...['odIn', 'weightLbFt', 'wallIn', 'grade', 'collapsePsi', 'internalYieldPsi', 'source'],
]);
const needed = [
  ...['operatorId', 'rigId', 'well', 'zone', 'casing', 'headId', 'targetHeightIn', 'standOffIn', 'procedureId'],
  ...['test.pressurePsi', 'test.holdMin', 'test.allowedDropPsi', 'people', 'instrumentIds', ...ownCasing],
];
const facts = ['operator', 'rig', 'well', 'zone', 'casing', 'ratings', 'head', 'procedure', 'direction'];
const ofHead = [
  'flange',
  'casing',
  'faceToShoulder',
  'faceToOutlet',
  'overall',
  'socket',
  'bore',
  'welds',
  'ports',
  'seals',
];

/** Points, limits and the site have their keys from the definitions; a test of its own asks the definitions for them. */
const fromDefinitions: string[] = [];

/**
 * Every key that is put together from parts, by the shape in which it stands in the source, with all that it can come
 * to. A shape that is missing here fails the test, and so does one that the source has no more.
 */
export const families = (): Record<string, readonly string[]> => ({
  'account.languages.${…}': under('account.languages', languages),
  'account.themes.${…}': under('account.themes', ['day', 'night', 'system']),
  'account.unit.${…}': under('account.unit', systems),
  'app.problem.${…}': under('app.problem', [
    ...['noSignal', 'noSignalDo', 'signedOut', 'signedOutDo', 'notYours', 'notFound', 'notFoundDo', 'tooOften'],
    ...['tooOftenDo', 'busy', 'busyDo', 'unknown', 'unknownDo'],
  ]),
  'app.role.${…}': under('app.role', roles),
  'desk.${…}': ['desk.released', 'desk.back'],
  'desk.goneBy.${…}': ['desk.goneBy.sentBack', 'desk.goneBy.withdrawn', 'desk.goneBy.reopened'],
  'entry.${…}': under('entry', [...parseRefusals, ...answers]),
  'errors.${…}': under('errors', errorCodes()),
  'errors.password.${…}': under('errors.password', password),
  'errors.pin.${…}': under('errors.pin', pin),
  'job.datum.${…}': under('job.datum', datum),
  'job.directions.${…}': under('job.directions', directions),
  'job.medium.${…}': under('job.medium', medium),
  'job.numbers.${…}': under('job.numbers', [
    'target',
    'stand-off',
    'takeoff',
    'cut',
    'mark',
    'head',
    'casing',
    'procedure',
    'test',
  ]),
  'job.point.command.${…}': under('job.point.command', [
    ...commandTypes.filter((type) => !told.includes(type)),
    'file',
  ]),
  'job.point.entry.${…}': ['job.point.entry.yes', 'job.point.entry.no'],
  'job.point.ownerOf.${…}': under('job.point.ownerOf', ['company_rep', 'tool_pusher']),
  'job.point.source.${…}': under('job.point.source', sources),
  'job.site${…}${…}.${…}': fromDefinitions,
  'job.terms.names.${…}': under('job.terms.names', ['datum', 'targetHeightIn', 'standOffIn', 'test']),
  'limits.${…}.${…}': fromDefinitions,
  'packets.check.${…}': under('packets.check', ['events', 'signatures', 'photos']),
  'packets.check.why.${…}': under('packets.check.why', brokenBy),
  'packets.counts.${…}': under('packets.counts', pointKinds),
  'packets.event.${…}': under('packets.event', [...events, 'presentation-withdrawn-late', 'shift-handed-over-to']),
  'packets.one.datum.${…}': under('packets.one.datum', datum),
  'packets.part.${…}': under('packets.part', ['plan', 'terms', 'points', 'between', 'timeLine']),
  'packets.plan.${…}': under('packets.plan', facts),
  'packets.pressure.by.${…}': under('packets.pressure.by', governing),
  'packets.record.judgedAt.${…}': under('packets.record.judgedAt', judgedAt),
  'packets.signed.language.${…}': under('packets.signed.language', languages),
  'packets.signed.units.${…}': under('packets.signed.units', systems),
  'packets.summary.${…}': under('packets.summary', ['superseded', 'unfinished', 'untouched']),
  'packets.terms.${…}': under('packets.terms', ['datum', 'target', 'standOff', 'medium', 'pressure', 'hold', 'drop']),
  'packets.worth.${…}': under('packets.worth', worthKinds),
  'packets.worth.${…}None': ['packets.worth.instrumentsNone'],
  'plan.datum.${…}': under('plan.datum', datum),
  'plan.facts.${…}': under('plan.facts', [
    ...['stop', 'hold', 'advice', 'above', 'below', 'level', 'waitsHead', 'waitsHeight', 'waitsCasing'],
  ]),
  'plan.facts.by.${…}': under('plan.facts.by', governing),
  'plan.fields.${…}': under('plan.fields', [...needed, 'direction', 'test.medium']),
  'plan.head.${…}': under('plan.head', ofHead),
  'plan.head.weldsAre.${…}': under('plan.head.weldsAre', ['outside', 'outside-and-inside']),
  'plan.instruments.${…}': under('plan.instruments', instruments),
  'plan.medium.${…}': under('plan.medium', medium),
  'plan.need.${…}': under('plan.need', needed),
  'plan.people.${…}': under('plan.people', ['welder', 'company_rep', 'tool_pusher']),
  'plan.procedure.${…}': under('plan.procedure', ['preheat', 'bevel', 'land', 'leg', 'insideLeg']),
  'plan.procedure.passNames.${…}': under('plan.procedure.passNames', passNames),
  'plan.procedure.side.${…}': under('plan.procedure.side', welds),
  'planFaults.${…}': under('planFaults', planFaults),
  'points.${…}.${…}.${…}': fromDefinitions,
  'points.${…}.acts.${…}': fromDefinitions,
  'points.${…}.lead': pointKinds.map((kind) => `points.${kind}.lead`),
  'points.${…}.title': pointKinds.map((kind) => `points.${kind}.title`),
  'points.hot-work-clearance.${…}.${…}': fromDefinitions,
  'points.valve-orientation.choices.direction.${…}': under('points.valve-orientation.choices.direction', directions),
  'refusals.${…}': under('refusals', Object.keys(refusalCodes)),
  'settings.${…}': under('settings', settingNames),
  'signature.${…}': under('signature', signedCommands),
});

/** Commands that never wait in the list of what was refused, or that go by the name `an entry` there. */
const told: readonly string[] = commandTypes.filter((type) => !allKeys().includes(`job.point.command.${type}`));
