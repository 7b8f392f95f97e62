import { expect, type Browser, type BrowserContextOptions, type Page } from '@playwright/test';
import { demoPeopleByKey, type DemoKey } from '../../../server/demo/people';
import { tap } from './tap';
import { watchPage, type Watched } from './watch';

/** What each of the four carries to the job. */
export const devices = {
  desktop: { viewport: { width: 1440, height: 900 } },
  tablet: { viewport: { width: 820, height: 1180 }, hasTouch: true },
  phone: { viewport: { width: 360, height: 640 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 },
} as const satisfies Record<string, BrowserContextOptions>;
export type Device = keyof typeof devices;

/** Somebody at a browser of his own, with everything that went wrong in it. */
export interface Person {
  readonly page: Page;
  readonly watched: Watched;
  readonly name: string;
  readonly pin: string;
}

/** Types the account's e-mail and password into the form and signs in. */
export async function signIn(page: Page, key: DemoKey): Promise<void> {
  const { email, password } = demoPeopleByKey[key];
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await tap(page.getByRole('button', { name: 'Sign in', exact: true }));
  await expect(page).not.toHaveURL(/sign-in/);
}

/** Opens a browser context of its own for one of the demo's people and signs in. */
export async function openAs(
  browser: Browser,
  key: DemoKey,
  device: Device,
  more: BrowserContextOptions = {},
): Promise<Person> {
  const context = await browser.newContext({ ...devices[device], ...more });
  const page = await context.newPage();
  const watched = watchPage(page);
  // Nobody is signed in yet, and the page asks.
  watched.expectAnswer(401, '/api/session');
  await signIn(page, key);
  const { name, pin } = demoPeopleByKey[key];
  return { page, watched, name, pin };
}
