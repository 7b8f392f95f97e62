import { firstRefusal, mustBe, type Outcome } from './outcome';

export const heatInputInfo = {
  id: 'heat-input',
  version: 1,
  formula: 'J/in = V·I·60/S',
  source: 'ASME IX QW-409.1(a)',
  range: '0 < V ≤ 100, 0 < I ≤ 2000 A, 0.01 ≤ S ≤ 500 in/min',
} as const;

/**
 * Heat input of a pass from volts, amperes and travel speed in in/min. No efficiency factor: the European factor of 0.8
 * belongs to another convention and must not be mixed in.
 */
export const heatInput = (pass: {
  volts: number;
  amperes: number;
  speedInPerMin: number;
}): Outcome<{ joulesPerIn: number; kilojoulesPerIn: number; kilojoulesPerMm: number }> => {
  const { volts, amperes, speedInPerMin } = pass;
  const refused = firstRefusal(
    mustBe('volts', volts, { above: 0, atMost: 100 }),
    mustBe('amperes', amperes, { above: 0, atMost: 2000 }),
    mustBe('speedInPerMin', speedInPerMin, { atLeast: 0.01, atMost: 500 }),
  );
  if (refused) return refused;
  const joulesPerIn = (volts * amperes * 60) / speedInPerMin;
  return { ok: true, joulesPerIn, kilojoulesPerIn: joulesPerIn / 1000, kilojoulesPerMm: joulesPerIn / 1000 / 25.4 };
};
