import { createHash } from 'node:crypto';
import { readdirSync } from 'node:fs';
import http from 'node:http';
import type { AddressInfo } from 'node:net';
import request from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import type { DemoKey } from '../../server/demo/people';
import { filesUploadedBy } from '../../server/services/files-uploaded-by';
import { UPLOADS_PER_WINDOW } from '../../server/services/take-upload';
import type { Role } from '../../shared/permissions';
import { JobPersonView } from '../../server/entities/job-person-view';
import { JobView } from '../../server/entities/job-view';
import { hostileFiles } from '../support/images/hostile';
import { aHeic } from '../support/images/heic';
import { aJpeg, aPng } from '../support/images/make';
import { startTestApp, type Agent, type TestApp } from '../support/test-app';
import { minutes } from '../support/test-clock';

const sha256Of = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
const photo = aJpeg(64, 48, { orientation: 6 });

let house: TestApp;
let own: string;
let foreign: string;
const agents = new Map<DemoKey, Agent>();

beforeAll(async () => {
  house = await startTestApp();
  for (const key of ['welder', 'secondWelder', 'companyRep', 'auditor', 'coordinator'] as const) {
    agents.set(key, await house.agentFor(key));
  }
});
afterAll(() => house.stop());

beforeEach(async () => {
  own = await aRunningJob({ welder: 'welder', companyRep: 'company_rep' });
  foreign = await aRunningJob({});
});

/** A job as far as permissions ask: who is on it, and that it runs. */
async function aRunningJob(people: Partial<Record<DemoKey, Role>>): Promise<string> {
  const { manager } = house.deps.dataSource;
  const id = house.deps.ids();
  const words = {
    operator: 'Marrow Creek Resources',
    rig: 'Pronghorn 7',
    well: 'Tallgrass 14-2H',
    zone: 'America/Denver',
  };
  const counts = { hot: false, stopped: false, concessions: 0, reopenings: 0, seq: 1 };
  const times = { plannedAt: house.clock(), movedAt: house.clock() };
  const rest = { casing: '9 5/8', head: 'slip-on', status: 'running', strip: '[]', search: '' };
  await manager.insert(JobView, { id, operatorId: house.deps.ids(), ...words, ...counts, ...times, ...rest });
  for (const [key, role] of Object.entries(people)) await join(id, key as DemoKey, role);
  return id;
}

async function join(jobId: string, key: DemoKey, role: Role): Promise<void> {
  await house.deps.dataSource.manager.insert(JobPersonView, { jobId, accountId: house.person(key).id, role });
}

const as = (key: DemoKey): Agent => agents.get(key) as Agent;
const addressOf = (job: string, bytes: Buffer, sha256 = sha256Of(bytes)) => `/api/jobs/${job}/files/${sha256}`;
const put = (key: DemoKey, job: string, bytes: Buffer, type = 'image/jpeg', sha256?: string) =>
  as(key)
    .put(addressOf(job, bytes, sha256))
    .set('Content-Type', type)
    .send(bytes);
const stored = () => {
  const all = readdirSync(house.deps.config.uploadsDir, { recursive: true, withFileTypes: true });
  return all.filter((entry) => entry.isFile()).map((entry) => entry.name);
};

