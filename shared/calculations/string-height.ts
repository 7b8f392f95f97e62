import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { HEIGHT_IN, LENGTH_IN, POSITIVE_LENGTH_IN } from './ranges';

export const stringHeightInfo = {
  id: 'string-height',
  version: 1,
  formula: 'h = hA + (hB − hA)·d/L',
  source: 'common practice (linear interpolation between two stakes)',
  range: 'casing between the stakes, 0 ≤ d ≤ L',
} as const;

/** Height of the string above ground where it passes the casing, in inches, between stakes A and B. */
export const stringHeight = (string: {
  heightAtStakeAIn: number;
  heightAtStakeBIn: number;
  stakeAToStakeBIn: number;
  stakeAToCasingIn: number;
}): Outcome<{ stringHeightIn: number; slopeInPerFt: number }> => {
  const { heightAtStakeAIn, heightAtStakeBIn, stakeAToStakeBIn, stakeAToCasingIn } = string;
  const refused = firstRefusal(
    mustBe('heightAtStakeAIn', heightAtStakeAIn, HEIGHT_IN),
    mustBe('heightAtStakeBIn', heightAtStakeBIn, HEIGHT_IN),
    mustBe('stakeAToStakeBIn', stakeAToStakeBIn, POSITIVE_LENGTH_IN),
    mustBe('stakeAToCasingIn', stakeAToCasingIn, LENGTH_IN),
  );
  if (refused) return refused;
  if (stakeAToCasingIn > stakeAToStakeBIn) {
    return refuse('casing-outside-stakes', 'stakeAToCasingIn', { atLeast: 0, atMost: stakeAToStakeBIn });
  }
  const rise = heightAtStakeBIn - heightAtStakeAIn;
  return {
    ok: true,
    stringHeightIn: heightAtStakeAIn + (rise * stakeAToCasingIn) / stakeAToStakeBIn,
    slopeInPerFt: (rise / stakeAToStakeBIn) * 12,
  };
};
