import { computed, ref, type ComputedRef, type Ref } from 'vue';
import { ask } from '../api/client';
import { packetFileAddress } from '../api/packets';
import { hashFile } from '../offline/hash-file';

export interface PhotoCheck {
  total: ComputedRef<number>;
  done: Ref<number>;
  running: Ref<boolean>;
  finished: ComputedRef<boolean>;
  /** hashes whose bytes are missing or are not what was hashed */
  broken: Ref<string[]>;
  start(): Promise<void>;
}

/** Fetches every file that a packet names and hashes its bytes in this page, one after the other. */
export function usePhotoCheck(packetId: () => string, hashes: () => readonly string[]): PhotoCheck {
  const done = ref(0);
  const running = ref(false);
  const broken = ref<string[]>([]);
  const wanted = computed(() => [...new Set(hashes())]);

  async function holds(sha256: string): Promise<boolean> {
    const answer = await ask<Blob>('GET', packetFileAddress(packetId(), sha256));
    return answer.ok && answer.value instanceof Blob && (await hashFile(answer.value)) === sha256;
  }

  async function start(): Promise<void> {
    if (running.value) return;
    running.value = true;
    done.value = 0;
    broken.value = [];
    for (const sha256 of wanted.value) {
      if (!(await holds(sha256))) broken.value = [...broken.value, sha256];
      done.value += 1;
    }
    running.value = false;
  }

  return {
    total: computed(() => wanted.value.length),
    done,
    running,
    finished: computed(() => !running.value && done.value > 0 && done.value === wanted.value.length),
    broken,
    start,
  };
}
