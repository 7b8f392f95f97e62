import { convert } from '../units/convert';
import { firstRefusal, mustBe, type Outcome } from './outcome';
import { PRESSURE_PSI, VOLUME_L } from './ranges';

export const oilCompressionInfo = {
  id: 'oil-compression',
  version: 1,
  formula: 'ΔV = V·ΔP/B; E = P²·V/(2B)',
  source: 'definition of the bulk modulus',
  range: 'bulk modulus 50,000 to 1,000,000 psi; the metal taken as rigid',
} as const;

/** Bulk modulus a hydraulic oil may have, psi. */
export const BULK_MODULUS_PSI = { atLeast: 50_000, atMost: 1_000_000 } as const;

/** Oil to pump into a full void to raise its pressure, litres, and the energy stored in it, joules. */
export const oilCompression = (test: {
  volumeL: number;
  pressurePsi: number;
  bulkModulusPsi: number;
}): Outcome<{ pumpL: number; pumpIn3: number; energyJ: number }> => {
  const { volumeL, pressurePsi, bulkModulusPsi } = test;
  const refused = firstRefusal(
    mustBe('volumeL', volumeL, VOLUME_L),
    mustBe('pressurePsi', pressurePsi, PRESSURE_PSI),
    mustBe('bulkModulusPsi', bulkModulusPsi, BULK_MODULUS_PSI),
  );
  if (refused) return refused;
  const pumpL = (volumeL * pressurePsi) / bulkModulusPsi;
  const pressurePa = convert(pressurePsi, 'psi', 'kPa') * 1000;
  return { ok: true, pumpL, pumpIn3: convert(pumpL, 'L', 'in3'), energyJ: (pressurePa * (pumpL / 1000)) / 2 };
};
