import type { RecordEntry } from '../../../shared/contracts/commands';
import { takeoffOf } from '../../../shared/hold-points/takeoff-of';
import type { PointContext } from '../../../shared/hold-points/context';
import type { PersonRef } from '../../../shared/job/actor';
import type { Range } from '../../../shared/job/plan';
import type { PlacedField, PointReview } from '../../../shared/job/review';
import { toDecimal } from '../../../shared/units/decimal';

/** Who holds the tape and what the watch says while the answers are given. */
export interface Crew {
  first: PersonRef;
  second: PersonRef;
}

const middle = (range: Range): number => (Number(range.min) + Number(range.max)) / 2;
const iso = (ms: number): string => new Date(ms).toISOString();
const minute = 60_000;

/** The height of the string at the stakes in the invented scenario. */
const stringIn = 0;

/** Arc time for one pass round the casing at the middle of the procedure's heat input, minutes. */
const arcMinutes = (context: PointContext): number => {
  const { pass } = context;
  const casing = context.state.plan.casing;
  const roundIn = Math.PI * Number(pass?.weld === 'inside' ? casing.idIn : casing.odIn);
  const kjPerIn = pass?.heatInputKjPerIn ? middle(pass.heatInputKjPerIn) : 20;
  const speed = pass ? (middle(pass.voltageV) * middle(pass.currentA) * 60) / (kjPerIn * 1000) : 7;
  return roundIn / speed;
};

const lastBegun = (context: PointContext, act: string): number | undefined => {
  const run = context.point.acts.filter((one) => one.act === act).at(-1);
  return run ? Date.parse(run.begun.at.corrected) : undefined;
};

const ofOrientation = (key: string, context: PointContext): string | undefined => {
  const part = key.slice(key.indexOf('.') + 1);
  const { terms } = context.state.plan;
  const answers: Record<string, string> = {
    holes: '1 and 2',
    'offset.a': '31 3/8',
    'offset.b': '31 1/2',
    length: '48',
    'level.x': '0.1',
    'level.y': '0',
    height: terms.targetHeightIn,
  };
  return answers[part];
};

/** Answers whose value follows from the job's own numbers. */
const computedAnswer = (key: string, context: PointContext, now: number): string | undefined => {
  const { plan } = context.state;
  const takeoff = takeoffOf(context);
  const { procedure, terms, head, casing } = plan;
  const hold = terms.test;
  const start = lastBegun(context, 'pressure-test') ?? now - (hold.holdMin + 6) * minute;
  const holdStart = start + 2 * minute;
  const holdEnd = holdStart + hold.holdMin * minute;
  if (/^takeoff\.(first|second)$/.test(key)) return head.faceToShoulderIn;
  if (/^socket\.(first|second)$/.test(key)) return head.socketDepthIn;
  if (/^mark\.(first|second)$/.test(key)) return toDecimal(takeoff?.markIn ?? 8);
  if (/^cut\.\d+$/.test(key)) return toDecimal(takeoffOf(context.other('height-takeoff') ?? context)?.markIn ?? 8);
  if (key === 'stub-top') return toDecimal(4 - (takeoff?.markIn ?? 8));
  if (key === 'conductor-top') return toDecimal(-((takeoff?.markIn ?? 8) + Number(head.socketDepthIn) + 14));
  if (key === 'collar') return toDecimal(Number(head.socketDepthIn) + 40);
  if (key === 'bevel.angle') return toDecimal(middle(procedure.bevelDeg));
  if (key === 'bevel.land') return toDecimal(middle(procedure.landIn));
  if (/^od\./.test(key)) return casing.odIn;
  if (key === 'clean.outside') return toDecimal(Number(head.socketDepthIn) + 4);
  if (/^preheat\.(head|casing)\./.test(key)) return toDecimal(Number(procedure.preheatF.min) + 40);
  if (key === 'preheat.seal-level') return toDecimal(Math.min(Number(head.sealRatedF ?? 300) - 40, 240));
  if (/^temps\./.test(key)) {
    const range = context.pass?.interpassF ?? procedure.preheatF;
    return toDecimal(Math.max(Number(range.min), Number(procedure.preheatF.min)) + 40);
  }
  if (/^rods\.\d+\.class$/.test(key)) return context.pass?.electrodeClass;
  if (/^rods\.\d+\.out-of-oven$/.test(key)) return iso((lastBegun(context, 'pass') ?? now) - 8 * minute);
  if (/^rods\.\d+\.amps$/.test(key)) return context.pass ? toDecimal(middle(context.pass.currentA)) : undefined;
  if (/^rods\.\d+\.volts$/.test(key)) return context.pass ? toDecimal(middle(context.pass.voltageV)) : undefined;
  if (/^rods\.\d+\.arc-time$/.test(key)) return toDecimal(arcMinutes(context), 2);
  if (key === 'fillet-leg') return toDecimal(Number((context.pass?.weld === 'inside' ? procedure.insideLegIn : null) ?? procedure.filletLegIn) + 0.125);
  const cooling = /^cooling\.(\d+)\.(at|temperature)$/.exec(key);
  if (cooling) {
    const row = Number(cooling[1]);
    return cooling[2] === 'at' ? iso(now - Math.max(240 - row * 120, 0) * minute) : row === 1 ? '310' : '108';
  }
  if (key === 'fire-watch-ended') return iso(now - 10 * minute);
  if (key === 'hold.start') return iso(holdStart);
  if (key === 'hold.end') return iso(holdEnd);
  const reading = /^hold-readings\.(\d+)\.(at|pressure)$/.exec(key);
  if (reading) {
    const row = Number(reading[1]);
    const at = holdStart + ((row - 1) * (holdEnd - holdStart)) / 2;
    return reading[2] === 'at' ? iso(Math.min(at, holdEnd)) : String(hold.pressurePsi + 30 - 5 * Math.min(row, 3));
  }
  if (key === 'highest') return String(hold.pressurePsi + 28);
  if (key === 'full-scale') return String(hold.pressurePsi * 2);
  if (key === 'nameplate.size') return head.nominalSize;
  if (key === 'nameplate.pressure') return String(head.ratedPressurePsi);
  if (key === 'permit.expires') return iso(now + 12 * 60 * minute);
  return undefined;
};

