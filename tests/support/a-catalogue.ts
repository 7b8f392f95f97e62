import type { Catalogue } from '../../shared/contracts/catalogue';
import { blankDraft, type PlanDraft } from '../../src/stores/planning/draft';
import { aPlan } from './a-plan';

/** The set-up that the invented job is planned from. */
export function aCatalogue(): Catalogue {
  const { operator, rig, zone, head, procedure, instruments, people } = aPlan();
  return {
    operators: [{ ...operator, rigs: [{ ...rig, zone }] }],
    heads: [head, { ...head, id: 'head-13', casingOdIn: '13.375', socketBoreIn: '13.5625' }],
    procedures: [procedure],
    instruments: [
      ...instruments,
      { ...instruments[2]!, id: 'gauge-old', serial: 'PG-09', calibratedUntil: '2026-01-31' },
    ],
    people: people.map(({ accountId, name, role, qualifications }) => ({
      accountId,
      name,
      roles: [role],
      qualifications,
    })),
  };
}

/** A form that is filled in as the invented job is; `own` says what is different. */
export function aDraft(own: Partial<PlanDraft> = {}): PlanDraft {
  const { operator, rig, well, zone, head, procedure, instruments, people } = aPlan();
  return {
    ...blankDraft('imperial'),
    operatorId: operator.id,
    rigId: rig.id,
    well,
    zone,
    casing: '9.625/40/J55',
    headId: head.id,
    targetHeight: '6',
    procedureId: procedure.id,
    pressure: '1500',
    allowedDrop: '75',
    instrumentIds: instruments.map(({ id }) => id),
    people: people.map(({ accountId, role }) => ({ accountId, role })),
    ...own,
  };
}
