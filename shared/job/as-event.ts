import type { JobEvent } from './events';

/**
 * An event as it travels, read as the rules know it. Its body is believed: only the rules write events, and the chain of
 * hashes says whether they were changed since.
 */
export const asEvent = ({ type, schema, body }: { type: string; schema: number; body: unknown }): JobEvent =>
  ({ type, schema, body }) as unknown as JobEvent;
