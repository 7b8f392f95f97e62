import { convert } from '../units/convert';
import { firstRefusal, mustBe, type Outcome } from './outcome';
import { POSITIVE_PRESSURE_PSI, VOLUME_L } from './ranges';

export const nitrogenStoredEnergyInfo = {
  id: 'nitrogen-stored-energy',
  version: 1,
  formula: 'E = 2.5·Pat·V·[1 − (Pa/Pat)^0.286]; TNT = E/4,266,920 kg; R = 20·(2·TNT)^(1/3) m, at least the floor',
  source: 'ASME PCC-2 article 501 (floor of 60 m up to 271 MJ: from memory)',
  range: 'pressure above 0 to 100,000 psig, volume above 0 to 1,000,000 L',
} as const;

const ATMOSPHERE_PA = 101_000;
const TNT_J_PER_KG = 4_266_920;

/** Least distance by stored energy. Above the last step only the formula counts. */
export const STAND_OFF_FLOORS = [
  { upToJ: 135.5e6, floorM: 30, status: 'stated by the source' },
  { upToJ: 271e6, floorM: 60, status: 'from memory' },
] as const;

/** Energy in compressed nitrogen (J), its weight in TNT and the distance nobody stands inside of (m and ft). */
export const nitrogenStoredEnergy = (test: {
  volumeL: number;
  pressurePsig: number;
}): Outcome<{ energyJ: number; tntKg: number; formulaM: number; standOffM: number; standOffFt: number }> => {
  const { volumeL, pressurePsig } = test;
  const refused = firstRefusal(
    mustBe('volumeL', volumeL, VOLUME_L),
    mustBe('pressurePsig', pressurePsig, POSITIVE_PRESSURE_PSI),
  );
  if (refused) return refused;
  const absolutePa = convert(pressurePsig, 'psi', 'kPa') * 1000 + ATMOSPHERE_PA;
  const energyJ = 2.5 * absolutePa * (volumeL / 1000) * (1 - (ATMOSPHERE_PA / absolutePa) ** 0.286);
  const tntKg = energyJ / TNT_J_PER_KG;
  const formulaM = 20 * Math.cbrt(2 * tntKg);
  const floorM = STAND_OFF_FLOORS.find((step) => energyJ <= step.upToJ)?.floorM ?? 0;
  const standOffM = Math.max(formulaM, floorM);
  return { ok: true, energyJ, tntKg, formulaM, standOffM, standOffFt: convert(standOffM, 'm', 'ft') };
};
