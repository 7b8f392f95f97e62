import { ref, watch, type Ref } from 'vue';
import type { RecordEntry } from '../../shared/contracts/commands';
import { draft, draftOf, dropDraft } from '../offline/drafts';
import { useSessionStore } from '../stores/session';

export interface PointDrafts {
  entries: Ref<RecordEntry[]>;
  keep(entry: RecordEntry): Promise<void>;
  drop(): Promise<void>;
}

/** What this person typed for a point before it opened, kept on this device. */
export function usePointDrafts(jobId: () => string, point: () => string): PointDrafts {
  const session = useSessionStore();
  const entries = ref<RecordEntry[]>([]);

  watch(
    [jobId, point, () => session.me?.id] as const,
    async ([job, at, owner]) => {
      entries.value = [];
      if (owner === undefined) return;
      const found = await draftOf(owner, job, at);
      if (jobId() === job && point() === at) entries.value = found;
    },
    { immediate: true },
  );

  return {
    entries,
    async keep(entry) {
      if (session.me !== undefined) entries.value = await draft(session.me.id, jobId(), point(), entry);
    },
    async drop() {
      if (session.me !== undefined) await dropDraft(session.me.id, jobId(), point());
      entries.value = [];
    },
  };
}
