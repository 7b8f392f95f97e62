import { addDays, formatISO } from 'date-fns';
import type { Instrument, InstrumentKind } from '../../shared/job/plan';

const rows: [kind: InstrumentKind, name: string, serial: string, daysLeft: number, fullScalePsi: number | null][] = [
  ['gas-meter', 'Gas meter 2', 'GM-2207', 40, null],
  ['gas-meter', 'Gas meter 3', 'GM-2291', 12, null],
  ['tape', 'Tape A, 25 ft', 'TP-014', 200, null],
  ['tape', 'Tape B, 25 ft', 'TP-015', 200, null],
  ['level', 'Machinist level 12 in', 'LV-031', 150, null],
  ['level', 'Digital level', 'LV-040', 90, null],
  ['pyrometer', 'Contact pyrometer 1', 'PY-118', 75, null],
  ['gauge', 'Gauge 0 to 3000', 'PG-302', 60, 3000],
  ['gauge', 'Gauge 0 to 2000', 'PG-207', 95, 2000],
  ['gauge', 'Gauge 0 to 5000, out of calibration', 'PG-511', -20, 5000],
  ['recorder', 'Chart recorder 0 to 3000', 'CR-008', 45, 3000],
];

/** The instruments on the truck, one of them out of calibration; dates count from the day the demo is loaded. */
export const demoInstruments = (now: Date): Instrument[] =>
  rows.map(([kind, name, serial, daysLeft, fullScalePsi], at) => ({
    id: `01940000-0000-7000-8000-0000000005${String(at + 1).padStart(2, '0')}`,
    kind,
    name,
    serial,
    calibratedUntil: formatISO(addDays(now, daysLeft), { representation: 'date' }),
    fullScalePsi,
  }));
