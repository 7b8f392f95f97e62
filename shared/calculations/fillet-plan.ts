import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export const filletPlanInfo = {
  id: 'fillet-plan',
  version: 1,
  formula: 'leg + gap; throat = leg/√2; volume = leg²/2 × 2π(R ± leg/3) (Pappus); rods = mass/(rod metal × efficiency)',
  source: "geometry; Pappus's theorem; density 0.2836 lb/in³ (7850 kg/m³)",
  range: 'leg 0 to 3 in, gap 0 to 1 in, efficiency 1 to 100 %',
} as const;

const STEEL_LB_PER_IN3 = 0.2836;

export interface FilletPlan {
  legIn: number;
  throatIn: number;
  areaIn2: number;
  pathIn: number;
  volumeIn3: number;
  massLb: number;
  depositPerRodLb: number;
  rods: number;
}

/**
 * An equal-leg fillet round the casing: its size with the fit-up gap added, weld metal and rods to bring. The weld
 * outside lies on a larger circle than the casing's surface, the weld inside on a smaller one.
 */
export const filletPlan = (weld: {
  side: 'outside' | 'inside';
  surfaceDiameterIn: number;
  planLegIn: number;
  gapIn: number;
  rodDiameterIn: number;
  rodLengthIn: number;
  stubIn: number;
  efficiencyPct: number;
}): Outcome<FilletPlan> => {
  const { side, surfaceDiameterIn, planLegIn, gapIn, rodDiameterIn, rodLengthIn, stubIn, efficiencyPct } = weld;
  const refused = firstRefusal(
    mustBe('surfaceDiameterIn', surfaceDiameterIn, DIAMETER_IN),
    mustBe('planLegIn', planLegIn, { above: 0, atMost: 3 }),
    mustBe('gapIn', gapIn, { atLeast: 0, atMost: 1 }),
    mustBe('rodDiameterIn', rodDiameterIn, { atLeast: 1 / 32, atMost: 1 }),
    mustBe('rodLengthIn', rodLengthIn, { atLeast: 1, atMost: 60 }),
    mustBe('stubIn', stubIn, { atLeast: 0, below: rodLengthIn }),
    mustBe('efficiencyPct', efficiencyPct, { atLeast: 1, atMost: 100 }),
  );
  if (refused) return refused;
  const legIn = planLegIn + gapIn;
  const centroidIn = surfaceDiameterIn / 2 + (side === 'outside' ? legIn / 3 : -legIn / 3);
  if (centroidIn <= 0) return refuse('bore-not-smaller', 'planLegIn');
  const areaIn2 = legIn ** 2 / 2;
  const pathIn = 2 * Math.PI * centroidIn;
  const volumeIn3 = areaIn2 * pathIn;
  const massLb = volumeIn3 * STEEL_LB_PER_IN3;
  const coreIn3 = (Math.PI / 4) * rodDiameterIn ** 2 * (rodLengthIn - stubIn);
  const depositPerRodLb = (coreIn3 * STEEL_LB_PER_IN3 * efficiencyPct) / 100;
  const rods = Math.ceil(massLb / depositPerRodLb);
  return { ok: true, legIn, throatIn: legIn / Math.SQRT2, areaIn2, pathIn, volumeIn3, massLb, depositPerRodLb, rods };
};
