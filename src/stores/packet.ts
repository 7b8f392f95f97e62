import { defineStore } from 'pinia';
import { ref, shallowRef } from 'vue';
import { asEvent } from '../../shared/job/as-event';
import { checkSignatures, type SignatureCheck } from '../../shared/job/check-signatures';
import type { JobEvent } from '../../shared/job/events';
import { storyOf, type Story } from '../../shared/job/story';
import { canonicalJson } from '../../shared/ledger/canonical-json';
import { verifyChain, type ChainVerdict } from '../../shared/ledger/chain';
import type { WireEvent } from '../api/job';
import { askPacket, askPacketEvents, type PacketAnswer } from '../api/packets';
import type { Answer, Problem } from '../api/problem';
import { hashText } from '../offline/hash-text';

/** What this page worked out by itself from the events that it was sent. */
export interface PageCheck {
  chain: ChainVerdict;
  /** whether the chain ends where the server says that it ends */
  endsAtHead: boolean;
  /** null when the contents cannot be made again here */
  signatures: SignatureCheck[] | null;
  /** seconds that it took */
  tookS: number;
}

export interface OpenPacket {
  summary: PacketAnswer['packet'];
  served: PacketAnswer['verification'];
  links: readonly WireEvent[];
  events: readonly JobEvent[];
  /** null when the events do not make a job: then only the check and the bare list can be shown */
  story: Story | null;
  check: PageCheck;
}

type Events = { links: WireEvent[]; head: { seq: number; hash: string } };

async function allEvents(id: string): Promise<Answer<Events>> {
  const links: WireEvent[] = [];
  for (;;) {
    const answer = await askPacketEvents(id, links.length);
    if (!answer.ok) return answer;
    const { events, head } = answer.value;
    links.push(...events);
    if (events.length === 0 || links.length >= head.seq) return { ok: true, value: { links, head } };
  }
}

const tryOr = <T>(work: () => T, otherwise: T): T => {
  try {
    return work();
  } catch {
    return otherwise;
  }
};

function checkHere(id: string, { links, head }: Events, events: readonly JobEvent[]): PageCheck {
  const started = performance.now();
  const chain = verifyChain(
    id,
    links.map((link) => ({ ...link, body: canonicalJson(link.body) })),
    hashText,
  );
  const signatures = tryOr(() => checkSignatures(id, events, hashText), null);
  const endsAtHead = chain.holds && chain.links === head.seq && chain.head === head.hash;
  return { chain, endsAtHead, signatures, tookS: (performance.now() - started) / 1000 };
}

/** The packet that is being read: its events, told and recomputed in this page. */
export const usePacketStore = defineStore('packet', () => {
  const open = shallowRef<OpenPacket>();
  const problem = ref<Problem>();
  const loading = ref(false);
  let wanted = '';

  async function read(id: string): Promise<void> {
    wanted = id;
    if (open.value?.summary.id !== id) open.value = undefined;
    loading.value = true;
    const [summary, events] = await Promise.all([askPacket(id), allEvents(id)]);
    if (wanted !== id) return;
    loading.value = false;
    const refused = [summary, events].find((answer) => !answer.ok);
    problem.value = refused?.ok === false ? refused.problem : undefined;
    if (!summary.ok || !events.ok) return;
    const told = events.value.links.map(asEvent);
    open.value = {
      summary: summary.value.packet,
      served: summary.value.verification,
      links: events.value.links,
      events: told,
      story: tryOr(() => storyOf(id, told), null),
      check: checkHere(id, events.value, told),
    };
  }

  function close(): void {
    wanted = '';
    open.value = undefined;
    problem.value = undefined;
  }

  return { open, problem, loading, read, close };
});