describe('sending a file', () => {
  test('answers with what the bytes say', async () => {
    const answer = await put('welder', own, photo).expect(200);
    expect(answer.body).toEqual({
      sha256: sha256Of(photo),
      type: 'image/jpeg',
      bytes: photo.length,
      width: 48,
      height: 64,
    });
    expect(stored()).toContain(sha256Of(photo));
  });

  test('twice, and by two people, changes nothing and remembers both', async () => {
    const first = await put('welder', own, photo).expect(200);
    await join(own, 'secondWelder', 'welder');
    expect((await put('welder', own, photo).expect(200)).body).toEqual(first.body);
    expect((await put('secondWelder', own, photo).expect(200)).body).toEqual(first.body);
    const { manager } = house.deps.dataSource;
    const unknown = 'f'.repeat(64);
    for (const key of ['welder', 'secondWelder'] as const) {
      const found = await filesUploadedBy(manager, own, house.person(key).id, [sha256Of(photo), unknown]);
      expect([...found.keys()]).toEqual([sha256Of(photo)]);
      expect(found.get(sha256Of(photo))).toMatchObject({
        width: 48,
        height: 64,
        uploadedBy: house.person('welder').id,
      });
    }
    expect((await filesUploadedBy(manager, own, house.person('companyRep').id, [sha256Of(photo)])).size).toBe(0);
    expect((await filesUploadedBy(manager, foreign, house.person('welder').id, [sha256Of(photo)])).size).toBe(0);
  });

  test('five times at once is one file', async () => {
    const bytes = aPng(31, 17);
    const answers = await Promise.all(Array.from({ length: 5 }, () => put('welder', own, bytes, 'image/png')));
    expect(answers.map((answer) => answer.status)).toEqual([200, 200, 200, 200, 200]);
    expect(stored().filter((name) => name === sha256Of(bytes))).toHaveLength(1);
  });

  test('under a hash that is not its own is refused and leaves nothing', async () => {
    const before = stored();
    const answer = await put('welder', own, photo, 'image/jpeg', 'a'.repeat(64)).expect(422);
    expect(answer.body).toMatchObject({
      code: 'file.hash-mismatch',
      detail: expect.stringContaining('changed on its way'),
    });
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(stored()).toEqual(before);
  });

  test('that is hostile gets a plain message each time and leaves nothing', async () => {
    const before = stored();
    for (const { name, bytes, code } of hostileFiles) {
      const answer = await put('welder', own, bytes);
      expect([name, answer.status, answer.body.code]).toEqual([name, code === 'photo.too-large' ? 413 : 422, code]);
      expect(answer.body.detail).toMatch(/^[A-Z].*\.$/);
    }
    expect(stored()).toEqual(before);
  });

  test('as something else than bytes is refused by its type', async () => {
    await as('welder').put(addressOf(own, photo)).send({ photo: 'x' }).expect(415);
    await as('welder').put(addressOf(own, photo)).set('Content-Type', 'text/html').send('<html>').expect(415);
    await as('welder')
      .put(addressOf(own, photo))
      .set({ 'Content-Type': 'image/jpeg', 'Content-Encoding': 'gzip' })
      .send(photo)
      .expect(415);
  });

  test('of a recorder is taken as text', async () => {
    const bytes = Buffer.from('time,psi\n03:10:05,2000\n03:10:06,1999\n');
    const answer = await put('welder', own, bytes, 'text/csv').expect(200);
    expect(answer.body).toMatchObject({ type: 'text/csv', width: null, height: null });
    const read = await as('companyRep').get(addressOf(own, bytes)).expect(200);
    expect(read.headers['content-disposition']).toMatch(/^attachment; filename="[0-9a-f]{16}\.csv"$/);
  });

  test('that breaks off in the middle leaves nothing', async () => {
    const before = stored();
    const server = house.app.listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
    const signedIn = await request(server).post('/api/session').send(signInOf('welder'));
    const Cookie = String(signedIn.headers['set-cookie']).split(';')[0];
    await new Promise<void>((resolve) => {
      const { port } = server.address() as AddressInfo;
      const headers = { 'Content-Type': 'image/jpeg', 'Content-Length': '100000', Cookie };
      const sending = http.request({ port, host: '127.0.0.1', method: 'PUT', path: addressOf(own, photo), headers });
      sending.on('error', () => resolve());
      sending.write(photo, () => setTimeout(() => sending.destroy(new Error('no signal')), 50));
    });
    await expect.poll(stored).toEqual(before);
    await new Promise((resolve) => server.close(resolve));
  });

  test('too often in ten minutes is put off, and goes on afterwards', async () => {
    await put('welder', own, photo).expect(200);
    const { owner } = house.database;
    await owner.query('UPDATE upload_counts SET files = ?', [UPLOADS_PER_WINDOW]);
    const answer = await put('welder', own, photo).expect(429);
    expect(answer.body.code).toBe('file.too-often');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    house.clock.advance(minutes(10));
    await put('welder', own, photo).expect(200);
  });
});

