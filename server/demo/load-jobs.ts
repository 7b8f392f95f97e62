import { subDays, subHours } from 'date-fns';
import { findPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import type { AppDeps } from '../services/deps';
import { DemoJob } from './drive-job';

/** A packet: once sent back, with one concession, sealed a week and a half ago. */
async function loadSealed(deps: AppDeps): Promise<void> {
  const job = await DemoJob.plan(deps, subDays(deps.clock(), 10), { well: 'Tallgrass 12-2H' });
  await job.give('toolPusher', 'name-direction', { direction: 'mud-tanks', words: null });
  await job.walkTo('bevel-prep');
  await job.fill();
  const entry = { field: 'clean.outside', typed: '7 1/2', unit: 'in', measuredBy: null };
  await job.give('welder', 'record', { point: 'bevel-prep', entries: [entry] });
  await job.present();
  const { contentHash } = job.signing('bevel-prep');
  const reason = 'The photo of the seal area does not show the long seam. Take it again from the V-door side.';
  await job.give('companyRep', 'send-back', { point: 'bevel-prep', reason, contentHash });
  await job.give('welder', 'set-photo-aside', {
    point: 'bevel-prep',
    photo: findPoint(job.state, 'bevel-prep')?.photos.find((one) => one.shot === 'seal-area')?.id ?? '',
    reason: 'Long seam not in the picture',
  });
  await job.wait(6).fill();
  await job.present();
  await concede(job, 'bevel-prep', 'Brushed bright to the clamp; the clamp stays on until the head is tacked.');
  await job.release();
  await job.walkTo(null);
  await job.seal();
}

async function concede(job: DemoJob, point: string, reason: string): Promise<void> {
  const found = findPoint(job.state, point);
  const holds = found ? reviewPoint(job.state, found).unconceded : [];
  const items = holds.map(({ limit, basis }) => ({ limit, basis, reason }));
  await job.give('companyRep', 'concede', { point, items, ...job.signing(point) });
  job.wait(2);
}

/** The job of today: the head is on, and its valve is being lined up. */
async function loadRunning(deps: AppDeps): Promise<void> {
  const job = await DemoJob.plan(deps, subHours(deps.clock(), 5));
  await job.give('toolPusher', 'name-direction', { direction: 'mud-tanks', words: null });
  await job.walkTo('valve-orientation');
  await job.give('welder', 'hand-over', {
    line: 'Head is set and the seal was seen sound. Two-hole comes next.',
    to: 'L. Amaro',
  });
}

/** Nothing has been done to it yet. */
async function loadPlanned(deps: AppDeps): Promise<void> {
  await DemoJob.plan(deps, subHours(deps.clock(), 20), { well: 'Tallgrass 15-1H', proposedDirection: null });
}

/** Three jobs of the invented scenario: sealed, running and planned; their times count from the day of loading. */
export async function loadDemoJobs(deps: AppDeps): Promise<void> {
  await loadSealed(deps);
  await loadPlanned(deps);
  await loadRunning(deps);
}
