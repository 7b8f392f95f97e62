import { firstRefusal, mustBe, type Outcome } from './outcome';
import { HEIGHT_IN } from './ranges';

export const leftToCutInfo = {
  id: 'left-to-cut',
  version: 1,
  formula: 'left = stub top − mark, both from the string',
  source: 'common practice',
  range: 'heights ±10,000 in',
} as const;

/** How much casing still stands above the mark, in inches; negative when the stub already ends below it. */
export const leftToCut = (stub: {
  stubTopFromStringIn: number;
  markFromStringIn: number;
}): Outcome<{ leftIn: number; belowMark: boolean }> => {
  const { stubTopFromStringIn, markFromStringIn } = stub;
  const refused = firstRefusal(
    mustBe('stubTopFromStringIn', stubTopFromStringIn, HEIGHT_IN),
    mustBe('markFromStringIn', markFromStringIn, HEIGHT_IN),
  );
  if (refused) return refused;
  const leftIn = stubTopFromStringIn - markFromStringIn;
  return { ok: true, leftIn, belowMark: leftIn < 0 };
};
