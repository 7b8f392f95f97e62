import { describe, expect, it } from 'vitest';
import HfButton from '../../src/components/app/HfButton.vue';
import { mountWithWords } from './mount-with-words';

const button = (props: Record<string, unknown> = {}) => mountWithWords(HfButton, props, { default: 'Present' });
type Button = ReturnType<typeof button>;

/** A tap at a moment and a place; a finger's tap has detail 1, a key's 0. */
function tap(on: Button, atMs: number, place = { x: 10, y: 10 }, detail = 1): void {
  const event = new MouseEvent('click', {
    bubbles: true,
    cancelable: true,
    clientX: place.x,
    clientY: place.y,
    detail,
  });
  Object.defineProperty(event, 'timeStamp', { value: atMs });
  on.element.dispatchEvent(event);
}
const taps = (on: Button) => on.emitted('click')?.length ?? 0;

describe('a button', () => {
  it('ignores a second tap within half a second', () => {
    const present = button();
    tap(present, 10_000);
    tap(present, 10_499);
    expect(taps(present)).toBe(1);
    tap(present, 10_500);
    expect(taps(present)).toBe(2);
  });

  it('ignores the bounce that lands on a button which has come up on the same spot', () => {
    const [first, next] = [button(), button()];
    tap(first, 20_000, { x: 100, y: 600 });
    tap(next, 20_200, { x: 104, y: 603 });
    expect(taps(next)).toBe(0);
    tap(next, 20_700, { x: 104, y: 603 });
    expect(taps(next)).toBe(1);
  });

  it('answers at once when another button is tapped elsewhere, or by keyboard', () => {
    const [first, elsewhere, byKey] = [button(), button(), button()];
    tap(first, 30_000, { x: 100, y: 600 });
    tap(elsewhere, 30_100, { x: 100, y: 500 });
    tap(byKey, 30_150, { x: 100, y: 500 }, 0);
    expect([taps(elsewhere), taps(byKey)]).toEqual([1, 1]);
  });

  it('does nothing while it is busy, and says so', () => {
    const busy = button({ busy: true });
    tap(busy, 40_000);
    expect(taps(busy)).toBe(0);
    expect(busy.attributes('aria-busy')).toBe('true');
  });

  it('is no submit button unless it is asked to be', () => {
    expect(button().attributes('type')).toBe('button');
    expect(button({ type: 'submit' }).attributes('type')).toBe('submit');
  });
});
