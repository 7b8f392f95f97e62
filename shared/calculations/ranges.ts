import type { Range } from './outcome';

/** How far a number may go before it is a slip of the finger rather than a measurement. */
export const HEIGHT_IN: Range = { atLeast: -10_000, atMost: 10_000 };
export const LENGTH_IN: Range = { atLeast: 0, atMost: 100_000 };
export const POSITIVE_LENGTH_IN: Range = { atLeast: 0.001, atMost: 100_000 };
export const DIAMETER_IN: Range = { atLeast: 0.01, atMost: 200 };
export const PRESSURE_PSI: Range = { atLeast: 0, atMost: 100_000 };
export const POSITIVE_PRESSURE_PSI: Range = { above: 0, atMost: 100_000 };
export const ANGLE_DEG: Range = { above: -90, below: 90 };
export const YIELD_PSI: Range = { atLeast: 20_000, atMost: 200_000 };
export const MINUTES: Range = { atLeast: 0, atMost: 100_000 };
export const METAL_F: Range = { atLeast: -100, atMost: 3000 };
export const VOLUME_L: Range = { above: 0, atMost: 1_000_000 };
