import type { EntityManager } from 'typeorm';
import type { Planning } from '../../shared/contracts/jobs';
import type { Head, Instrument, JobPerson, JobPlan, Procedure } from '../../shared/job/plan';
import { settingsWith } from '../../shared/job/settings';
import { Operator } from '../entities/operator';
import { Rig } from '../entities/rig';
import { casingOf } from './casing-of';
import { findCatalogueItem } from './find-catalogue-item';
import { findJobPerson } from './find-job-person';

/** A field of the request that names nothing the server has; `code` is a message key under `errors.field`. */
export interface PlanningFault {
  path: string;
  code: string;
}

const isZone = (zone: string): boolean => {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: zone }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
};

/** Makes the whole plan from the server's own tables; what a caller sends are ids and the operator's terms. */
export async function buildPlan(
  manager: EntityManager,
  asked: Planning,
): Promise<{ ok: true; plan: JobPlan } | { ok: false; faults: PlanningFault[] }> {
  const faults: PlanningFault[] = [];
  const needed = <T>(found: T | null, path: string, code = 'unknown'): T => {
    if (found === null) faults.push({ path, code });
    // a plan with a fault is never returned
    return found as T;
  };
  const operator = needed(await manager.findOneBy(Operator, { id: asked.operatorId }), 'body.operatorId');
  const rig = needed(await manager.findOneBy(Rig, { id: asked.rigId, operatorId: asked.operatorId }), 'body.rigId');
  const head = needed(await findCatalogueItem<Head>(manager, 'head', asked.headId), 'body.headId');
  const procedure = needed(
    await findCatalogueItem<Procedure>(manager, 'procedure', asked.procedureId),
    'body.procedureId',
  );
  const casing = needed(casingOf(asked.casing), 'body.casing');
  if (!isZone(asked.zone)) faults.push({ path: 'body.zone', code: 'unknown' });
  const instruments: Instrument[] = [];
  for (const [index, id] of [...new Set(asked.instrumentIds)].entries()) {
    instruments.push(
      needed(await findCatalogueItem<Instrument>(manager, 'instrument', id), `body.instrumentIds.${index}`),
    );
  }
  const people: JobPerson[] = [];
  for (const [index, { accountId, role }] of asked.people.entries()) {
    const found = await findJobPerson(manager, accountId, role);
    const path = `body.people.${index}`;
    if (!found.ok) faults.push({ path, code: found.fault });
    else if (people.some((one) => one.accountId === accountId && one.role === role))
      faults.push({ path, code: 'person-twice' });
    else people.push(found.person);
  }
  if (faults.length > 0) return { ok: false, faults };
  const { ownSettings, ...terms } = asked.terms;
  return {
    ok: true,
    plan: {
      operator: { id: operator.id, name: operator.name },
      rig: { id: rig.id, name: rig.name },
      well: asked.well,
      zone: asked.zone,
      casing,
      head,
      procedure,
      instruments,
      people,
      terms: { ...terms, settings: settingsWith(ownSettings) },
      proposedDirection: asked.proposedDirection,
      rateCardId: asked.rateCardId,
    },
  };
}
