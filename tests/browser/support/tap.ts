import type { Locator, Page } from '@playwright/test';

/** The house takes a second tap within half a second for a bouncing glove. */
const BOUNCE_MS = 500;
const lastTaps = new WeakMap<Page, number>();

/** Taps as a steady hand does: by finger where there is touch, and never within the bounce of the tap before. */
export async function tap(target: Locator): Promise<void> {
  const page = target.page();
  const since = Date.now() - (lastTaps.get(page) ?? 0);
  if (since <= BOUNCE_MS) await new Promise((done) => setTimeout(done, BOUNCE_MS + 20 - since));
  const touch = await page.evaluate(() => navigator.maxTouchPoints > 0);
  await (touch ? target.tap() : target.click());
  lastTaps.set(page, Date.now());
}
