import type { EntityManager } from 'typeorm';
import { canonicalJson } from '../../shared/ledger/canonical-json';
import { CommandReceipt } from '../entities/command-receipt';
import { sha256 } from './sha256';

/** Who sends what under which id; `sent` is everything but the secrets. */
export interface Sending {
  commandId: string;
  accountId: string;
  jobId: string | null;
  sent: unknown;
}

export type ReceiptAnswer =
  | { found: 'none' }
  | { found: 'same'; status: number; answer: unknown }
  | { found: 'other-body' }
  | { found: 'other-actor' };

const hashOf = ({ jobId, sent }: Sending): string => sha256(canonicalJson({ job: jobId, sent }));

/** Half a character: such a text has no canonical spelling and cannot be hashed. */
const brokenText = /\p{Surrogate}/u;

/** Whether all that was sent can stand in the record. */
export function canBeKept(sent: unknown): boolean {
  if (typeof sent === 'string') return !brokenText.test(sent);
  if (typeof sent !== 'object' || sent === null) return true;
  return Object.entries(sent).every(([key, value]) => canBeKept(key) && canBeKept(value));
}

/** What was answered to this command id before. */
export async function findReceipt(manager: EntityManager, sending: Sending): Promise<ReceiptAnswer> {
  const receipt = await manager.findOneBy(CommandReceipt, { commandId: sending.commandId });
  if (!receipt) return { found: 'none' };
  if (receipt.accountId !== sending.accountId) return { found: 'other-actor' };
  if (receipt.bodyHash !== hashOf(sending)) return { found: 'other-body' };
  return { found: 'same', status: receipt.status, answer: JSON.parse(receipt.answer) as unknown };
}

/** Keeps the answer in the transaction of what it answers; a second one of the same id fails on the key. */
export async function keepReceipt(
  manager: EntityManager,
  sending: Sending,
  { status, answer, createdAt }: { status: number; answer: unknown; createdAt: Date },
): Promise<void> {
  const { commandId, accountId, jobId } = sending;
  await manager.insert(CommandReceipt, {
    commandId,
    accountId,
    jobId,
    bodyHash: hashOf(sending),
    status,
    answer: JSON.stringify(answer),
    createdAt,
  });
}
