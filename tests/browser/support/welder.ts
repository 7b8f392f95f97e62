import { expect, type Page } from '@playwright/test';
import type { RecordEntry } from '../../../shared/contracts/commands';
import { sitePoint } from '../../../shared/hold-points/site';
import { currentPoint } from '../../../shared/job/points';
import type { JobState, PointState } from '../../../shared/job/state';
import { nextStep, type Step } from '../../support/good-readings';
import { typeReadings } from './entry';
import { allSent, readJob } from './job-record';
import { takePhoto } from './photos';
import { tap } from './tap';
import { escaped, nameOf, titleOf } from './words';

/** Changes what is typed at a point: another figure for one field, by its key. */
export type Otherwise = Record<string, string>;

interface Work {
  /** figures that differ from the good ones */
  otherwise?: Otherwise;
  /** ends the work before this step */
  until?: (step: Step) => boolean;
}

/** Goes to the point that is open, from the job's page, by its main button. */
export async function goToOpenPoint(page: Page, jobId: string): Promise<PointState> {
  await page.goto(`/jobs/${jobId}`);
  const point = currentPoint(await readJob(page, jobId));
  if (!point) throw new Error('no hold point is open');
  await tap(page.getByRole('button', { name: `Go to ${titleOf(point.place)}` }));
  await expect(page.getByRole('heading', { level: 1, name: titleOf(point.place) })).toBeVisible();
  return point;
}

/** Does everything that the open point asks for, through its page. */
export async function workThrough(page: Page, jobId: string, work: Work = {}): Promise<void> {
  for (let before = ''; ;) {
    await allSent(page);
    const state = await readJob(page, jobId);
    const point = currentPoint(state);
    const step = point && nextStep(state, point, new Date().toISOString());
    if (!point || !step || work.until?.(step)) return;
    const now = `${point.place.id} ${JSON.stringify({ ...step, entries: undefined })} after ${String(state.eventCount)}`;
    if (now === before) throw new Error(`${now} was done and is asked for again`);
    before = now;
    await take(page, state, point, step, work.otherwise ?? {});
  }
}

async function take(page: Page, state: JobState, point: PointState, step: Step, otherwise: Otherwise): Promise<void> {
  const { place } = point;
  if (step.do === 'record') {
    if (step.point === sitePoint) throw new Error('the air is too old: the walk took longer than it stands for');
    await typeReadings(
      page,
      state,
      point,
      step.entries.map((entry) => changed(entry, place.kind, otherwise)),
    );
  } else if (step.do === 'add-photo') await takePhoto(page, place, step.shot);
  else {
    const name = escaped(nameOf(place, 'acts', step.act));
    const begin = page.getByRole('button', { name: new RegExp(`^Begin: ${name}`) });
    const end = page.getByRole('button', { name: new RegExp(`^End: ${name}`) });
    await tap(step.do === 'begin-act' ? begin : end);
    await expect(step.do === 'begin-act' ? end : begin.or(end)).toHaveCount(step.do === 'begin-act' ? 1 : 0);
  }
}

/** A hold is read off the chart after it: its times are typed, and lie before now. */
const CHART_BACK_MS = 25 * 60_000;

function changed(entry: RecordEntry, kind: string, otherwise: Otherwise): RecordEntry {
  const other = otherwise[entry.field];
  if (other !== undefined) return { ...entry, typed: other };
  if (kind !== 'pressure-test-held' || !/^hold.*(start|end|at)$/.test(entry.field)) return entry;
  return { ...entry, typed: new Date(Date.parse(entry.typed) - CHART_BACK_MS).toISOString() };
}

/** Presents the point; what is outside its limits is presented as it is. */
export async function present(page: Page): Promise<void> {
  await tap(page.getByRole('button', { name: /^Present( as it is)?$/ }));
  await expect(
    page.getByRole('heading', { level: 1 }).locator('..').getByText('Presented', { exact: true }),
  ).toBeVisible();
  await allSent(page);
}
