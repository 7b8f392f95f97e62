import type { RecordEntry } from '../../shared/contracts/commands';
import { gasPlaces } from '../../shared/hold-points/gas';
import { idNumber, type TestJob } from './a-job';

const entry = (field: string, typed: string, unit: string | null = null): RecordEntry => ({
  field,
  typed,
  unit,
  measuredBy: null,
});

/** Clean air at all three places. */
export const cleanAir = (own: Record<string, string> = {}): RecordEntry[] =>
  gasPlaces.flatMap((place) =>
    (
      [
        ['oxygen', '20.9', 'pct'],
        ['flammable', '0', 'pct'],
        ['h2s', '0', 'ppm'],
        ['co', '2', 'ppm'],
      ] as const
    ).map(([gas, typed, unit]) => {
      const field = `gas.${place}.${gas}`;
      return entry(field, own[field] ?? typed, unit);
    }),
  );

/** Everything that point 1 asks for, all of it right. */
export const clearance = (job: TestJob, own: Record<string, string> = {}): RecordEntry[] => [
  ...cleanAir(own),
  entry('gas.meter', own['gas.meter'] ?? 'meter-1'),
  entry('gas.bump-tested', own['gas.bump-tested'] ?? 'yes'),
  entry('gas.monitor', own['gas.monitor'] ?? 'yes'),
  entry('permit.number', 'HW-204'),
  entry('permit.issuer', 'T. Rhule'),
  entry('permit.expires', own['permit.expires'] ?? new Date(job.now + 12 * 3_600_000).toISOString()),
  entry('fire-watch', 'J. Ostrom'),
  entry('attendant', 'P. Lind'),
  entry('crew', 'W. Calder, J. Ostrom, P. Lind'),
];

export const aPhoto = (shot: string, n = 1) => ({
  shot,
  sha256: n.toString(16).padStart(64, 'a'),
  previewSha256: null,
  width: 1600,
  height: 1200,
  takenAt: null,
});

export const statementsOfClearance = ['cement-wait-over', 'float-holding', 'no-flow', 'casing-supported'];

/** A job whose first point is presented. */
export const presentedClearance = (job: TestJob): TestJob => {
  const point = 'hot-work-clearance';
  const welder = job.person('welder');
  return job
    .do('record', { point, entries: clearance(job) }, welder)
    .do('add-photo', { point, ...aPhoto('meter-at-cellar') }, welder)
    .minutes(2)
    .do('present', { point, ...job.signing(point) }, welder);
};

export { idNumber };
