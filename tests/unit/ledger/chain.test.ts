import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainStart, makeLink, verifyChain, type ChainLink } from '../../../shared/ledger/chain';
import { hash, idNumber } from '../../support/a-job';

const jobId = idNumber(7);
const aChain = (length: number): ChainLink[] => {
  const links: ChainLink[] = [];
  let prev = chainStart(jobId, hash);
  for (let seq = 1; seq <= length; seq++) {
    const link = makeLink(
      jobId,
      { seq, commandId: idNumber(seq), type: 'readings-recorded', schema: 1, body: { n: seq } },
      prev,
      hash,
    );
    links.push(link);
    prev = link.hash;
  }
  return links;
};

describe('a chain', () => {
  it('holds as it was made', () => {
    expect(verifyChain(jobId, aChain(5), hash)).toMatchObject({ holds: true, links: 5 });
  });

  it('does not hold under another job’s id', () => {
    expect(verifyChain(idNumber(8), aChain(2), hash)).toMatchObject({ holds: false, seq: 1 });
  });

  it('names the place of any one changed byte of a body', () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 12 }), fc.nat(), fc.nat(), (length, where, byte) => {
        const links = aChain(length);
        const place = where % length;
        const link = links[place]!;
        const at = byte % link.body.length;
        const other = String.fromCharCode((link.body.charCodeAt(at) % 90) + 33);
        fc.pre(other !== link.body[at]);
        links[place] = { ...link, body: link.body.slice(0, at) + other + link.body.slice(at + 1) };
        expect(verifyChain(jobId, links, hash)).toMatchObject({ holds: false, seq: place + 1 });
      }),
    );
  });

  it('names the place of a missing, doubled or swapped link', () => {
    const links = aChain(6);
    expect(verifyChain(jobId, links.toSpliced(2, 1), hash)).toMatchObject({ holds: false, seq: 3, why: 'gap' });
    expect(verifyChain(jobId, links.toSpliced(2, 0, links[2]!), hash)).toMatchObject({
      holds: false,
      seq: 4,
      why: 'gap',
    });
    const swapped = links.with(1, links[2]!).with(2, links[1]!);
    expect(verifyChain(jobId, swapped, hash)).toMatchObject({ holds: false, seq: 2 });
  });

  it('finds a type, a command id or a schema that was changed', () => {
    for (const change of [{ type: 'job-sealed' }, { commandId: idNumber(99) }, { schema: 2 }]) {
      const links = aChain(3);
      links[1] = { ...links[1]!, ...change };
      expect(verifyChain(jobId, links, hash)).toMatchObject({ holds: false, seq: 2, why: 'hash' });
    }
  });
});
