import { filletPlan, type FilletPlan } from '../calculations/fillet-plan';
import type { WeldSide } from '../job/plan';
import { answer } from './computing';
import { contextOf, type PointContext } from './context';
import { gapToAddIn } from './fit-up-gaps';

/** What a rod leaves in the joint: rods of 14 in burned down to 2 in, nine tenths of the core. Common practice. */
const rod = { rodLengthIn: 14, stubIn: 2, efficiencyPct: 90 } as const;

/** The leg that the plan asks for on one side, the fit-up gap added outside; undefined where nothing is welded there. */
export const planLegIn = (context: PointContext, side: WeldSide): number | undefined => {
  const { filletLegIn, insideLegIn } = context.state.plan.procedure;
  if (side === 'inside') return insideLegIn === null ? undefined : Number(insideLegIn);
  return Number(filletLegIn) + (gapToAddIn(context) ?? 0);
};

const planFor = (context: PointContext, side: WeldSide, rodDiameterIn: number): FilletPlan | undefined => {
  const { casing } = context.state.plan;
  const legIn = planLegIn(context, side);
  if (legIn === undefined) return undefined;
  return answer(
    filletPlan({
      side,
      surfaceDiameterIn: Number(side === 'outside' ? casing.odIn : casing.idIn),
      planLegIn: legIn,
      gapIn: 0,
      rodDiameterIn,
      ...rod,
    }),
  );
};

const depositLb = (context: PointContext): number => {
  const { pass } = context;
  if (!pass) return 0;
  const perRod = planFor(context, pass.weld, Number(pass.electrodeDiameterIn))?.depositPerRodLb ?? 0;
  return context.rows('rods').reduce((sum, row) => sum + perRod * (context.number(`rods.${row}.count`) ?? 0), 0);
};

/** The passes of this round up to and with this one, in order. */
const passesSoFar = (context: PointContext): PointContext[] => {
  const { state, point } = context;
  return state.points
    .slice(0, state.points.findIndex((one) => one.place.id === point.place.id) + 1)
    .filter((one) => one.place.kind === 'pass-inspected' && one.place.round === point.place.round)
    .map((one) => contextOf(state, one));
};

/** Passes whose arc went out for good, this one included. */
export const beadsSoFar = (context: PointContext): number =>
  passesSoFar(context).filter(({ point }) =>
    [point, ...point.superseded].some((evidence) => evidence.acts.some((run) => run.act === 'pass' && run.ended)),
  ).length;

/**
 * Weld metal laid on this pass's side so far against the plan of that side, in pounds; undefined in a repair round,
 * where what was taken out is not known.
 */
export const weldMetal = (context: PointContext): { laidLb: number; planLb: number } | undefined => {
  const { pass } = context;
  if (!pass || context.point.place.round > 0 || context.rows('rods').length === 0) return undefined;
  const plan = planFor(context, pass.weld, Number(pass.electrodeDiameterIn));
  if (!plan) return undefined;
  const sameSide = passesSoFar(context).filter((one) => one.pass?.weld === pass.weld);
  return { laidLb: sameSide.reduce((sum, one) => sum + depositLb(one), 0), planLb: plan.massLb };
};
