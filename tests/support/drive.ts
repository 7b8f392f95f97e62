import { nextStep } from '../../server/demo/good-readings/next-step';
import { ownerOf, type PointId } from '../../shared/hold-points/points';
import { currentPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import { aPhoto } from './clearance';
import type { TestJob } from './a-job';

/** Answers that differ from the good ones, by field. */
type Own = Record<string, string>;

let pictures = 0;

/** Carries the open point to complete: acts, readings and photos, all of it right but for what `own` says. */
export const recordPoint = (job: TestJob, id: PointId, own: Own = {}): void => {
  const welder = job.person('welder');
  for (let steps = 0; steps < 200; steps++) {
    const step = nextStep(job.job, job.point(id), new Date(job.now).toISOString());
    if (!step) return;
    if (step.do === 'record') {
      const entries = step.entries.map((entry) => ({ ...entry, typed: own[entry.field] ?? entry.typed }));
      job.do('record', { point: step.point, entries }, welder);
    } else if (step.do === 'add-photo') job.do('add-photo', { point: id, ...aPhoto(step.shot, ++pictures) }, welder);
    else job.do(step.do, { point: id, act: step.act }, welder);
    job.minutes(step.minutes);
  }
  throw new Error(`${id} never became complete`);
};

export const presentPoint = (job: TestJob, id: PointId): void => {
  job.do('present', { point: id, ...job.signing(id) }, job.person('welder')).minutes(2);
};

/** Releases a presented point as its owner, conceding first what is outside a hold. */
export const releasePoint = (job: TestJob, id: PointId): void => {
  const review = reviewPoint(job.job, job.point(id));
  if (review.unconceded.length > 0) {
    const items = review.unconceded.map(({ limit, basis }) => ({ limit, basis, reason: 'Seen on site and accepted.' }));
    job.do('concede', { point: id, items, ...job.signing(id) }, job.person('company_rep'));
  }
  const owner = job.person(ownerOf[review.context.point.place.kind]);
  job.do('release', { point: id, statements: [...review.statements], ...job.signing(id) }, owner).minutes(1);
};

/** One point from open to released; the direction is named before the head is lifted. */
export const walkPoint = (job: TestJob, id: PointId, own: Own = {}): void => {
  if (job.point(id).place.kind === 'seal-greased-and-checked' && !job.job.direction)
    job.do('name-direction', { direction: 'mud-tanks', words: null }, job.person('tool_pusher'));
  recordPoint(job, id, own);
  presentPoint(job, id);
  releasePoint(job, id);
};

/** Walks every point in order up to, and not including, `until`; without it the whole row. */
export const walkTo = (job: TestJob, until: PointId | null): void => {
  for (let open = currentPoint(job.job); open && open.place.id !== until; open = currentPoint(job.job))
    walkPoint(job, open.place.id);
};
