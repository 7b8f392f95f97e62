import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { loadDemo } from '../../server/demo/load-demo';
import type { JobSummary } from '../../shared/contracts/jobs';
import { browserOf } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
  await loadDemo(on.deps);
});
afterAll(() => on.stop());

describe('the demo', () => {
  it('has a job that runs and one that is planned, all in the past', async () => {
    const { body } = await (await browserOf(on, 'welder')).get('/api/jobs').expect(200);
    const { jobs } = body as { jobs: JobSummary[] };
    expect(jobs.map(({ well, status, current }) => [well, status, current?.point])).toEqual([
      ['Tallgrass 14-2H', 'running', 'valve-orientation'],
      ['Tallgrass 15-1H', 'planned', 'hot-work-clearance'],
    ]);
    expect(jobs.every((job) => Date.parse(job.movedAt) < on.clock().getTime())).toBe(true);
  });

  it('has a packet that holds, with one concession, and pictures in it', async () => {
    const auditor = await browserOf(on, 'auditor');
    const list = await auditor.get('/api/packets').expect(200);
    const [packet] = (list.body as { packets: JobSummary[] }).packets;
    expect(packet).toMatchObject({ well: 'Tallgrass 12-2H', status: 'sealed', concessions: 1 });
    const { body } = await auditor.get(`/api/packets/${packet?.id}`).expect(200);
    expect((body as { verification: unknown }).verification).toMatchObject({ holds: true });
    const files = await on.deps.dataSource.query<{ n: string }[]>(
      'SELECT COUNT(*) AS n FROM job_files WHERE width = 640',
    );
    expect(Number(files[0]?.n)).toBeGreaterThan(30);
  });

  it('is loaded once', async () => {
    expect(await loadDemo(on.deps)).toBe(false);
  });
});
