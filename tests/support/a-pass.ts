import type { JobPlan, ProcedurePass } from '../../shared/job/plan';
import { aPlan, welder } from './a-plan';
import { aPointContext, type ReadingSpecs } from './a-point';

/** Readings, acts and plans of a pass that is within all its limits, for tests to spoil. */
export const kind = 'pass-inspected' as const;
export const at = (clock: string): string => `2026-09-14T${clock}:00.000Z`;
/** The look at the bead: nothing found, but for what the test says. */
export const looked = (own: ReadingSpecs = {}): ReadingSpecs => ({
  ...Object.fromEntries(
    ['porosity', 'slag', 'overlap', 'arc-strike', 'crack'].map((one) => [`look.${one}.state`, 'none']),
  ),
  ...own,
});
/** 9.625 in round: 30.238 in of weld; 3 min of arc make 10.079 in/min, at 24 V and 120 A 17.144 kJ/in. */
export const rods = (row: number, own: Record<string, string | number> = {}): ReadingSpecs =>
  Object.fromEntries(
    Object.entries({
      class: 'E8018-C3',
      lot: 'L-204',
      'out-of-oven': at('11:30'),
      count: 6,
      amps: 120,
      volts: 24,
      'arc-time': 3,
      ...own,
    }).map(([name, value]) => [`rods.${row}.${name}`, value]),
  );
export const allRead: ReadingSpecs = {
  'temps.head': 300,
  'temps.casing': 310,
  welders: welder.accountId,
  ...rods(1),
  ...looked(),
  undercut: 0,
};
export const struck = [{ act: 'pass', begun: at('12:02'), ended: at('12:20') }];
/** The second of four passes of the invented job, welded and read. */
export const aPass = (own: ReadingSpecs = {}, more: { pass?: number; round?: number; plan?: JobPlan } = {}) =>
  aPointContext({ kind, pass: 2, ...more, readings: { ...allRead, ...own }, acts: struck });
/** The passes of the invented procedure, each changed alike. */
export const fillets = (own: Partial<ProcedurePass> = {}): ProcedurePass[] =>
  aPlan().procedure.passes.map((pass) => ({ ...pass, ...own }));
