import { v7 } from 'uuid';
import { demoOperators } from '../../server/demo/operators';
import { demoPeopleByKey } from '../../server/demo/people';
import { demoPlanning } from '../../server/demo/planning';
import type { Planning } from '../../shared/contracts/jobs';

/** A request to plan the invented job. */
export const aPlanning = (now: Date, own: Partial<Planning> = {}): Planning => demoPlanning(v7(), now, own);

/**
 * Other people on another operator's rig: nobody else has anything to do with such a job, save that a coordinator sees
 * every one.
 */
export const strangers = (): Pick<Planning, 'operatorId' | 'rigId' | 'people'> => {
  const [, operator] = demoOperators;
  const crew = [
    ['secondWelder', 'welder'],
    ['secondCompanyRep', 'company_rep'],
    ['secondToolPusher', 'tool_pusher'],
  ] as const;
  return {
    operatorId: operator.id,
    rigId: operator.rigs[0].id,
    people: crew.map(([key, role]) => ({ accountId: demoPeopleByKey[key].id, role })),
  };
};
