import { firstRefusal, mustBe, type Outcome } from './outcome';

export const carbonEquivalentInfo = {
  id: 'carbon-equivalent',
  version: 1,
  formula:
    'IIW = C+Mn/6+(Cr+Mo+V)/5+(Ni+Cu)/15; Pcm = C+Si/30+(Mn+Cu+Cr)/20+Ni/60+Mo/15+V/10+5B; CET = C+(Mn+Mo)/10+(Cr+Cu)/20+Ni/40',
  source: 'IIW; Ito and Bessyo (Pcm); EN 1011-2 (CET)',
  range: 'each element 0 to 20 % by mass, carbon 0 to 2.1 %',
} as const;

/** A mill certificate's composition in percent by mass. A grade's name (J55) fixes none of it. */
export interface Composition {
  carbonPct: number;
  manganesePct: number;
  siliconPct: number;
  chromiumPct: number;
  molybdenumPct: number;
  vanadiumPct: number;
  nickelPct: number;
  copperPct: number;
  boronPct: number;
}

/** Three carbon equivalents of a steel from its mill certificate, in percent. */
export const carbonEquivalent = (steel: Composition): Outcome<{ iiwPct: number; pcmPct: number; cetPct: number }> => {
  const { carbonPct: c, manganesePct: mn, siliconPct: si, chromiumPct: cr, molybdenumPct: mo } = steel;
  const { vanadiumPct: v, nickelPct: ni, copperPct: cu, boronPct: b } = steel;
  const alloy = { atLeast: 0, atMost: 20 };
  const refused = firstRefusal(
    mustBe('carbonPct', c, { atLeast: 0, atMost: 2.1 }),
    mustBe('manganesePct', mn, alloy),
    mustBe('siliconPct', si, alloy),
    mustBe('chromiumPct', cr, alloy),
    mustBe('molybdenumPct', mo, alloy),
    mustBe('vanadiumPct', v, alloy),
    mustBe('nickelPct', ni, alloy),
    mustBe('copperPct', cu, alloy),
    mustBe('boronPct', b, { atLeast: 0, atMost: 1 }),
  );
  if (refused) return refused;
  return {
    ok: true,
    iiwPct: c + mn / 6 + (cr + mo + v) / 5 + (ni + cu) / 15,
    pcmPct: c + si / 30 + (mn + cu + cr) / 20 + ni / 60 + mo / 15 + v / 10 + 5 * b,
    cetPct: c + (mn + mo) / 10 + (cr + cu) / 20 + ni / 40,
  };
};
