import { beforeAll, describe, expect, it } from 'vitest';
import { checkSignatures } from '../../../shared/job/check-signatures';
import type { JobEvent } from '../../../shared/job/events';
import { storyOf, type Section, type Story } from '../../../shared/job/story';
import { whatCounts } from '../../../shared/job/what-counts';
import { worthReading } from '../../../shared/job/worth-reading';
import { aJob, hash, type TestJob } from '../../support/a-job';
import { aCalledOffJob, aSealedJob } from '../../support/a-sealed-job';
import { recordPoint, walkTo } from '../../support/drive';

let job: TestJob;
let story: Story;
const section = (id: string): Section => {
  const found = story.settings.at(-1)?.sections.find(({ point }) => point.place.id === id);
  if (!found) throw new Error(`no section ${id}`);
  return found;
};

beforeAll(() => {
  job = aSealedJob();
  const told = storyOf(job.id, job.events);
  if (!told) throw new Error('nothing was told');
  story = told;
});

describe('the story of a job', () => {
  it('has every hold point in the order of the work, repair rounds behind the point that failed', () => {
    const ids = story.settings[0]?.sections.map(({ point }) => point.place.id);
    expect(ids?.[0]).toBe('hot-work-clearance');
    expect(ids?.slice(13, 15)).toEqual(['pressure-test-held', 'test-plug-removed-r1']);
    expect(ids).toHaveLength(19);
  });

  it('tells how each ended', () => {
    expect(section('final-cut').chapter.ending).toBe('released');
    expect(section('pressure-test-held').chapter.ending).toBe('carried');
    expect(section('pressure-test-held-r1').chapter.ending).toBe('released');
  });

  it('keeps what a reopening set aside, with its release and the reason', () => {
    const [old] = section('seal-greased-and-checked').superseded;
    expect(old?.ending).toBe('superseded');
    expect(old?.point.release?.signature.printedName).toBe('O. Brandt');
    expect(old?.why?.reason).toContain('one side only');
    expect(old?.review.context.value('seal.condition')).not.toContain('mirror');
    expect(section('valve-orientation').superseded).toHaveLength(1);
  });

  it('takes verdicts from the release and never judges again', () => {
    const { chapter } = section('final-cut');
    expect(chapter.judgedAt).toBe('release');
    expect(chapter.verdicts).toBe(chapter.point.release?.judged.verdicts);
  });

  it('reads a point with the terms of then, whatever was changed after its release', () => {
    const gauge = (id: string) => section(id).chapter.review.context.state.plan.terms.settings.gaugeLowPct.value;
    expect(gauge('valve-orientation')).toBe('25');
    expect(gauge('pressure-test-held-r1')).toBe('30');
  });

  it('shows a late reading as late and does not count it', () => {
    const { chapter } = section('valve-orientation');
    expect(chapter.point.readings['set.level.y']?.map((one) => one.late)).toEqual([false, true]);
    expect(chapter.review.context.read('set.level.y')?.late).toBe(false);
  });

  it('tells an earlier setting apart from the one that stands', () => {
    const twice = aJob();
    walkTo(twice, 'pass-2-inspected');
    const head = { ...twice.job.plan.head, id: 'head-2' };
    const body = { reason: 'The seal rolled.', head, targetHeightIn: '5', ...twice.signingJob() };
    twice.do('set-again', body, twice.person('company_rep'));
    walkTo(twice, 'final-cut');
    const told = storyOf(twice.id, twice.events);
    expect(told?.settings.map(({ setting, reason }) => [setting, reason])).toEqual([
      [1, 'The seal rolled.'],
      [2, null],
    ]);
    expect(told?.settings[0]?.sections.filter(({ chapter }) => chapter.ending === 'released')).toHaveLength(9);
    expect(told?.settings[1]?.sections[2]?.chapter.ending).toBe('untouched');
  });

  it('says what counts in one line where the numbers are there, and nothing where they are not', () => {
    expect(whatCounts(section('valve-orientation').chapter)).toMatchObject({
      key: 'packets.counts.valve-orientation',
      params: { rotation: { unit: 'deg' } },
    });
    const begun = aJob();
    recordPoint(begun, 'hot-work-clearance');
    const untouched = storyOf(begun.id, begun.events)?.settings[0]?.sections[2];
    expect(untouched && whatCounts(untouched.chapter)).toBeNull();
  });

  it('is nothing without events', () => expect(storyOf(job.id, [])).toBeNull());
});

describe('what is worth reading', () => {
  it('counts what an outsider asks for first', () => {
    const counts = Object.fromEntries(worthReading(story, job.events).map(({ kind, count }) => [kind, count]));
    expect(counts).toMatchObject({
      concessions: 2,
      'repair-rounds': 1,
      reopened: 1,
      'sent-back': 1,
      stops: 1,
      instruments: 0,
      late: 1,
      'photos-aside': 1,
      'rows-struck': 0,
      terms: 1,
    });
  });

  it('begins with the reason of a job that was called off', () => {
    const off = aCalledOffJob();
    const told = storyOf(off.id, off.events);
    expect(told && worthReading(told, off.events)[0]).toMatchObject({
      kind: 'called-off',
      items: [{ says: 'The cement did not hold; the rig skids to the next well.' }],
    });
  });
});

describe('signatures worked out anew', () => {
  it('are each bound to the content that stood when they were given', () => {
    const checks = checkSignatures(job.id, job.events, hash);
    expect(checks?.length).toBeGreaterThan(20);
    expect(checks?.every((one) => one.bound)).toBe(true);
  });

  it('name the first that was given for something else', () => {
    const changed = JSON.parse(JSON.stringify(job.events)) as JobEvent[];
    const entry = changed.flatMap((event) =>
      event.type === 'readings-recorded' ? event.body.entries.filter((one) => one.field === 'cut.12') : [],
    )[0];
    if (!entry) throw new Error('nothing was cut');
    entry.typed = '32';
    const broken = checkSignatures(job.id, changed, hash)?.filter((one) => !one.bound);
    expect(broken?.[0]?.signature).toMatchObject({ printedName: 'O. Brandt', meaning: 'signature.concede' });
  });

  it('are not judged where other definitions ruled', () => {
    const other = JSON.parse(JSON.stringify(job.events)) as JobEvent[];
    const planned = other[0];
    if (planned?.type === 'job-planned') planned.body.definitions = 0;
    expect(checkSignatures(job.id, other, hash)).toBeNull();
  });
});
