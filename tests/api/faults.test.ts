import { rmSync, writeFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDataSource } from '../../server/data-source';
import { migrateDatabase } from '../../server/migrate-database';
import { aJobOn, browserOf, sha256 } from '../support/a-job-on';
import { aRelay } from '../support/a-relay';
import { aJpeg } from '../support/images/make';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
});
afterAll(() => on.stop());

describe('the log', () => {
  it('holds no hash of a secret when the database refuses to keep it', async () => {
    await on.database.owner.query(
      "CREATE TRIGGER accounts_broken BEFORE UPDATE ON accounts FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'not now'",
    );
    const agent = await on.agentFor('secondToolPusher');
    const { password } = on.person('secondToolPusher');
    const pin = await agent.put('/api/account/pin').send({ password, pin: '803417' });
    const next = await agent
      .put('/api/account/password')
      .send({ current: password, next: 'a long enough way of saying' });
    await on.database.owner.query('DROP TRIGGER accounts_broken');
    expect([pin.status, next.status]).toEqual([500, 500]);
    const lines = on.logged.join('\n');
    expect(lines).toContain('not now');
    expect(lines).not.toContain('$argon2id');
    expect(lines).not.toContain('803417');
  });
});

describe('a database that goes away in the middle of commands', () => {
  it('answers 503 with when to come again, loses nothing and recovers by itself', async () => {
    const relay = await aRelay(on.database.config.database.port);
    const away = await startTestApp({}, relay.port);
    const own = await aJobOn(away);
    const commands = Array.from({ length: 12 }, (_, index) =>
      own.command('hand-over', { line: `Line ${index}`, to: null }),
    );
    await browserOf(away, 'welder');
    const sent = commands.map((command) => own.post('welder', command));
    await new Promise((resolve) => setTimeout(resolve, 25));
    await relay.cut();
    for (const answer of await Promise.all(sent)) {
      expect([200, 503], JSON.stringify(answer.body)).toContain(answer.status);
      if (answer.status === 503) expect(answer.headers['retry-after']).toBe('2');
    }
    await relay.mend();
    for (const command of commands) expect((await own.post('welder', command)).status).toBe(200);
    own.events = [];
    await own.refresh();
    expect(own.events.filter((event) => event.type === 'shift-handed-over')).toHaveLength(12);
    await away.stop();
    await relay.cut();
  });
});

describe('a clock of the server that goes back', () => {
  it('keeps sessions, locks and order as they are', async () => {
    const own = await aJobOn(on);
    const agent = await on.agentFor('welder');
    await own.do('welder', 'hand-over', { line: 'Before', to: null });
    on.clock.advance(-3_600_000);
    await agent.get('/api/session').expect(200);
    await own.do('welder', 'hand-over', { line: 'After', to: null });
    await own.upload();
    await on.agentFor('companyRep');
    on.clock.advance(3_600_000);
    expect(own.events.map((event) => event.type).slice(-2)).toEqual(['shift-handed-over', 'shift-handed-over']);
    await own.do('companyRep', 'call-off', { reason: 'The well was plugged', ...own.signingJob() });
    const packet = await (await browserOf(on, 'companyRep')).get(`/api/packets/${own.id}`).expect(200);
    expect(packet.body.verification.holds).toBe(true);
  });
});

describe('a folder for files', () => {
  it('that is gone is made again; one that is none fails in plain words and leaves commands alone', async () => {
    const own = await aJobOn(on);
    const { uploadsDir } = on.database.config;
    rmSync(uploadsDir, { recursive: true, force: true });
    await own.upload();
    rmSync(uploadsDir, { recursive: true, force: true });
    writeFileSync(uploadsDir, 'no folder');
    const bytes = aJpeg(91, 17);
    const put = (await browserOf(on, 'welder')).put(`/api/jobs/${own.id}/files/${sha256(bytes)}`);
    const answer = await put.set('Content-Type', 'image/jpeg').send(bytes);
    expect([answer.status, answer.body.code]).toEqual([500, 'server.failed']);
    expect(JSON.stringify(answer.body)).not.toContain(uploadsDir);
    await own.do('welder', 'hand-over', { line: 'All well', to: null });
    rmSync(uploadsDir);
    await own.upload();
  });
});

// The last one: it empties the database.
describe('two processes that start at once', () => {
  it('bring the tables up to date one after the other', async () => {
    const { owner, config } = on.database;
    for (const _ of owner.migrations) await owner.undoLastMigration();
    const second = await makeDataSource(config, 'owner').initialize();
    try {
      await Promise.all([owner, second].map((one) => migrateDatabase(one, config.database.user)));
      const done = await owner.query<{ name: string }[]>('SELECT name FROM migrations ORDER BY id');
      expect(done.map((each) => each.name)).toEqual(owner.migrations.map((each) => each.name));
    } finally {
      await second.destroy();
    }
  });
});
