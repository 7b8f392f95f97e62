import type { EntityManager } from 'typeorm';
import type { Planning } from '../../shared/contracts/jobs';
import { timesOf } from '../../shared/job/actor';
import { decide } from '../../shared/job/decide';
import type { Actor } from '../../shared/permissions';
import { appendEvents } from '../ledger/append-events';
import { beginHead } from '../ledger/job-heads';
import { jobRows } from '../ledger/job-rows';
import { canBeKept, findReceipt, keepReceipt } from '../ledger/receipts';
import type { Sending } from '../ledger/receipts';
import { sha256 } from '../ledger/sha256';
import { inTransaction } from '../ledger/transaction';
import { writeProjections } from '../ledger/write-projections';
import { buildPlan } from './build-plan';
import type { PlanningFault } from './build-plan';
import { refused, turned } from './command-answer';
import type { Refused, Turned } from './command-answer';
import type { AppDeps } from './deps';

/** A job stands, new or from the receipt of the same request. */
interface Planned {
  ok: true;
  id: string;
  seq: number;
  replayed: boolean;
}

export type PlanningAnswer = Planned | Refused | Turned | { ok: false; kind: 'faulty'; faults: PlanningFault[] };

/**
 * Plans a job with its first event. The same request under the same command id gives the same job, however often and
 * however many at once: the second one fails on the receipt's key and finds the answer of the first.
 */
export async function planJob(
  deps: Pick<AppDeps, 'dataSource' | 'clock' | 'ids'>,
  actor: Actor,
  asked: Planning,
): Promise<PlanningAnswer> {
  if (!canBeKept(asked)) return turned(422, 'command.text-broken');
  const sending: Sending = { commandId: asked.commandId, accountId: actor.accountId, jobId: null, sent: asked };
  return inTransaction(deps.dataSource, async (manager) => {
    const known = await fromReceipt(manager, sending);
    if (known) return known;
    const built = await buildPlan(manager, asked);
    if (!built.ok) return { ok: false, kind: 'faulty', faults: built.faults };
    const received = deps.clock();
    const command = {
      id: asked.commandId,
      type: 'plan-job' as const,
      basedOn: null,
      clock: asked.clock,
      body: { plan: built.plan },
    };
    const who = { accountId: actor.accountId, name: actor.name, roles: ['coordinator'] as const };
    const decision = decide(null, command, who, timesOf(asked.clock, received.toISOString()), sha256);
    if (!decision.ok) {
      const answer = refused(decision.refusal);
      await keepReceipt(manager, sending, { status: answer.status, answer, createdAt: received });
      return answer;
    }
    const head = await beginHead(manager, deps.ids(), received);
    const links = await appendEvents(manager, head, command.id, decision.events);
    await writeProjections(manager, jobRows(head.jobId, decision.events));
    const planned = { id: head.jobId, seq: links.length };
    await keepReceipt(manager, sending, { status: 201, answer: planned, createdAt: received });
    return { ok: true, ...planned, replayed: false };
  });
}

async function fromReceipt(manager: EntityManager, sending: Sending): Promise<PlanningAnswer | null> {
  const receipt = await findReceipt(manager, sending);
  switch (receipt.found) {
    case 'none':
      return null;
    case 'other-actor':
      return turned(409, 'command.id-taken');
    case 'other-body':
      return turned(422, 'command.id-reused');
    case 'same':
      if (receipt.status !== 201) return receipt.answer as Refused;
      return { ok: true, ...(receipt.answer as { id: string; seq: number }), replayed: true };
  }
}
