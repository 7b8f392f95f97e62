import { convert } from '../units/convert';
import { nitrogenDensity, nitrogenPressurePa } from './nitrogen-equation';
import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';

export const nitrogenTemperatureInfo = {
  id: 'nitrogen-temperature',
  version: 1,
  formula: 'density from p₁ and T₁, then p₂ at the same density and T₂',
  source: 'reference equation of state of Span and others (2000); atmosphere 14.696 psi',
  range: '−60 to 300 °F, up to 15,000 psig',
} as const;

const ATMOSPHERE_PSI = 14.696;
export const NITROGEN_F = { atLeast: -60, atMost: 300 } as const;
export const NITROGEN_PSIG = { atLeast: 0, atMost: 15_000 } as const;

/** What a gauge shows on nitrogen of a density in mol/m³ at a temperature in °F, psig. */
export const nitrogenGauge = (densityMolM3: number, temperatureF: number): number =>
  convert(nitrogenPressurePa(densityMolM3, convert(temperatureF, 'degF', 'K')) / 1000, 'kPa', 'psi') - ATMOSPHERE_PSI;

/** What a shut-in gauge on nitrogen shows after a change of temperature without any leak, psig. */
export const nitrogenPressureAt = (gas: {
  pressurePsig: number;
  temperatureF: number;
  newTemperatureF: number;
}): Outcome<{ expectedPsig: number; densityMolM3: number }> => {
  const { pressurePsig, temperatureF, newTemperatureF } = gas;
  const refused = firstRefusal(
    mustBe('pressurePsig', pressurePsig, NITROGEN_PSIG),
    mustBe('temperatureF', temperatureF, NITROGEN_F),
    mustBe('newTemperatureF', newTemperatureF, NITROGEN_F),
  );
  if (refused) return refused;
  const absolutePa = convert(pressurePsig + ATMOSPHERE_PSI, 'psi', 'kPa') * 1000;
  const densityMolM3 = nitrogenDensity(absolutePa, convert(temperatureF, 'degF', 'K'));
  if (densityMolM3 === null) return refuse('gas-denser-than-equation', 'pressurePsig', NITROGEN_PSIG);
  return { ok: true, expectedPsig: nitrogenGauge(densityMolM3, newTemperatureF), densityMolM3 };
};
