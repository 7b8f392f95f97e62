import { canonicalJson } from './canonical-json';

/** SHA-256 of a text as 64 hex digits, handed in so that the rules stay pure. */
export type HashText = (text: string) => string;

/** One link of a chain as it is stored. `body` is canonical JSON text. */
export interface ChainLink {
  seq: number;
  commandId: string;
  type: string;
  schema: number;
  body: string;
  prevHash: string;
  hash: string;
}

export interface NewLink {
  seq: number;
  commandId: string;
  type: string;
  schema: number;
  body: unknown;
}

/** What the first link of a job's chain points back to: the hash of the job's id. */
export const chainStart = (jobId: string, hash: HashText): string => hash(jobId);

/** SHA-256 over the canonical JSON of job, seq, command, type, schema, prev and body. */
export const linkHash = (jobId: string, link: NewLink, prevHash: string, hash: HashText): string =>
  hash(
    canonicalJson({
      job: jobId,
      seq: link.seq,
      command: link.commandId,
      type: link.type,
      schema: link.schema,
      prev: prevHash,
      body: link.body,
    }),
  );

export const makeLink = (jobId: string, link: NewLink, prevHash: string, hash: HashText): ChainLink => ({
  seq: link.seq,
  commandId: link.commandId,
  type: link.type,
  schema: link.schema,
  body: canonicalJson(link.body),
  prevHash,
  hash: linkHash(jobId, link, prevHash, hash),
});

export type ChainVerdict =
  | { holds: true; links: number; head: string }
  | { holds: false; seq: number; why: 'gap' | 'prev' | 'hash' | 'unreadable' };

/** Recomputes a chain from its start and names the first link that does not hold. */
export const verifyChain = (jobId: string, links: readonly ChainLink[], hash: HashText): ChainVerdict => {
  let prev = chainStart(jobId, hash);
  for (const [index, link] of links.entries()) {
    const seq = index + 1;
    if (link.seq !== seq) return { holds: false, seq, why: 'gap' };
    if (link.prevHash !== prev) return { holds: false, seq, why: 'prev' };
    let body: unknown;
    try {
      body = JSON.parse(link.body);
    } catch {
      return { holds: false, seq, why: 'unreadable' };
    }
    if (canonicalJson(body) !== link.body) return { holds: false, seq, why: 'hash' };
    if (linkHash(jobId, { ...link, body }, prev, hash) !== link.hash) return { holds: false, seq, why: 'hash' };
    prev = link.hash;
  }
  return { holds: true, links: links.length, head: prev };
};
