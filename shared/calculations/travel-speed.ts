import { firstRefusal, mustBe, type Outcome } from './outcome';
import { DIAMETER_IN, POSITIVE_LENGTH_IN } from './ranges';

export const travelSpeedInfo = {
  id: 'travel-speed',
  version: 1,
  formula: 'S = length/arc time; round the casing: π·OD/arc time',
  source: 'definition of travel speed',
  range: 'arc time 0.01 to 600 min',
} as const;

const ARC_MINUTES = { atLeast: 0.01, atMost: 600 } as const;

/** Travel speed of a full pass round the casing, in/min, from the time the arc burned. Several welders share a pass. */
export const travelSpeedRound = (pass: {
  odIn: number;
  arcMinutes: number;
}): Outcome<{ speedInPerMin: number; circumferenceIn: number }> => {
  const { odIn, arcMinutes } = pass;
  const refused = firstRefusal(mustBe('odIn', odIn, DIAMETER_IN), mustBe('arcMinutes', arcMinutes, ARC_MINUTES));
  if (refused) return refused;
  const circumferenceIn = Math.PI * odIn;
  return { ok: true, speedInPerMin: circumferenceIn / arcMinutes, circumferenceIn };
};

/** Travel speed from one rod's run-out: the length it welded over the time its arc burned, in/min. */
export const travelSpeedRunOut = (rod: {
  runOutIn: number;
  arcMinutes: number;
}): Outcome<{ speedInPerMin: number }> => {
  const { runOutIn, arcMinutes } = rod;
  const refused = firstRefusal(
    mustBe('runOutIn', runOutIn, POSITIVE_LENGTH_IN),
    mustBe('arcMinutes', arcMinutes, ARC_MINUTES),
  );
  return refused ?? { ok: true, speedInPerMin: runOutIn / arcMinutes };
};
