/** Several tabs share one outbox: one sends at a time, the others hear what left. */
const LOCK = 'headfast.outbox';
const channel = typeof BroadcastChannel === 'undefined' ? undefined : new BroadcastChannel(LOCK);

/** Runs the work while this tab alone holds the outbox; false when another tab is at it. */
export async function aloneAmongTabs(work: () => Promise<void>): Promise<boolean> {
  if (!('locks' in navigator)) {
    await work();
    return true;
  }
  return navigator.locks.request(LOCK, { ifAvailable: true }, async (lock) => {
    if (lock === null) return false;
    await work();
    return true;
  });
}

export function tellTabs(jobId: string): void {
  channel?.postMessage(jobId);
}

export function listenToTabs(heard: (jobId: string) => void): void {
  channel?.addEventListener('message', (message: MessageEvent<string>) => heard(message.data));
}
