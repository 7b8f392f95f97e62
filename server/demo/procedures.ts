import type { PassName, Procedure, ProcedurePass, Range, WeldSide } from '../../shared/job/plan';

const range = (min: string, max: string): Range => ({ min, max });

/** A pass with low-hydrogen rod: the root with the thin one, the rest with the thicker. */
function lowHydrogen(name: PassName, weld: WeldSide, electrodeClass: string): ProcedurePass {
  const root = name === 'root';
  return {
    name,
    weld,
    process: 'SMAW',
    electrodeClass,
    electrodeDiameterIn: root ? '0.125' : '0.15625',
    currentA: root ? range('90', '140') : range('120', '190'),
    voltageV: range('20', '27'),
    heatInputKjPerIn: root ? range('12', '40') : range('15', '50'),
    interpassF: range('250', '600'),
  };
}

/** Two invented welding procedures: one for heads with a seal, one for heads welded on both sides. */
export const demoProcedures: readonly Procedure[] = [
  {
    id: '01940000-0000-7000-8000-000000000401',
    number: 'SOW-104',
    revision: 'C',
    preheatF: range('250', '400'),
    bevelDeg: range('30', '37.5'),
    landIn: range('0', '0.125'),
    filletLegIn: '0.5',
    insideLegIn: null,
    preheatDistance: 'aws-d1.1',
    surfaceExam: 'none',
    chemistry: null,
    passes: (['root', 'hot-pass', 'fill', 'cap'] as const).map((name) => lowHydrogen(name, 'outside', 'E7018')),
  },
  {
    id: '01940000-0000-7000-8000-000000000402',
    number: 'SOW-112',
    revision: 'A',
    preheatF: range('300', '450'),
    bevelDeg: range('27.5', '35'),
    landIn: range('0', '0.125'),
    filletLegIn: '0.5625',
    insideLegIn: '0.375',
    preheatDistance: 'iso-13916',
    surfaceExam: 'magnetic-particle',
    chemistry: {
      composition: {
        carbon: '0.22',
        manganese: '0.95',
        silicon: '0.25',
        chromium: '0.1',
        molybdenum: '0.03',
        vanadium: '0.01',
        nickel: '0.05',
        copper: '0.1',
        boron: '0',
      },
      thicknessMm: '40',
      hydrogenMl: '3',
      heatInputKjPerMm: '1.5',
    },
    passes: [
      ...(['root', 'hot-pass', 'fill', 'cap'] as const).map((name) => lowHydrogen(name, 'outside', 'E8018')),
      ...(['root', 'cap'] as const).map((name) => lowHydrogen(name, 'inside', 'E8018')),
    ],
  },
];
