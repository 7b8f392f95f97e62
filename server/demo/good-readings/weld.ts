import type { PointContext } from '../../../shared/hold-points/context';
import { quarters } from '../../../shared/hold-points/fields';
import { imperfections } from '../../../shared/hold-points/imperfections';
import { planLegIn } from '../../../shared/hold-points/weld-metal';
import type { ProcedurePass } from '../../../shared/job/plan';
import { toDecimal } from '../../../shared/units/decimal';
import { begunAt, instrumentOf, middle, minutesAfter, type Answers } from './answers';
import { goodOrientation } from './head';

const lookIsClean = Object.fromEntries(imperfections.map((found) => [`look.${found}.state`, 'none']));

export const goodPreheat: Answers = (context, at) => {
  const { head, procedure } = context.state.plan;
  const lowest = Number(procedure.preheatF.min);
  return {
    'excavated-cracks': 'none',
    ...Object.fromEntries(
      ['head', 'casing'].flatMap((part) =>
        quarters.map((quarter, index) => [`preheat.${part}.${quarter}`, String(lowest + 20 + 5 * index)]),
      ),
    ),
    'preheat.seal-level': toDecimal(Math.min(180, Number(head.sealRatedF ?? 180))),
    'preheat.distance': '10',
    'preheat.by': 'pyrometer',
    'preheat.instrument': instrumentOf(context, at, (one) => one.kind === 'pyrometer'),
    'joint-dry': 'yes',
    'joint-sheltered': 'yes',
    'fluid.below-weld': '60',
  };
};

/** Arc time of the whole pass at which its heat input comes out in the middle of the procedure's range, to the half minute. */
const arcMinutes = ({ state }: PointContext, pass: ProcedurePass): string => {
  const kilowatts = (Number(middle(pass.currentA)) * Number(middle(pass.voltageV))) / 1000;
  const wanted = pass.heatInputKjPerIn === null ? 25 : Number(middle(pass.heatInputKjPerIn));
  const round = Math.PI * Number(pass.weld === 'inside' ? state.plan.casing.idIn : state.plan.casing.odIn);
  return toDecimal(Math.round((2 * wanted * round) / (kilowatts * 60)) / 2);
};

const welderOf = ({ state }: PointContext, process: string): string =>
  state.people.find((one) => one.role === 'welder' && one.qualifications.some((each) => each.process === process))
    ?.accountId ?? '';

export const goodPass: Answers = (context, at) => {
  const { pass, state } = context;
  if (!pass) return {};
  const lowest = Math.max(Number(state.plan.procedure.preheatF.min), Number(pass.interpassF.min));
  return {
    'temps.head': String(lowest + 30),
    'temps.casing': String(lowest + 40),
    ...goodOrientation(state.plan, 'tacked'),
    welders: welderOf(context, pass.process),
    'rods.1.class': pass.electrodeClass,
    'rods.1.lot': '4471-B',
    'rods.1.out-of-oven': minutesAfter(begunAt(context, 'pass', at), -20),
    'rods.1.count': '6',
    'rods.1.amps': middle(pass.currentA),
    'rods.1.volts': middle(pass.voltageV),
    'rods.1.arc-time': arcMinutes(context, pass),
    ...lookIsClean,
    undercut: '0',
    'fillet-leg': toDecimal((planLegIn(context, pass.weld) ?? 0.5) + 0.0625),
  };
};

/** Read three hours ago and now: the weld has come down to touch under its blanket. */
export const goodCooling: Answers = ({ state }, at) => ({
  'cooling.1.at': minutesAfter(at, -180),
  'cooling.1.temperature': '310',
  'cooling.2.at': at,
  'cooling.2.temperature': '104',
  ambient: '72',
  covered: 'wrapped',
  quenched: 'no',
  'fire-watch-ended': at,
  ...lookIsClean,
  'surface-exam': 'pass',
  ...goodOrientation(state.plan, 'as-built'),
});
