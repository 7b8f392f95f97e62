/**
 * Throws when a number in an event is no whole number: decimals are kept as text, so that they print the same on every
 * machine and in every year. That one got this far is a fault of the program, never a user's.
 */
export function refuseFloats(value: unknown, place = 'body'): void {
  if (typeof value === 'number' && !Number.isSafeInteger(value)) {
    throw new TypeError(`${place} holds ${value}: numbers in events are whole numbers or decimal strings`);
  }
  if (typeof value !== 'object' || value === null) return;
  for (const [key, inner] of Object.entries(value)) refuseFloats(inner, `${place}.${key}`);
}
