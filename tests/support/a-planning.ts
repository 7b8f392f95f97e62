import { v7 } from 'uuid';
import { demoPlanning } from '../../server/demo/planning';
import type { Planning } from '../../shared/contracts/jobs';

/** A request to plan the invented job. */
export const aPlanning = (now: Date, own: Partial<Planning> = {}): Planning => demoPlanning(v7(), now, own);
