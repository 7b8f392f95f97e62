/**
 * Small things kept on this device between starts (theme, units, who was here, clock offset). Storage can be barred or
 * full; then they are simply not kept.
 */
const place = (name: string) => `headfast.${name}`;

/** A kept word, when it is one of those allowed. */
export function kept<T extends string>(name: string, allowed: readonly T[]): T | undefined {
  const word = read(name);
  return allowed.find((one) => one === word);
}

/** Keeps a word and hands it back. */
export function keep<T extends string>(name: string, word: T): T {
  write(name, word);
  return word;
}

/** A kept object, as whoever kept it says it is; undefined when there is none or it can't be read. */
export function keptObject<T>(name: string, isWhole: (value: unknown) => value is T): T | undefined {
  try {
    const value: unknown = JSON.parse(read(name) ?? 'null');
    return isWhole(value) ? value : undefined;
  } catch {
    return undefined;
  }
}

export function keepObject(name: string, value: unknown): void {
  write(name, JSON.stringify(value));
}

export function letGo(name: string): void {
  try {
    localStorage.removeItem(place(name));
  } catch {
    // Barred storage holds nothing to let go.
  }
}

function read(name: string): string | null {
  try {
    return localStorage.getItem(place(name));
  } catch {
    return null;
  }
}

function write(name: string, word: string): void {
  try {
    localStorage.setItem(place(name), word);
  } catch {
    // Not kept: the next start asks the server or the system again.
  }
}
