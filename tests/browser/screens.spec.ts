import { expect, test, type Browser, type Page } from '@playwright/test';
import type { DemoKey } from '../../server/demo/people';
import { openAs, signIn, type Person } from './support/people';
import { expectAccessible, expectGloveSized, expectNoSideScroll } from './support/screens';
import { tap } from './support/tap';
import { watchPage } from './support/watch';

interface Screen {
  name: string;
  who: DemoKey;
  /** goes there and waits until it stands */
  open(page: Page): Promise<void>;
  /** used in the cellar: every control is made for a glove */
  field?: boolean;
}

const at = (address: string, heading: string | RegExp) => async (page: Page) => {
  await page.goto(address);
  await expect(page.getByRole('heading', { name: heading }).first()).toBeVisible();
  await expect(page.getByText(/is being (loaded|read)/)).toHaveCount(0);
};

/** From the list to the demo job that runs. */
async function runningJob(page: Page): Promise<void> {
  await page.goto('/jobs');
  await tap(page.getByRole('main').getByRole('link', { name: /Tallgrass 14-2H/ }));
  await expect(page.getByRole('heading', { level: 1, name: 'Tallgrass 14-2H' })).toBeVisible();
}

const point = (title: string | RegExp) => async (page: Page) => {
  await runningJob(page);
  await tap(page.getByRole('main').getByRole('link', { name: title }));
  await expect(page.getByRole('heading', { level: 1, name: title })).toBeVisible();
};

async function entrySheet(page: Page): Promise<void> {
  await point(/^Valve orientation/)(page);
  await tap(page.getByRole('region', { name: 'Height of the datum' }).getByRole('button'));
  await expect(page.getByRole('dialog')).toBeVisible();
}

async function packet(page: Page): Promise<void> {
  await page.goto('/packets');
  await tap(page.getByRole('link', { name: /Tallgrass 12-2H/ }));
  await expect(page.getByRole('heading', { name: 'The record holds together' })).toBeVisible();
}

const screens: readonly Screen[] = [
  { name: 'jobs', who: 'welder', open: at('/jobs', 'Jobs'), field: true },
  { name: 'job', who: 'welder', open: runningJob, field: true },
  { name: 'hold point, open, for the recorder', who: 'welder', open: point(/^Valve orientation/), field: true },
  { name: 'hold point, the entry of a reading', who: 'welder', open: entrySheet, field: true },
  { name: 'hold point, released', who: 'welder', open: point(/^Final cut/), field: true },
  { name: 'hold point, shut', who: 'welder', open: point(/^Preheat reached/), field: true },
  { name: 'job, for the company representative', who: 'companyRep', open: runningJob, field: true },
  { name: 'hold point, open, for its owner', who: 'toolPusher', open: point(/^Valve orientation/), field: true },
  { name: 'desk with nothing on it', who: 'secondToolPusher', open: at('/desk', 'Signing desk'), field: true },
  { name: 'jobs with none', who: 'secondToolPusher', open: at('/jobs', 'Jobs'), field: true },
  { name: 'new job', who: 'coordinator', open: at('/jobs/new', 'New job') },
  { name: 'packets', who: 'auditor', open: at('/packets', 'Packets') },
  { name: 'packets, nothing found', who: 'auditor', open: at('/packets?q=zebra', 'Packets') },
  { name: 'packet', who: 'auditor', open: packet },
  { name: 'account', who: 'auditor', open: at('/account', 'I. Vann') },
  { name: 'no such page', who: 'welder', open: at('/nowhere-at-all', 'No such page') },
];

/** The demo's people, each signed in once for a theme and a width. */
async function signedIn(browser: Browser, colorScheme: 'light' | 'dark', width: number): Promise<Map<DemoKey, Person>> {
  const people = new Map<DemoKey, Person>();
  for (const who of new Set(screens.map((screen) => screen.who)))
    people.set(who, await openAs(browser, who, 'phone', { colorScheme, viewport: { width, height: 720 } }));
  return people;
}

