/** A glove that bounces, and a finger that taps where the next button has just come up. */
const BOUNCE_MS = 500;
const SAME_PLACE_PX = 24;

interface Tap {
  readonly at: number;
  readonly x: number;
  readonly y: number;
}

let lastTapAnywhere: Tap | undefined;

/**
 * Tells second taps from first ones: one within half a second on the same control, or, by finger or mouse, on the same
 * spot of the screen, even when another control has taken that spot since.
 */
export function useSecondTapGuard(): (event: MouseEvent) => boolean {
  let lastHere: number | undefined;
  return (event) => {
    const tap = { at: event.timeStamp, x: event.clientX, y: event.clientY };
    const byPointer = event.detail > 0;
    const again =
      within(lastHere, tap.at) ||
      (byPointer && lastTapAnywhere !== undefined && within(lastTapAnywhere.at, tap.at) && near(lastTapAnywhere, tap));
    if (again) return true;
    lastHere = tap.at;
    if (byPointer) lastTapAnywhere = tap;
    return false;
  };
}

function within(before: number | undefined, now: number): boolean {
  return before !== undefined && now - before < BOUNCE_MS;
}

function near(one: Tap, other: Tap): boolean {
  return Math.hypot(one.x - other.x, one.y - other.y) < SAME_PLACE_PX;
}
