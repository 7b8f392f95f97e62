import { expect, test } from '@playwright/test';
import { currentPoint, findPoint } from '../../shared/job/points';
import { concedeOne, releaseFromDesk, release, sendBack, signWithPin, takeFromDesk } from './support/owner';
import { readJob } from './support/job-record';
import { openAs, type Person } from './support/people';
import { takePhoto } from './support/photos';
import { planJob } from './support/plan-form';
import { tap } from './support/tap';
import { goToOpenPoint, present, workThrough } from './support/welder';
import { nameOf, titleOf } from './support/words';

const well = 'Tallgrass 16-3H';

test('four people carry a job from planned to sealed, and an auditor believes its packet', async ({ browser }) => {
  test.setTimeout(900_000);
  const coordinator = await openAs(browser, 'coordinator', 'desktop');
  const welder = await openAs(browser, 'welder', 'phone');
  const rep = await openAs(browser, 'companyRep', 'tablet');
  const pusher = await openAs(browser, 'toolPusher', 'phone');
  const everybody = [coordinator, welder, rep, pusher];
  let jobId = '';

  /** The welder does the open point and presents it; its title. */
  async function presentNext(otherwise: Record<string, string> = {}): Promise<string> {
    const { place } = await goToOpenPoint(welder.page, jobId);
    await workThrough(welder.page, jobId, { otherwise });
    await present(welder.page);
    return titleOf(place);
  }
  const releaseNext = async (): Promise<void> => releaseFromDesk(rep, well, await presentNext());
  const openPoint = async () => currentPoint(await readJob(welder.page, jobId));

  await test.step('the coordinator plans the job on the form', async () => {
    jobId = await planJob(coordinator.page, well);
    expect((await readJob(coordinator.page, jobId)).status).toBe('planned');
  });

  await test.step('hot work clearance is released with its statements', releaseNext);

  await test.step('the height takeoff is sent back, mended and released', async () => {
    const title = await presentNext();
    await takeFromDesk(rep.page, well, title);
    const reason = 'The tape is not readable in the photo of the head. Take it again, straight on.';
    await sendBack(rep.page, reason);
    const { place } = await goToOpenPoint(welder.page, jobId);
    await expect(welder.page.getByText(reason)).toBeInViewport();
    const shot = welder.page
      .getByRole('article')
      .filter({ has: welder.page.getByRole('heading', { name: nameOf(place, 'shots', 'tape-on-head'), exact: true }) });
    await tap(shot.getByRole('button', { name: 'Set aside' }));
    await welder.page.getByRole('dialog').getByLabel('Reason').fill('The figures are not readable');
    await tap(welder.page.getByRole('dialog').getByRole('button', { name: 'Set aside' }));
    await expect(welder.page.getByText(/Set aside by W\. Calder: The figures are not readable/)).toBeVisible();
    await takePhoto(welder.page, place, 'tape-on-head');
    await present(welder.page);
    await releaseFromDesk(rep, well, title);
  });

  await test.step('an uneven final cut is presented as it is, conceded and released', async () => {
    const uneven = await presentUnevenCut(welder, jobId);
    await takeFromDesk(rep.page, well, uneven);
    await expect(rep.page.getByText('1 reading is outside its limit').first()).toBeVisible();
    await concedeOne(rep, 'The high side is at 3 o’clock, away from the seam; the seal sits well below it.');
    await release(rep);
  });

  await test.step('bevel prep is released', releaseNext);

  await test.step('the tool pusher names the direction before the head is lifted', async () => {
    await pusher.page.goto(`/jobs/${jobId}`);
    await tap(pusher.page.getByRole('button', { name: 'Name the direction' }).first());
    await pusher.page.getByRole('dialog').getByRole('radio', { name: 'mud tanks' }).check();
    await tap(pusher.page.getByRole('dialog').getByRole('button', { name: 'Name the direction' }));
    await expect(pusher.page.getByText(/mud tanks, named by T\. Rhule/)).toBeVisible();
  });
  await test.step('the seal is greased, checked and released', releaseNext);

  await test.step('the tool pusher releases the valve orientation, and nobody else can', async () => {
    const title = await presentNext();
    await rep.page.goto(`/jobs/${jobId}/valve-orientation`);
    await expect(rep.page.getByRole('heading', { level: 1, name: title })).toBeVisible();
    await expect(rep.page.getByRole('button', { name: /^Release/ })).toHaveCount(0);
    await takeFromDesk(pusher.page, well, title);
    await tap(pusher.page.getByRole('button', { name: 'Release: it faces the mud tanks' }));
    await signWithPin(pusher.page, pusher.pin, 'Release');
    await expect(pusher.page.getByText(/Released by T\. Rhule/).first()).toBeVisible();
  });

  await test.step('the plug is out and the preheat is reached', async () => {
    await releaseNext();
    await releaseNext();
  });

  await test.step('the plug point is reopened: what came after is shut and superseded', async () => {
    const reason = 'The cover blew off the bore. Cover it again and look for dropped objects.';
    await rep.page.goto(`/jobs/${jobId}/test-plug-removed`);
    await tap(rep.page.getByRole('button', { name: 'Reopen' }));
    await rep.page.getByRole('dialog').getByLabel('Reason').fill(reason);
    await signWithPin(rep.page, rep.pin, 'Sign');
    const state = await readJob(rep.page, jobId);
    expect(findPoint(state, 'test-plug-removed')?.status).toBe('open');
    expect(findPoint(state, 'preheat-reached')).toMatchObject({ status: 'shut', superseded: [expect.anything()] });
    await goToOpenPoint(welder.page, jobId);
    await expect(welder.page.getByText(reason)).toBeInViewport();
    await releaseNext();
    await releaseNext();
  });

  await test.step('four passes are welded, inspected and released', async () => {
    for (let pass = 1; pass <= 4; pass += 1) await releaseNext();
  });
  await test.step('the weld has cooled to touch', releaseNext);

  await test.step('the pressure test fails at the weld, and a repair round is opened', async () => {
    await goToOpenPoint(welder.page, jobId);
    await workThrough(welder.page, jobId, { otherwise: { leak: 'weld' } });
    await expect(welder.page.getByText('Cannot be presented while this stands')).toBeVisible();
    await expect(welder.page.getByRole('button', { name: /^Present/ })).toHaveCount(0);
    await rep.page.goto(`/jobs/${jobId}`);
    await tap(rep.page.getByRole('button', { name: 'Open a repair round' }));
    const sheet = rep.page.getByRole('dialog');
    await sheet.getByLabel('What failed, and where').fill('Oil weeps through the cap at 7 o’clock.');
    await sheet.getByRole('radio', { name: '1', exact: true }).check();
    await signWithPin(rep.page, rep.pin, 'Sign');
    await expect(rep.page.getByRole('link', { name: /repair round 1/ }).first()).toBeVisible();
  });

  await test.step('the repair round goes to the end, the whole test again', async () => {
    for (let point = await openPoint(); point; point = await openPoint()) {
      expect(point.place.id).toMatch(/-r1$/);
      await releaseNext();
    }
  });

  await test.step('the job is sealed with its concessions read back', async () => {
    await rep.page.goto(`/jobs/${jobId}`);
    await tap(rep.page.getByRole('button', { name: 'Seal the job' }).first());
    await expect(rep.page.getByRole('dialog').getByText('The packet carries 1 concession.')).toBeVisible();
    await signWithPin(rep.page, rep.pin, 'Seal the job');
    await expect(rep.page.getByText(/Sealed by O\. Brandt/)).toBeVisible();
  });

  await test.step('the auditor finds the packet, reads it and it holds together', async () => {
    const auditor = await openAs(browser, 'auditor', 'desktop');
    everybody.push(auditor);
    await auditor.page.getByLabel('Operator, rig, well or casing').fill('16-3H');
    await tap(auditor.page.getByRole('button', { name: 'Search', exact: true }));
    await expect(auditor.page).toHaveURL(/q=16-3H/);
    await expect(auditor.page.getByRole('main').getByRole('listitem').getByRole('link')).toHaveCount(1);
    await tap(auditor.page.getByRole('link', { name: new RegExp(well) }));
    await believeThePacket(auditor);
  });

  for (const person of everybody) {
    person.watched.none();
    await person.page.context().close();
  }
});

