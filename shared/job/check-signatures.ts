import { definitionsVersion } from '../hold-points/definitions';
import type { HashText } from '../ledger/chain';
import { contentHashOf, jobContentHashOf } from './content';
import type { JobEvent, Signature } from './events';
import { evolve } from './evolve';
import { findPoint } from './points';
import type { JobState } from './state';

/** A signature held against the content that stood when it was given. `seq` is its event's place in the chain. */
export interface SignatureCheck {
  seq: number;
  signature: Signature;
  /** the content worked out again, and whether it is what was signed */
  bound: boolean;
}

const signedHash = (state: JobState, event: JobEvent, signature: Signature, hash: HashText): string | null => {
  if (!('point' in event.body)) return jobContentHashOf(state, signature.shown, hash);
  const point = findPoint(state, event.body.point);
  return point ? contentHashOf(state, point, signature.shown, hash) : null;
};

/**
 * Works out anew what every signature of a job was bound to. Null when the job was run by another version of the
 * definitions: then its contents cannot be made again here, and the chain alone speaks for them.
 */
export const checkSignatures = (
  jobId: string,
  events: readonly JobEvent[],
  hash: HashText,
): SignatureCheck[] | null => {
  let state: JobState | null = null;
  const checks: SignatureCheck[] = [];
  for (const [index, event] of events.entries()) {
    if (state && 'signature' in event.body && event.body.signature) {
      const { signature } = event.body;
      const bound = signedHash(state, event, signature, hash) === signature.contentHash;
      checks.push({ seq: index + 1, signature, bound });
    }
    state = evolve(jobId, state, event);
  }
  return state?.definitions === definitionsVersion ? checks : null;
};
