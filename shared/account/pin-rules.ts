export type PinRefusal = 'not-digits' | 'too-short' | 'too-long' | 'repeats' | 'sequence';

export const pinLength = { min: 6, max: 12 } as const;

/** Why a signing PIN is refused, or null: six digits or more, no run and no repetition. */
export function refusePin(pin: string): PinRefusal | null {
  if (!/^[0-9]*$/.test(pin)) return 'not-digits';
  if (pin.length < pinLength.min) return 'too-short';
  if (pin.length > pinLength.max) return 'too-long';
  if (repeats(pin)) return 'repeats';
  return isSequence(pin) ? 'sequence' : null;
}

/** One group of up to half the digits over and over (111111, 121212, 123123), or no more than two digits at all. */
function repeats(pin: string): boolean {
  if (new Set(pin).size <= 2) return true;
  for (let length = 1; length <= pin.length / 2; length += 1) {
    if (
      pin
        .slice(0, length)
        .repeat(Math.ceil(pin.length / length))
        .startsWith(pin)
    )
      return true;
  }
  return false;
}

/** Every digit the same step from the one before, around the ten: 123456, 975319, 890123. */
function isSequence(pin: string): boolean {
  const steps = new Set<number>();
  for (let at = 1; at < pin.length; at += 1) steps.add((Number(pin[at]) - Number(pin[at - 1]) + 10) % 10);
  return steps.size === 1;
}
