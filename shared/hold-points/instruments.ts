import type { PointContext } from './context';
import type { FieldDefinition } from './definition';
import { commonPractice, judgeFact } from './judging';
import { siteDay } from './site-day';
import type { Verdict } from './verdict';

/** The kinds that a field asks for; none where it does not name an instrument. */
const kindsOf = ({ of }: FieldDefinition) => (of.type === 'instrument' ? of.kinds : []);

/** Past its calibration date an instrument is a hold; a gas meter is a stop. Judged on the day it was used. */
const judgeCalibration = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const reading = context.read(field.key);
  const instrument = context.instrument(reading?.value);
  if (!reading || !instrument) return [];
  const gas = kindsOf(field).includes('gas-meter');
  return judgeFact(context, {
    limit: `calibration.${field.key}`,
    kind: gas ? 'stop' : 'hold',
    about: [field.key],
    source: { kind: 'calibration', ref: instrument.serial },
    says: gas ? 'calibration-gas-meter' : 'calibration',
    params: { name: instrument.name, until: { instant: `${instrument.calibratedUntil}T00:00:00.000Z` } },
    holds: siteDay(context.state.plan.zone, reading.at.corrected) <= instrument.calibratedUntil,
  });
};

/** An instrument that is not on the job's list, or is of another kind, cannot be believed here. */
const judgeListed = (context: PointContext, field: FieldDefinition): Verdict[] => {
  const value = context.value(field.key);
  if (value === undefined) return [];
  const instrument = context.instrument(value);
  return judgeFact(context, {
    limit: `listed.${field.key}`,
    kind: kindsOf(field).includes('gas-meter') ? 'stop' : 'hold',
    about: [field.key],
    source: commonPractice,
    says: 'instrument-listed',
    params: { name: instrument?.name ?? value },
    holds: instrument !== undefined && kindsOf(field).includes(instrument.kind),
  }).filter((verdict) => verdict.outcome === 'outside');
};

/** Whether the instrument that a reading names is the job's, of the right kind and in calibration. */
export const judgeInstrument = (context: PointContext, field: FieldDefinition): Verdict[] => [
  ...judgeListed(context, field),
  ...judgeCalibration(context, field),
];
