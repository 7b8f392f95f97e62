import type { JobEvent } from '../../shared/job/events';
import type { ChainLink } from '../../shared/ledger/chain';

/** The newest form of an event. Old forms stay in the chain as they were written and are read through this alone. */
const newestSchema = 1;

/** A link as an event of today's shape. A form newer than this program cannot be understood and is not guessed at. */
export function upcast({ type, schema, body, seq }: ChainLink): JobEvent {
  if (schema < 1 || schema > newestSchema) throw new Error(`event ${seq} has the unknown form ${type}/${schema}`);
  return { type, schema: 1, body: JSON.parse(body) as unknown } as JobEvent;
}
