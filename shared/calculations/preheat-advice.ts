import { convert } from '../units/convert';
import { firstRefusal, mustBe, type Outcome } from './outcome';

export const preheatAdviceInfo = {
  id: 'preheat-advice',
  version: 1,
  formula: 'T = 697·CET + 160·tanh(d/35) + 62·HD^0.35 + (53·CET − 32)·Q − 328 °C',
  source: 'EN 1011-2 method B (range of validity from memory); advice only, the procedure governs',
  range: 'CET 0.2–0.5 %, d 10–90 mm, HD 1–20 mL/100 g, Q 0.5–4 kJ/mm',
} as const;

/** Within these the method holds; outside it gives no advice. From memory. */
export const PREHEAT_METHOD_RANGE = {
  cetPct: { atLeast: 0.2, atMost: 0.5 },
  thicknessMm: { atLeast: 10, atMost: 90 },
  hydrogenMlPer100g: { atLeast: 1, atMost: 20 },
  heatInputKjPerMm: { atLeast: 0.5, atMost: 4 },
} as const;

/**
 * Advice on preheat from carbon equivalent CET, plate thickness (mm), weld hydrogen (mL/100 g) and heat input (kJ/mm),
 * in °C and °F. Refused outside the method's range; the welding procedure always governs.
 */
export const preheatAdvice = (joint: {
  cetPct: number;
  thicknessMm: number;
  hydrogenMlPer100g: number;
  heatInputKjPerMm: number;
}): Outcome<{ preheatC: number; preheatF: number }> => {
  const { cetPct, thicknessMm, hydrogenMlPer100g, heatInputKjPerMm } = joint;
  const refused = firstRefusal(
    mustBe('cetPct', cetPct, PREHEAT_METHOD_RANGE.cetPct),
    mustBe('thicknessMm', thicknessMm, PREHEAT_METHOD_RANGE.thicknessMm),
    mustBe('hydrogenMlPer100g', hydrogenMlPer100g, PREHEAT_METHOD_RANGE.hydrogenMlPer100g),
    mustBe('heatInputKjPerMm', heatInputKjPerMm, PREHEAT_METHOD_RANGE.heatInputKjPerMm),
  );
  if (refused) return refused;
  const preheatC =
    697 * cetPct +
    160 * Math.tanh(thicknessMm / 35) +
    62 * hydrogenMlPer100g ** 0.35 +
    (53 * cetPct - 32) * heatInputKjPerMm -
    328;
  return { ok: true, preheatC, preheatF: convert(preheatC, 'degC', 'degF') };
};