/** A cut an eighth high at 3 o'clock: its spread is outside, nothing else is. */
async function presentUnevenCut(welder: Person, jobId: string): Promise<string> {
  const { place } = await goToOpenPoint(welder.page, jobId);
  const takeoff = findPoint(await readJob(welder.page, jobId), 'height-takeoff');
  const mark = Number(takeoff?.readings['mark.first']?.at(-1)?.value);
  await workThrough(welder.page, jobId, { otherwise: { 'cut.3': String(mark - 0.125) } });
  await expect(welder.page.getByText('1 reading is outside its limit')).toBeVisible();
  await expect(welder.page.getByRole('button', { name: 'Measure again' })).toBeVisible();
  await present(welder.page);
  return titleOf(place);
}

/** What an outsider looks for: the check, the story in its order, the concession, what was superseded, the repair. */
async function believeThePacket({ page }: Person): Promise<void> {
  await expect(page.getByRole('heading', { name: 'The record holds together' })).toBeVisible();
  await expect(page.getByText(/each is bound to what it was given for/)).toBeVisible();
  await expect(page.getByText('The server’s own check agrees.')).toBeVisible();
  await tap(page.getByRole('button', { name: 'Recompute the photos too' }));
  await expect(page.getByText(/recomputed: each is what was hashed/)).toBeVisible({ timeout: 60_000 });
  for (const told of ['Repair round 1', 'Height takeoff', 'Pressure test held, repair round 1'])
    await expect(page.getByRole('heading', { name: new RegExp(told) }).first()).toBeVisible();
  await expect(
    page.getByText('The high side is at 3 o’clock, away from the seam; the seal sits well below it.').first(),
  ).toBeVisible();
  await expect(
    page.getByText('The tape is not readable in the photo of the head. Take it again, straight on.').first(),
  ).toBeVisible();
  await expect(page.getByText('Oil weeps through the cap at 7 o’clock.').first()).toBeVisible();
  await expect(page.getByText('Not released. Repair round 1 took it over.').first()).toBeVisible();
  const superseded = page.getByText(/1 superseded set of evidence/);
  await expect(superseded).toHaveCount(2);
  await tap(superseded.last());
  await expect(page.getByText('Superseded', { exact: true }).last()).toBeVisible();
  await expect(page.getByText('Sealed with 1 concession read back.')).toBeVisible();
}
