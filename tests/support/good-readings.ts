/** Readings within every limit, and the order in which they are taken: the demo's own, shared with tests and walks. */
export { goodReadings, goodSiteReadings } from '../../server/demo/good-readings';
export { nextStep } from '../../server/demo/good-readings/next-step';
export type { Step } from '../../server/demo/good-readings/next-step';