const fixedAnswers: Record<string, string> = {
  'gas.cellar.oxygen': '20.9',
  'gas.bore.oxygen': '20.9',
  'gas.annulus.oxygen': '20.8',
  'permit.number': 'HW-2041',
  'permit.issuer': 'T. Rhule',
  'fire-watch': 'J. Ostrom',
  attendant: 'P. Lind',
  crew: 'W. Calder, J. Ostrom, P. Lind',
  'nameplate.serial': 'SH-11842',
  'string.a': String(stringIn),
  'string.b': String(stringIn),
  'plumb.x': '0.1',
  'plumb.y': '-0.1',
  'fluid.below-weld': '36',
  'clean.inside': '3',
  'seal.part': 'S-9625-N',
  'seal.condition': 'new, no nicks',
  'seal.sight': 'seen',
  'seal.state-after': 'sound',
  'grease.product': 'seal grease, mineral',
  'grease.clear': '2',
  'seal-again': 'sound',
  'preheat.by': 'stick',
  'preheat.distance': '3 1/4',
  'excavated-cracks': 'none',
  undercut: '1/64',
  ambient: '68',
  covered: 'covered',
  quenched: 'no',
  'surface-exam': 'pass',
  volume: '42',
  leak: 'none',
  'run-by': 'welder',
  'run-by-name': 'W. Calder',
  'resume.temperature': '300',
  'resume.cracks': 'none',
};

const byPattern: [RegExp, string][] = [
  [/^gas\..+\.(flammable|h2s)$/, '0'],
  [/^gas\..+\.co$/, '2'],
  [/^gap\./, '1/32'],
  [/\.lot$/, '7K21'],
  [/\.count$/, '9'],
  [/^look\..+\.state$/, 'none'],
  [/\.where$/, 'tag bag 1 in the welder’s truck'],
  [/\.holder$/, 'W. Calder'],
  [/^plug\.\d\.back$/, 'same'],
];

/** A right answer to one field, as it would be typed. Throws when the scenario has none: then the scenario is out of date. */
export const goodAnswer = (field: PlacedField, context: PointContext, now: number): string => {
  const { key, of } = field;
  const found =
    fixedAnswers[key] ??
    (/^(set|tacked|as-built)\./.test(key) ? ofOrientation(key, context) : undefined) ??
    computedAnswer(key, context, now) ??
    byPattern.find(([pattern]) => pattern.test(key))?.[1];
  if (found !== undefined) return found;
  if (of.type === 'check') return 'yes';
  if (of.type === 'instrument') {
    const fit = context.state.plan.instruments.find((one) => of.kinds.includes(one.kind));
    if (fit) return fit.id;
  }
  if (of.type === 'welders') {
    const welder = context.state.people.find((one) => one.role === 'welder' && one.qualifications.length > 0);
    if (welder) return welder.accountId;
  }
  throw new Error(`the scenario has no answer for ${context.point.place.id} ${key}`);
};

/** The answer as an entry: the first hand measures, the second confirms. */
export const goodEntry = (field: PlacedField, review: PointReview, crew: Crew, now: number): RecordEntry => ({
  field: field.key,
  typed: goodAnswer(field, review.context, now),
  unit: field.of.type === 'quantity' ? field.of.unit : null,
  measuredBy: field.confirms ? crew.second : crew.first,
});