for (const [theme, colorScheme] of [
  ['day', 'light'],
  ['night', 'dark'],
] as const) {
  test(`every screen is accessible, whole at 320 px and quiet, by ${theme}`, async ({ browser }) => {
    const people = await signedIn(browser, colorScheme, 320);
    for (const { name, who, open, field } of screens) {
      const person = people.get(who);
      if (!person) throw new Error(`nobody is signed in as ${who}`);
      await test.step(`${name}, ${theme}`, async () => {
        await open(person.page);
        await expectNoSideScroll(person.page, name);
        if (field) await expectGloveSized(person.page, name);
        await expectAccessible(person.page, `${name}, ${theme}`);
      });
    }
    for (const { watched, page } of people.values()) {
      expect.soft(watched.complaints).toEqual([]);
      await page.context().close();
    }
  });
}

test('desktop and tablet hold the same screens without a violation', async ({ browser }) => {
  for (const device of ['tablet', 'desktop'] as const) {
    for (const [who, name, open] of [
      ['companyRep', 'desk', at('/desk', 'Signing desk')],
      ['companyRep', 'job', runningJob],
      ['auditor', 'packet', packet],
      ['coordinator', 'new job', at('/jobs/new', 'New job')],
    ] as const) {
      const { page, watched } = await openAs(browser, who, device);
      await open(page);
      await expectNoSideScroll(page, `${name} on a ${device}`);
      await expectAccessible(page, `${name} on a ${device}`);
      expect.soft(watched.complaints).toEqual([]);
      await page.context().close();
    }
  }
});

test('signing in is accessible in both themes, and a wrong password is refused in words', async ({ browser }) => {
  for (const colorScheme of ['light', 'dark'] as const) {
    const page = await (await browser.newContext({ colorScheme, viewport: { width: 320, height: 640 } })).newPage();
    const watched = watchPage(page);
    watched.expectAnswer(401, '/api/session');
    await page.goto('/sign-in');
    await expect(page.getByRole('heading', { name: 'Demo accounts' })).toBeVisible();
    await expectAccessible(page, `sign-in, ${colorScheme}`);
    await expectNoSideScroll(page, 'sign-in');
    await page.getByLabel('E-mail').fill('calder@headfast.example');
    await page.getByLabel('Password', { exact: true }).fill('not the password at all');
    await tap(page.getByRole('button', { name: 'Sign in', exact: true }));
    await expect(page.getByRole('alert')).toBeVisible();
    await expect(page).toHaveURL(/sign-in/);
    await expect(page.getByLabel('E-mail')).toHaveValue('calder@headfast.example');
    await expectAccessible(page, `sign-in refused, ${colorScheme}`);
    watched.none();
    await page.context().close();
  }
});

test('an address of no job and a page of no name are told plainly', async ({ browser }) => {
  const { page, watched } = await openAs(browser, 'welder', 'phone');
  watched.expectAnswer(404, '/api/jobs/01940000-0000-7000-8000-00000000dead');
  await page.goto('/jobs/01940000-0000-7000-8000-00000000dead');
  await expect(page.getByText('There is no such thing, or it is not yours to see.')).toBeVisible();
  await page.goto('/nowhere-at-all');
  await expect(page.getByRole('link', { name: 'To the start' })).toBeVisible();
  watched.none();
  await page.context().close();
});

test('empty places say why they are empty and what to do', async ({ browser }) => {
  const { page } = await openAs(browser, 'secondToolPusher', 'phone');
  await expect(page.getByText('Nothing waits for you.')).toBeVisible();
  await page.goto('/packets');
  await expect(page.getByText('No packet yet.')).toBeVisible();
  await page.context().clearCookies();
  await signIn(page, 'auditor');
  await page.goto('/packets?q=zebra');
  await expect(page.getByText('No packet has all of these words.')).toBeVisible();
  await page.context().close();
});
