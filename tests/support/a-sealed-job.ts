import { sitePoint } from '../../shared/hold-points/site';
import { concessionTotal } from '../../shared/job/decide-failure';
import { currentPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import { chainStart, makeLink, type ChainLink } from '../../shared/ledger/chain';
import { aJob, hash, type TestJob } from './a-job';
import { aPlan } from './a-plan';
import { aPhoto, cleanAir } from './clearance';
import { presentPoint, recordPoint, releasePoint, walkPoint, walkTo } from './drive';

const [clearance, cut, seal, valve, test] = [
  'hot-work-clearance',
  'final-cut',
  'seal-greased-and-checked',
  'valve-orientation',
  'pressure-test-held',
] as const;

const open = (job: TestJob): string => currentPoint(job.job)?.place.id ?? '';

const sentBack = (job: TestJob, point: string, reason: string): void => {
  const contentHash = job.point(point).presentation?.contentHash ?? '';
  job.minutes(3).do('send-back', { point, reason, contentHash }, job.person('company_rep'));
};

/** Point 1 with a photo that has to be taken again. */
const clear = (job: TestJob): void => {
  recordPoint(job, clearance);
  presentPoint(job, clearance);
  sentBack(job, clearance, 'The display cannot be read in the photo. Take it again, closer.');
  const photo = job.point(clearance).photos[0]?.id ?? '';
  job.do('set-photo-aside', { point: clearance, photo, reason: 'The display is blurred.' }, job.person('welder'));
  job.minutes(1).do('add-photo', { point: clearance, ...aPhoto('meter-at-cellar', 99) }, job.person('welder'));
  presentPoint(job, clearance);
  releasePoint(job, clearance);
};

const stoppedAndResumed = (job: TestJob): void => {
  job.minutes(1).do('stop-work', { reason: 'The crane swings over the cellar.' }, job.person('tool_pusher'));
  job.minutes(20).do('record', { point: sitePoint, entries: cleanAir() }, job.person('welder'));
  const note = 'The lift is over and the cellar is clear again.';
  job.minutes(2).do('resume-work', { note, ...job.signingJob() }, job.person('company_rep'));
};

/** Measured low and uneven, measured once more at 6 o'clock, presented as it is and conceded with two reasons. */
const cutLow = (job: TestJob): void => {
  recordPoint(job, cut, { 'cut.12': '32 1/16', 'cut.3': '32 1/8', 'cut.6': '32 1/4', 'cut.9': '32 1/16' });
  const again = [{ field: 'cut.6', typed: '32 3/16', unit: 'in', measuredBy: null }];
  job.do('record', { point: cut, entries: again }, job.person('welder', 1));
  presentPoint(job, cut);
  const reasons: Record<string, string> = {
    'cut-low': 'The stack has room for 7/64 in. Nothing more is cut.',
    'cut-spread': 'The bevel takes the spread; the seal sits well above it.',
  };
  const items = reviewPoint(job.job, job.point(cut)).unconceded.map(({ limit, basis }) => ({
    limit,
    basis,
    reason: reasons[limit] ?? '',
  }));
  job.do('concede', { point: cut, items, ...job.signing(cut) }, job.person('company_rep'));
  releasePoint(job, cut);
};

const lookedAtAgain = (job: TestJob): void => {
  recordPoint(job, valve);
  const reason = 'The lip was seen on one side only. Look all the way round.';
  job.do('reopen', { point: seal, reason, ...job.signing(seal) }, job.person('company_rep'));
  const entries = [{ field: 'seal.condition', typed: 'seen all the way round, mirror', unit: null, measuredBy: null }];
  job.minutes(9).do('record', { point: seal, entries }, job.person('welder'));
  walkPoint(job, seal);
};

/** Typed before presenting, arrived after the release: kept, flagged, and it counts for nothing. */
const lateReading = (job: TestJob, point: string): void => {
  const before = job.now;
  job.now = Date.parse(job.point(point).presentation?.at.corrected ?? '') - 60_000;
  const entries = [{ field: 'set.level.y', typed: '0.05', unit: 'deg', measuredBy: null }];
  job.do('record', { point, entries }, job.person('welder', 1));
  job.now = before;
};

const termsChanged = (job: TestJob): void => {
  const { terms } = job.job.plan;
  const gauge = {
    gaugeLowPct: { value: '30', source: 'job' as const },
    gaugeHighPct: { value: '70', source: 'job' as const },
  };
  const reason = 'The programme asks for 30 to 70 % of full scale.';
  const changed = { ...terms, settings: { ...terms.settings, ...gauge } };
  job.minutes(1).do('change-terms', { terms: changed, reason, ...job.signingJob() }, job.person('company_rep'));
};

const failedTest = (job: TestJob): void => {
  recordPoint(job, test, { 'hold-readings.3.pressure': '1390' });
  const reason = 'Lost 110 psi in ten minutes; the weld weeps at 4 o’clock.';
  job.do('open-repair-round', { reason, passes: 1, ...job.signingJob() }, job.person('company_rep'));
};

/**
 * A whole job of the invented scenario: sent back, stopped, conceded, reopened, terms changed, a late reading, a
 * handover, a failed test with its repair round, and the seal.
 */
export const aSealedJob = (): TestJob => {
  const job = aJob(aPlan({ proposedDirection: 'mud-tanks' }));
  job.minutes(35);
  clear(job);
  walkTo(job, cut);
  stoppedAndResumed(job);
  cutLow(job);
  walkTo(job, valve);
  lookedAtAgain(job);
  walkPoint(job, valve);
  lateReading(job, valve);
  termsChanged(job);
  walkTo(job, 'pass-1-inspected');
  const line = 'Root goes next. Joint at 310 °F, rods out of the oven at each pass, the plug lies in tray 2.';
  job.minutes(1).do('hand-over', { line, to: 'J. Ostrom' }, job.person('welder'));
  walkTo(job, test);
  failedTest(job);
  walkTo(job, null);
  if (open(job) !== '') throw new Error(`the scenario stuck at ${open(job)}`);
  const concessions = concessionTotal(job.job);
  return job.minutes(6).do('seal', { concessions, ...job.signingJob() }, job.person('company_rep'));
};

/** A job that ended early: called off at its second point. */
export const aCalledOffJob = (): TestJob => {
  const job = aJob();
  walkTo(job, 'height-takeoff');
  const reason = 'The cement did not hold; the rig skids to the next well.';
  return job.minutes(30).do('call-off', { reason, ...job.signingJob() }, job.person('company_rep'));
};

/** The chain as the server holds it. */
export const chainOf = (job: TestJob): ChainLink[] => {
  let prev = chainStart(job.id, hash);
  return job.events.map((event, index) => {
    const link = { seq: index + 1, commandId: event.body.commandId, type: event.type, schema: 1, body: event.body };
    const made = makeLink(job.id, link, prev, hash);
    prev = made.hash;
    return made;
  });
};
