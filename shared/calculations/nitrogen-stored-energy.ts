import { convert } from '../units/convert';
import { LIMITS } from './limits-data';
import { firstRefusal, mustBe, type Outcome } from './outcome';
import { POSITIVE_PRESSURE_PSI, VOLUME_L } from './ranges';

export const nitrogenStoredEnergyInfo = {
  id: 'nitrogen-stored-energy',
  version: 1,
  formula:
    'E = 2.5·Pat·V·[1 − (Pa/Pat)^0.286]; TNT = E/4,266,920 kg; R = 20·(2·TNT)^(1/3) m, at least 30 m up to 135.5 MJ',
  source: 'ASME PCC-2 article 501',
  range: 'pressure above 0 to 100,000 psig, volume above 0 to 1,000,000 L',
} as const;

const ATMOSPHERE_PA = 101_000;
const TNT_J_PER_KG = 4_266_920;

/** Up to this energy the distance is never less than the floor; above it the formula asks for more by itself. */
const FLOOR_UP_TO_J = 135.5e6;

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
  const floorM = energyJ <= FLOOR_UP_TO_J ? LIMITS.standOffSmall.value : 0;
  const standOffM = Math.max(formulaM, floorM);
  return { ok: true, energyJ, tntKg, formulaM, standOffM, standOffFt: convert(standOffM, 'm', 'ft') };
};
