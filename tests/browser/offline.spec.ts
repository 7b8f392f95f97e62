import { expect, test } from '@playwright/test';
import { reviewPoint } from '../../shared/job/review';
import { currentPoint } from '../../shared/job/points';
import { goodReadings } from '../support/good-readings';
import { typeReadings } from './support/entry';
import { allSent, eventsOf, readJob } from './support/job-record';
import { openAs } from './support/people';
import { takePhoto } from './support/photos';
import { planJob } from './support/plan-form';
import { tap } from './support/tap';
import { goToOpenPoint, present, workThrough } from './support/welder';
import { titleOf } from './support/words';

test('what is captured without a signal waits on the phone and arrives once', async ({ browser }) => {
  const coordinator = await openAs(browser, 'coordinator', 'desktop');
  const welder = await openAs(browser, 'welder', 'phone');
  const jobId = await planJob(coordinator.page, 'Tallgrass 17-1H');
  await goToOpenPoint(welder.page, jobId);
  const state = await readJob(welder.page, jobId);
  const point = currentPoint(state);
  if (!point) throw new Error('no hold point is open');
  const before = (await eventsOf(welder.page, jobId)).length;
  const now = new Date().toISOString();
  const reading = goodReadings(state, point, now).find((one) => one.field === 'gas.cellar.oxygen');
  const shot = reviewPoint(state, point).shots[0]?.key ?? '';
  if (!reading) throw new Error('the air is not asked for');

  await welder.page.context().setOffline(true);
  await typeReadings(welder.page, state, point, [reading]);
  await takePhoto(welder.page, point.place, shot);
  const mark = welder.page.getByRole('status').filter({ hasText: /No signal, \d+.waits? to be sent/ });
  await expect(mark).toBeVisible();
  await expect(welder.page.getByText('not yet sent', { exact: true }).first()).toBeVisible();
  await expect(welder.page.getByRole('button', { name: /Show large: .*Not yet sent/ })).toBeVisible();

  await welder.page.context().setOffline(false);
  await allSent(welder.page);
  await expect(welder.page.getByRole('button', { name: /Not yet sent/ })).toHaveCount(0);
  const arrived = (await eventsOf(welder.page, jobId)).slice(before);
  expect(arrived.map((event) => event.type)).toEqual(['readings-recorded', 'photo-added']);
  expect(new Set(arrived.map((event) => event.commandId)).size).toBe(2);

  await welder.page.reload();
  await expect(welder.page.getByRole('button', { name: /^Show large: / })).toHaveCount(1);
  await allSent(welder.page);
  expect(await eventsOf(welder.page, jobId)).toHaveLength(before + 2);
  for (const { page } of [coordinator, welder]) await page.context().close();
});

test('a release without a signal says that it needs the server, and is given once there is one', async ({
  browser,
}) => {
  const coordinator = await openAs(browser, 'coordinator', 'desktop');
  const welder = await openAs(browser, 'welder', 'phone');
  const rep = await openAs(browser, 'companyRep', 'phone');
  const jobId = await planJob(coordinator.page, 'Tallgrass 18-1H');
  const { place } = await goToOpenPoint(welder.page, jobId);
  await workThrough(welder.page, jobId);
  await present(welder.page);

  await rep.page.goto(`/jobs/${jobId}/${place.id}`);
  await expect(rep.page.getByRole('heading', { level: 1, name: titleOf(place) })).toBeVisible();
  for (const one of await rep.page.getByRole('checkbox').all()) await one.check();
  await rep.page.context().setOffline(true);
  await tap(rep.page.getByRole('button', { name: /^Release/ }));
  const sheet = rep.page.getByRole('dialog');
  await expect(sheet.getByText(/^There is no signal\. Releasing, conceding and sealing need the server/)).toBeVisible();
  await expect(sheet.getByLabel('Signing PIN')).toHaveCount(0);
  expect((await readJob(welder.page, jobId)).points[0]?.status).toBe('presented');

  await rep.page.context().setOffline(false);
  await expect(sheet.getByLabel('Signing PIN')).toBeVisible();
  await sheet.getByLabel('Signing PIN').fill(rep.pin);
  await tap(sheet.getByRole('button', { name: 'Release', exact: true }));
  await expect(sheet).toBeHidden();
  expect((await readJob(welder.page, jobId)).points[0]?.status).toBe('released');
  for (const { page } of [coordinator, welder, rep]) await page.context().close();
});
