import type { InstrumentKind } from '../job/plan';
import type { PointContext } from './context';
import type { FieldDefinition } from './definition';
import { instrument } from './fields';
import { commonPractice, judgeFact } from './judging';
import { siteDay } from './site-day';
import type { Verdict } from './verdict';

/** The kinds that a field asks for; none where it does not name an instrument. */
const kindsOf = ({ of }: FieldDefinition) => (of.type === 'instrument' ? of.kinds : []);

/**
 * Which instrument of a kind a reading was taken with: asked for where the job lists one, and not asked at all where
 * it lists none.
 */
export const namedInstrument = (
  context: PointContext,
  key: string,
  kind: InstrumentKind,
  required = true,
): FieldDefinition[] =>
  context.state.plan.instruments.some((one) => one.kind === kind) ? [instrument(key, [kind], { required })] : [];

/** Past its calibration date an instrument is a hold; a gas meter is a stop. Judged on the day it was used. */
const judgeCalibration = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const reading = context.read(field.key);
  const used = context.instrument(reading?.value);
  if (!reading || !used) return [];
  const gas = kindsOf(field).includes('gas-meter');
  return judgeFact(context, {
    limit: `calibration.${field.key}`,
    kind: gas ? 'stop' : 'hold',
    about: [field.key],
    source: { kind: 'calibration', ref: used.serial },
    says: gas ? 'calibration-gas-meter' : 'calibration',
    params: { name: used.name, until: { day: used.calibratedUntil } },
    holds: siteDay(context.state.plan.zone, reading.at.corrected) <= used.calibratedUntil,
  });
};

/** An instrument that is not on the job's list, or is of another kind, cannot be believed here. */
const judgeListed = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const value = context.value(field.key);
  if (value === undefined) return [];
  const used = context.instrument(value);
  return judgeFact(context, {
    limit: `listed.${field.key}`,
    kind: kindsOf(field).includes('gas-meter') ? 'stop' : 'hold',
    about: [field.key],
    source: commonPractice,
    says: 'instrument-listed',
    params: { name: used?.name ?? value },
    holds: used !== undefined && kindsOf(field).includes(used.kind),
  }).filter((verdict) => verdict.outcome === 'outside');
};

/** Whether the instrument that a reading names is the job's, of the right kind and in calibration. */
export const judgeInstrument = (context: PointContext, field: FieldDefinition): Verdict[] => [
  ...judgeListed(context, field),
  ...judgeCalibration(context, field),
];
