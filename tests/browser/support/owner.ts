import { expect, type Locator, type Page } from '@playwright/test';
import type { Person } from './people';
import { tap } from './tap';
import { escaped } from './words';

/** Types the signing PIN on the keys that a glove hits, and signs. */
export async function signWithPin(page: Page, pin: string, confirm: string): Promise<void> {
  const sheet = page.getByRole('dialog');
  await expect(sheet.getByText(/^You sign as /)).toBeVisible();
  for (const digit of pin) await sheet.getByRole('button', { name: digit, exact: true }).click();
  await tap(sheet.getByRole('button', { name: confirm, exact: true }));
  await expect(sheet).toBeHidden();
}

/** Opens what waits on the signing desk. */
export async function takeFromDesk(page: Page, well: string, title: string): Promise<void> {
  if (!/\/desk/.test(page.url())) await page.goto('/desk');
  const entry = page.getByRole('link', { name: new RegExp(`${escaped(well)}.*${escaped(title)}`) });
  await expect(async () => {
    await tap(page.getByRole('button', { name: 'Refresh', exact: true }));
    await expect(entry).toBeVisible({ timeout: 2000 });
  }).toPass({ timeout: 30_000 });
  await tap(entry);
  await expect(page.getByRole('heading', { name: title, exact: true }).first()).toBeVisible();
}

/** Makes every statement that the release carries. */
export async function makeStatements(page: Page): Promise<void> {
  const statements = page.getByRole('group', { name: 'With the release you state' }).getByRole('checkbox');
  for (const one of await statements.all()) await one.check();
}

/** Releases what is on the screen, with the PIN. */
export async function release({ page, pin }: Person): Promise<void> {
  await makeStatements(page);
  const button: Locator = page.getByRole('button', { name: /^Release/ });
  await expect(button).toBeEnabled();
  await tap(button);
  await signWithPin(page, pin, 'Release');
}

/** From the desk to the release of one point. */
export async function releaseFromDesk(person: Person, well: string, title: string): Promise<void> {
  await takeFromDesk(person.page, well, title);
  await release(person);
  await expect(person.page.getByText(`${title} of ${well} is released.`)).toBeAttached();
}

/** Sends back what is on the screen, with a reason. */
export async function sendBack(page: Page, reason: string): Promise<void> {
  await tap(page.getByRole('button', { name: 'Send back', exact: true }));
  const sheet = page.getByRole('dialog');
  await sheet.getByLabel('What has to be done again, and why').fill(reason);
  await tap(sheet.getByRole('button', { name: 'Send back', exact: true }));
  await expect(sheet).toBeHidden();
}

/** Concedes the one reading outside, with a reason and the PIN. */
export async function concedeOne({ page, pin }: Person, reason: string): Promise<void> {
  await expect(page.getByRole('button', { name: /^Release/ })).toBeDisabled();
  await tap(page.getByRole('button', { name: 'Concede it, with a reason' }));
  await page.getByRole('dialog').getByLabel('Why this may be used as it is').fill(reason);
  await signWithPin(page, pin, 'Sign');
}
