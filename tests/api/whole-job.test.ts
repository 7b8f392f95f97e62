import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { JobSummary } from '../../shared/contracts/jobs';
import { aJobOn, browserOf } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
let job: JobOn;
beforeAll(async () => {
  on = await startTestApp();
  job = await aJobOn(on);
});
afterAll(() => on.stop());

describe('a job over HTTP', () => {
  it('is listed as planned to those who are on it', async () => {
    const welder = await browserOf(on, 'welder');
    const { body } = await welder.get('/api/jobs').expect(200);
    const [first] = (body as { jobs: JobSummary[] }).jobs;
    expect(first).toMatchObject({
      id: job.id,
      status: 'planned',
      well: 'Tallgrass 14-2H',
      casing: '9.625 in 40 lb/ft J55',
      waitsFor: 'welder',
    });
    expect(first?.current).toEqual({ point: 'hot-work-clearance', status: 'open' });
    expect(first?.strip).toHaveLength(14);
  });

  it('goes from the first hold point to the seal', async () => {
    await job.walkTo(null);
    await job.seal();
    expect(job.state.status).toBe('sealed');
  });

  it('is a packet whose chain holds, for the auditor of its operator', async () => {
    const auditor = await browserOf(on, 'auditor');
    const list = await auditor.get('/api/packets?q=tallgrass%20pronghorn').expect(200);
    expect((list.body as { packets: JobSummary[] }).packets.map((one) => one.id)).toEqual([job.id]);
    const { body } = await auditor.get(`/api/packets/${job.id}`).expect(200);
    expect(body).toMatchObject({
      packet: { status: 'sealed', concessions: 0 },
      roles: ['auditor'],
      verification: { holds: true, links: job.events.length },
    });
    const story = await auditor.get(`/api/packets/${job.id}/events`).expect(200);
    expect((story.body as { events: unknown[] }).events).toHaveLength(job.events.length);
    const photo = job.point('bevel-prep').photos[0];
    const file = await auditor.get(`/api/packets/${job.id}/files/${photo?.sha256}`).expect(200);
    expect(file.headers['content-type']).toBe('image/jpeg');
  });

  it('keeps what the stored picture measures, not what the phone said', () => {
    expect(job.point('bevel-prep').photos.every((photo) => photo.height === 30 && photo.width > 40)).toBe(true);
  });

  it('is gone from the list of running jobs', async () => {
    const welder = await browserOf(on, 'welder');
    const { body } = await welder.get('/api/jobs').expect(200);
    expect((body as { jobs: unknown[] }).jobs).toEqual([]);
  });
});
