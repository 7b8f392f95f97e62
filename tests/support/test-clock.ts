/** A clock that stands still until a test moves it. */
export interface TestClock {
  (): Date;
  advance(ms: number): void;
  set(iso: string): void;
}

export const minutes = (count: number): number => count * 60_000;
export const hours = (count: number): number => count * 3_600_000;

/** Starts at the machine's own time unless told otherwise: cookies are judged by that one. */
export function aClock(start: string | Date = new Date()): TestClock {
  let now = new Date(start);
  return Object.assign(() => new Date(now), {
    advance: (ms: number) => void (now = new Date(now.getTime() + ms)),
    set: (iso: string) => void (now = new Date(iso)),
  });
}