const signInOf = (key: DemoKey) => ({ email: house.person(key).email, password: house.person(key).password });

describe('who may', () => {
  test.each([
    ['welder', 200, 200],
    ['companyRep', 403, 200],
    ['coordinator', 403, 200],
    ['secondWelder', 404, 404],
    ['auditor', 404, 404],
  ] as const)('%s on a running job: send %i, read %i', async (key, sending, reading) => {
    await put('welder', own, photo).expect(200);
    await put(key, own, photo).expect(sending);
    await as(key).get(addressOf(own, photo)).expect(reading);
  });

  test('nobody without a session', async () => {
    await house.guest().put(addressOf(own, photo)).set('Content-Type', 'image/jpeg').send(photo).expect(401);
    await house.guest().get(addressOf(own, photo)).expect(401);
  });

  test('on a foreign job and on none the answer is the same', async () => {
    for (const job of [foreign, house.deps.ids(), 'not-an-id']) {
      const answer = await put('welder', job, photo).expect(404);
      expect(answer.body.code).toBe('permission.not-found');
      await as('welder').get(addressOf(job, photo)).expect(404);
    }
  });

  test('a file of another job is not found by its hash', async () => {
    await put('welder', own, photo).expect(200);
    await join(foreign, 'welder', 'welder');
    await as('welder').get(addressOf(foreign, photo)).expect(404);
  });

  test.each(['..%2F..%2Fetc%2Fpasswd', 'A'.repeat(64), `${'a'.repeat(64)}%0A`, 'a'.repeat(63)])(
    'an address that is no hash (%s) is nowhere',
    async (sha256) => {
      await as('welder').get(`/api/jobs/${own}/files/${sha256}`).expect(404);
      await as('welder')
        .put(`/api/jobs/${own}/files/${sha256}`)
        .set('Content-Type', 'image/jpeg')
        .send(photo)
        .expect(404);
    },
  );
});

describe('reading a file', () => {
  test('gives the original bytes under headers that let it be nothing but a picture', async () => {
    await put('welder', own, photo).expect(200);
    const answer = await as('companyRep').get(addressOf(own, photo)).buffer(true).expect(200);
    expect(Buffer.compare(answer.body as Buffer, photo)).toBe(0);
    expect(answer.headers).toMatchObject({
      'content-type': 'image/jpeg',
      'content-length': String(photo.length),
      'content-security-policy': "sandbox; default-src 'none'",
      'x-content-type-options': 'nosniff',
      'cross-origin-resource-policy': 'same-origin',
      'content-disposition': `inline; filename="${sha256Of(photo).slice(0, 16)}.jpg"`,
      'cache-control': 'private, max-age=31536000, immutable',
    });
  });

  test('in HEIC comes with its own type', async () => {
    const bytes = aHeic();
    await put('welder', own, bytes, 'image/heic').expect(200);
    const answer = await as('welder').get(addressOf(own, bytes)).expect(200);
    expect(answer.headers['content-type']).toBe('image/heic');
  });

  test('again, when it is known, sends no bytes', async () => {
    await put('welder', own, photo).expect(200);
    const answer = await as('welder')
      .get(addressOf(own, photo))
      .set('If-None-Match', `"${sha256Of(photo)}"`)
      .expect(304);
    expect(answer.headers['content-security-policy']).toBe("sandbox; default-src 'none'");
    const head = await as('welder').head(addressOf(own, photo)).expect(200);
    expect(head.headers['content-length']).toBe(String(photo.length));
  });
});
