import type { Planning } from '../../shared/contracts/jobs';
import { demoHeads } from './heads';
import { demoInstruments } from './instruments';
import { demoOperators } from './operators';
import { demoPeopleByKey } from './people';
import type { DemoKey } from './people';
import { demoProcedures } from './procedures';

/** Everybody of the invented job by the role he has on it. */
const crew = [
  ['welder', 'welder'],
  ['secondWelder', 'welder'],
  ['companyRep', 'company_rep'],
  ['secondCompanyRep', 'company_rep'],
  ['toolPusher', 'tool_pusher'],
  ['coordinator', 'coordinator'],
] as const satisfies [DemoKey, string][];

/** A request to plan the invented job, as the coordinator's form sends it. */
export function demoPlanning(commandId: string, now: Date, own: Partial<Planning> = {}): Planning {
  const [operator] = demoOperators;
  return {
    commandId,
    clock: { deviceAt: now.toISOString(), offsetMs: 0, doubtMs: 120 },
    operatorId: operator.id,
    rigId: operator.rigs[0].id,
    well: 'Tallgrass 14-2H',
    zone: operator.rigs[0].zone,
    casing: { odIn: '9.625', weightLbFt: '40', grade: 'J55' },
    headId: demoHeads[0]?.id ?? '',
    procedureId: demoProcedures[0]?.id ?? '',
    instrumentIds: demoInstruments(now).map((one) => one.id),
    people: crew.map(([key, role]) => ({ accountId: demoPeopleByKey[key].id, role })),
    terms: {
      datum: 'face',
      targetHeightIn: '6',
      standOffIn: '0.25',
      test: { medium: 'hydraulic-oil', pressurePsi: 1500, holdMin: 15, allowedDropPsi: 75 },
      ownSettings: {},
    },
    proposedDirection: 'mud-tanks',
    rateCardId: null,
    ...own,
  };
}
