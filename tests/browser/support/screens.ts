import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** No violation of WCAG 2.2 AA that axe can find on what is shown now. */
export async function expectAccessible(page: Page, screen: string): Promise<void> {
  // As high as its content, so that nothing lies half under the actions that keep to the bottom.
  const { width, height } = page.viewportSize() ?? { width: 320, height: 640 };
  await page.setViewportSize({
    width,
    height: Math.max(height, await page.evaluate(() => document.documentElement.scrollHeight)),
  });
  const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(' | ')}`);
  await page.setViewportSize({ width, height });
  expect.soft(found, screen).toEqual([]);
}

/** Nothing is cut off at the side: at 320 px the page scrolls one way only. */
export async function expectNoSideScroll(page: Page, screen: string): Promise<void> {
  const sizes = await page.evaluate(() => ({
    content: document.documentElement.scrollWidth,
    window: document.documentElement.clientWidth,
  }));
  expect.soft(sizes.content, `${screen} is wider than its window`).toBeLessThanOrEqual(sizes.window);
}

/** Everything that is tapped on a field screen is 48 px high or more; links within a sentence are read, not hit. */
export async function expectGloveSized(page: Page, screen: string): Promise<void> {
  const small = await page.evaluate(() =>
    [...document.querySelectorAll<HTMLElement>('button, a, input, select, textarea, summary, label:has(input)')]
      .filter((one) => one.checkVisibility({ checkOpacity: true, checkVisibilityCSS: true }))
      .filter((one) => !(one instanceof HTMLAnchorElement && one.parentElement?.tagName === 'P'))
      // a box that is ticked by the words around it, or a field that only stands behind a button
      .filter((one) => !(one.matches('input') && (one.closest('label') !== null || one.tabIndex === -1)))
      .map((one) => ({ high: one.getBoundingClientRect().height, what: one.outerHTML.slice(0, 120) }))
      .filter(({ high }) => high > 1 && high < 47.5),
  );
  expect.soft(small, `${screen} has controls lower than 48 px`).toEqual([]);
}
