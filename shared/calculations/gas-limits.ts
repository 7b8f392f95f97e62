import { LIMITS, type PublishedLimit } from './limits-data';
import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';

export const gasLimitsInfo = {
  id: 'gas-limits',
  version: 1,
  formula: 'oxygen within its band; flammable, H2S and CO under their limits; a site may be stricter, never looser',
  source: '29 CFR 1910.146(b); NIOSH (H2S ceiling, CO REL)',
  range: 'oxygen and flammable 0 to 100 %, H2S and CO 0 to 10,000 ppm',
} as const;

export type Gas = 'oxygen' | 'flammable' | 'hydrogen-sulphide' | 'carbon-monoxide';

interface GasBand {
  readonly low: PublishedLimit | null;
  readonly high: PublishedLimit;
  /** Whether a reading equal to the high limit already fails. */
  readonly highFails: boolean;
  readonly most: number;
}

const BANDS: Readonly<Record<Gas, GasBand>> = {
  oxygen: { low: LIMITS.oxygenLow, high: LIMITS.oxygenHigh, highFails: false, most: 100 },
  flammable: { low: null, high: LIMITS.flammableHotWork, highFails: false, most: 100 },
  'hydrogen-sulphide': { low: null, high: LIMITS.hydrogenSulphide, highFails: true, most: 10_000 },
  'carbon-monoxide': { low: null, high: LIMITS.carbonMonoxide, highFails: true, most: 10_000 },
};

/** Flammable gas is the one limit a site may raise, and only to below the regulation's ceiling. */
const siteMayUse = (gas: Gas, site: number): boolean => {
  if (gas === 'flammable') return site >= 0 && site < LIMITS.flammableCeiling.value;
  return site >= 0 && site <= BANDS[gas].high.value;
};

/**
 * Whether a gas reading allows hot work (percent for oxygen, percent LFL for flammable, ppm for H2S and CO). `siteHigh`
 * and, for oxygen, `siteLow` are the site's own limits; null takes the published ones.
 */
export const gasLimits = (sample: {
  gas: Gas;
  reading: number;
  siteLow: number | null;
  siteHigh: number | null;
}): Outcome<{ verdict: 'pass' | 'stop'; low: number | null; high: number; source: string }> => {
  const { gas, reading, siteLow, siteHigh } = sample;
  const band = BANDS[gas];
  const anything = { atLeast: 0, atMost: band.most };
  const refused = firstRefusal(
    mustBe('reading', reading, anything),
    siteLow === null ? null : mustBe('siteLow', siteLow, anything),
    siteHigh === null ? null : mustBe('siteHigh', siteHigh, anything),
  );
  if (refused) return refused;
  const lowLimit = band.low?.value ?? null;
  if (siteHigh !== null && !siteMayUse(gas, siteHigh)) {
    const ceiling = gas === 'flammable' ? { below: LIMITS.flammableCeiling.value } : { atMost: band.high.value };
    return refuse('site-limit-looser', 'siteHigh', ceiling);
  }
  if (siteLow !== null && lowLimit !== null && siteLow < lowLimit) {
    return refuse('site-limit-looser', 'siteLow', { atLeast: lowLimit });
  }
  const low = lowLimit === null ? null : (siteLow ?? lowLimit);
  const high = siteHigh ?? band.high.value;
  const tooLow = low !== null && reading < low;
  const tooHigh = band.highFails ? reading >= high : reading > high;
  const bySite = siteHigh !== null || (siteLow !== null && low !== null);
  return {
    ok: true,
    verdict: tooLow || tooHigh ? 'stop' : 'pass',
    low,
    high,
    source: bySite ? 'job' : band.high.source,
  };
};
