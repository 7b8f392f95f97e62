import type { EntityManager } from 'typeorm';
import { signedCommands } from '../../shared/contracts/commands';
import type { Command, CommandType } from '../../shared/contracts/commands';
import { timesOf } from '../../shared/job/actor';
import { decide } from '../../shared/job/decide';
import { foldEvents } from '../../shared/job/evolve';
import type { Refusal } from '../../shared/job/refusal';
import type { JobState } from '../../shared/job/state';
import { can, commandPermission, rolesOnJob } from '../../shared/permissions';
import type { Actor, JobScope, PermissionAnswer } from '../../shared/permissions';
import { appendEvents } from '../ledger/append-events';
import { lockHead } from '../ledger/job-heads';
import { jobRows } from '../ledger/job-rows';
import { readLinks } from '../ledger/read-links';
import { canBeKept, findReceipt, keepReceipt } from '../ledger/receipts';
import type { Sending } from '../ledger/receipts';
import { sha256 } from '../ledger/sha256';
import { inTransaction } from '../ledger/transaction';
import { upcast } from '../ledger/upcast';
import { writeProjections } from '../ledger/write-projections';
import { refused, toWire, turned, turnedBy } from './command-answer';
import type { CommandAnswer, Refused } from './command-answer';
import { completeCommand } from './complete-command';
import type { AppDeps } from './deps';
import { findJobScope } from './find-job-scope';
import { verifySigning } from './verify-signing';

/** Who gives which command on which job. */
export interface Given {
  actor: Actor;
  jobId: string;
  command: Command;
}

/** What came beside a command: the secrets of its signature, and when its session last had the password. */
export interface Secrets {
  signing: { pin: string; password?: string | undefined } | undefined;
  passwordAt: string | null;
}

/** Where the events of an accepted command stand, as its receipt keeps it. */
interface Span {
  first: number;
  last: number;
}

/**
 * Records one command, or says why not. A known id is answered from its receipt before anything else; the secrets of a
 * signature are checked before the row lock and outside the transaction, and leave no trace in either.
 */
export async function recordCommand(deps: AppDeps, given: Given, secrets: Secrets): Promise<CommandAnswer> {
  const { actor, jobId, command } = given;
  if (!canBeKept(command)) return turned(422, 'command.text-broken');
  const known = await fromReceipt(deps.dataSource.manager, given);
  if (known) return known;
  if (!signedCommands.includes(command.type)) return commitCommand(deps, given);
  const scope = await findJobScope(deps.dataSource, jobId);
  const stopped = turnedBy(mayGive(actor, command.type, scope));
  if (stopped) return stopped;
  const signed = await verifySigning(deps, actor.accountId, secrets.signing ?? {}, { passwordAt: secrets.passwordAt });
  if (!signed.ok) {
    return signed.code === 'signing.locked' ? turned(429, signed.code, signed.retryAfter) : turned(403, signed.code);
  }
  const answer = await commitCommand(deps, given);
  return answer.ok ? { ...answer, passwordGiven: signed.components === 'password-and-pin' } : answer;
}

/**
 * The transaction of one command, without its secrets: head locked first, receipt, permission, decision, events,
 * projections, receipt. All of it is on disk when this returns, or nothing is.
 */
export function commitCommand(deps: Pick<AppDeps, 'dataSource' | 'clock'>, given: Given): Promise<CommandAnswer> {
  const { actor, jobId, command } = given;
  return inTransaction(deps.dataSource, async (manager) => {
    const head = await lockHead(manager, jobId);
    const known = await fromReceipt(manager, given);
    if (known) return known;
    const before = head ? (await readLinks(manager, jobId)).map(upcast) : [];
    const state = head ? foldEvents(head.jobId, before) : null;
    const scope = state && scopeOf(state);
    const stopped = turnedBy(mayGive(actor, command.type, scope));
    if (stopped) return stopped;
    if (!head || !state || !scope) return turned(404, 'permission.not-found');
    const complete = await completeCommand(manager, command, { state, accountId: actor.accountId });
    if (!complete.ok) return complete;
    const received = deps.clock();
    const who = { accountId: actor.accountId, name: actor.name, roles: rolesOnJob(actor, scope) };
    const decision = decide(state, complete.command, who, timesOf(command.clock, received.toISOString()), sha256);
    if (!decision.ok) return keepRefusal(manager, given, decision.refusal, received);
    const links = await appendEvents(manager, head, command.id, decision.events);
    await writeProjections(manager, jobRows(head.jobId, [...before, ...decision.events]));
    const span: Span = { first: head.seq + 1, last: head.seq + links.length };
    await keepReceipt(manager, sendingOf(given), { status: 200, answer: span, createdAt: received });
    return { ok: true, events: links.map(toWire), seq: span.last, replayed: false, passwordGiven: false };
  });
}

const scopeOf = (state: JobState): JobScope => ({
  people: state.people,
  operatorId: state.plan.operator.id,
  status: state.status,
});

const sendingOf = ({ actor, jobId, command }: Given): Sending => ({
  commandId: command.id,
  accountId: actor.accountId,
  jobId,
  sent: command,
});

/** Planning concerns no job that exists; given to one, it asks first whether the job may be seen at all. */
function mayGive(actor: Actor, type: CommandType, scope: JobScope | null): PermissionAnswer {
  if (!scope) return 'not-found';
  const seen = rolesOnJob(actor, scope).length > 0;
  return seen ? can(actor, commandPermission(type), scope) : 'not-found';
}

/** The answer that was given before to this id, or null when it is new. */
async function fromReceipt(manager: EntityManager, given: Given): Promise<CommandAnswer | null> {
  const receipt = await findReceipt(manager, sendingOf(given));
  switch (receipt.found) {
    case 'none':
      return null;
    case 'other-actor':
      return turned(409, 'command.id-taken');
    case 'other-body':
      return turned(422, 'command.id-reused');
    case 'same': {
      if (receipt.status !== 200) return receipt.answer as Refused;
      const { first, last } = receipt.answer as Span;
      const links = (await readLinks(manager, given.jobId, first - 1)).slice(0, last - first + 1);
      return { ok: true, events: links.map(toWire), seq: last, replayed: true, passwordGiven: false };
    }
  }
}

/** Refusals of the rules are kept as they were said, all but those that hang on who asks: rights may be given later. */
async function keepRefusal(manager: EntityManager, given: Given, refusal: Refusal, now: Date): Promise<Refused> {
  const answer = refused(refusal);
  if (answer.status !== 403) {
    await keepReceipt(manager, sendingOf(given), { status: answer.status, answer, createdAt: now });
  }
  return answer;
}
