import { firstRefusal, mustBe, refuse, type Refusal } from './outcome';
import { DIAMETER_IN, YIELD_PSI } from './ranges';

/** Casing as a tube: outside diameter and wall in inches, yield strength in psi. */
export interface CasingBody {
  odIn: number;
  wallIn: number;
  yieldPsi: number;
}

/** Why no strength can be worked out for this tube, or null: a number out of range, or no bore left. */
export const refuseCasingBody = ({ odIn, wallIn, yieldPsi }: CasingBody): Refusal | null =>
  firstRefusal(
    mustBe('odIn', odIn, DIAMETER_IN),
    mustBe('wallIn', wallIn, { atLeast: 0.01, atMost: 10 }),
    mustBe('yieldPsi', yieldPsi, YIELD_PSI),
  ) ?? (2 * wallIn >= odIn ? refuse('wall-too-thick', 'wallIn', { atLeast: 0.01, below: odIn / 2 }) : null);
