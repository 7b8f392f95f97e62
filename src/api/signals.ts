/** What the api tells whoever listens; the stores do, and the api knows none of them. */
export type Signal = 'reached' | 'lost' | 'session-ended';

const listeners = new Map<Signal, Set<() => void>>();

/** Listens to a signal; the answer stops listening. */
export function onSignal(signal: Signal, listener: () => void): () => void {
  const heard = listeners.get(signal) ?? new Set();
  listeners.set(signal, heard.add(listener));
  return () => heard.delete(listener);
}

export function giveSignal(signal: Signal): void {
  for (const listener of listeners.get(signal) ?? []) listener();
}
