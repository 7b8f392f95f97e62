import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { commandTypes } from '../../shared/contracts/commands';
import { aJobOn, browserOf, sha256 } from '../support/a-job-on';
import type { JobOn } from '../support/a-job-on';
import { aPlanning } from '../support/a-planning';
import { commandBodies } from '../support/command-bodies';
import { aJpeg } from '../support/images/make';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
let job: JobOn;
beforeAll(async () => {
  on = await startTestApp();
  job = await aJobOn(on);
});
afterAll(() => on.stop());

const clearance = 'hot-work-clearance';
const photo = aJpeg(60, 40);

describe('an address', () => {
  it('of a job in capitals names no job, for its files too', async () => {
    const welder = await browserOf(on, 'welder');
    const put = (id: string) =>
      welder
        .put(`/api/jobs/${id}/files/${sha256(photo)}`)
        .set('Content-Type', 'image/jpeg')
        .send(photo);
    expect((await put(job.id)).status).toBe(200);
    const shouted = job.id.toUpperCase();
    expect((await put(shouted)).status).toBe(404);
    const coordinator = await browserOf(on, 'coordinator');
    for (const path of [`files/${sha256(photo)}`, 'events', ''])
      expect((await coordinator.get(`/api/jobs/${shouted}/${path}`)).status).toBe(404);
    expect((await coordinator.get(`/api/packets/${shouted}/files/${sha256(photo)}`)).status).toBe(404);
  });

  it.each([
    ['/api/jobs?after=forged', 422],
    ['/api/jobs?after=zzzzzzzzzzz.01940000-0000-7000-8000-00000000dead', 422],
    ['/api/jobs?after=', 422],
    ['/api/jobs?after=1&after=2', 422],
    ['/api/jobs?after=m0000000.01940000-0000-7000-8000-00000000dead', 200],
    ['/api/packets?after=%27%20OR%201=1', 422],
    ['/api/packets?after[at]=1', 422],
    ['/api/packets?sort=search', 422],
    ['/api/packets?__proto__=1', 422],
    ['/api/packets?q=%00%F0%9F%94%A5%E2%80%AE', 200],
    ['/api/packets?q=%', 200],
    ['/api/packets?q=%5C%5C%25_%27%22%60;--', 200],
    ['/api/packets?q=a&q=b', 422],
  ])('%s is answered %i', async (path, status) => {
    const answer = await (await browserOf(on, 'coordinator')).get(path);
    expect(answer.status, JSON.stringify(answer.body)).toBe(status);
  });

  it.each(['-1', '1.5', 'NaN', '1e99', 'x', '1&after=2', '9007199254740993', '%00'])(
    'of events after %s is not understood',
    async (after) => {
      const answer = await (await browserOf(on, 'welder')).get(`/api/jobs/${job.id}/events?after=${after}`);
      expect(answer.status).toBe(422);
    },
  );
});

describe('a body', () => {
  const send = async (body: string, type = 'application/json') => {
    const welder = await browserOf(on, 'welder');
    return welder.post(`/api/jobs/${job.id}/commands`).set('Content-Type', type).send(body);
  };

  it.each([
    ['a long flat list', `{"command":[${'0,'.repeat(125_000)}0]}`],
    [
      'a long list in a command',
      JSON.stringify({ command: { type: 'record', body: { entries: new Array(40_000).fill(0) } } }),
    ],
    ['deep lists', `{"command":${'['.repeat(120_000)}${']'.repeat(120_000)}}`],
    ['a list', '[]'],
    ['a text', '"command"'],
    ['nothing', 'null'],
    ['a key that is a prototype', '{"command":{"type":"constructor","constructor":{"prototype":{"x":1}}}}'],
    ['a type that every object has', '{"command":{"type":"toString"}}'],
    ['a type that is no text', '{"command":{"type":{"toString":null}}}'],
    ['half a number', '{"command":1e}'],
    ['a number without end', '{"command":1e999}'],
    ['a mark of byte order', '\ufeff{"command":{}}'],
  ])('of %s is refused', async (_name, body) => {
    const answer = await send(body);
    expect([400, 422], JSON.stringify(answer.body)).toContain(answer.status);
  });

  it.each([
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
    'application/json; charset=latin1',
    'application/json; charset=utf-99',
    'application/vnd.api+json',
    'text/json',
    'application/json, text/plain',
    'nonsense',
  ])('of the type %s is refused', async (type) => {
    const answer = await send(JSON.stringify({ command: job.command('stop-work', { reason: 'Gas' }) }), type);
    expect([400, 415, 422], JSON.stringify(answer.body)).toContain(answer.status);
  });

  it.each(commandTypes)('of a %s command with one key too many is refused', async (type) => {
    const whole = job.command(type, commandBodies[type]);
    for (const command of [
      { ...whole, body: { ...whole.body, released: true } },
      { ...whole, actor: { accountId: v7() } },
      { ...whole, clock: { ...whole.clock, received: '2026-01-01T00:00:00Z' } },
    ]) {
      const answer = await send(JSON.stringify({ command }));
      expect(answer.status).toBe(422);
    }
  });
});

describe('a name that every object has', () => {
  const names = [
    'constructor',
    'valueof',
    'prototype',
    'rods.0.class',
    'rods.01.class',
    'rods.999999999.class',
    'rods.1.constructor',
    '..',
    '-',
    '.',
  ];

  it.each(names)('%s is no field, shot, act, group or limit', async (name) => {
    const own = await aJobOn(on);
    const sha = await own.upload();
    const bodies = [
      ['record', { point: clearance, entries: [{ field: name, typed: '1', unit: null, measuredBy: null }] }],
      ['record', { point: 'site', entries: [{ field: name, typed: '1', unit: null, measuredBy: null }] }],
      [
        'record',
        {
          point: clearance,
          entries: [{ field: 'gas.cellar.co', typed: '1', unit: name.slice(0, 12), measuredBy: null }],
        },
      ],
      [
        'add-photo',
        { point: clearance, shot: name, sha256: sha, previewSha256: null, width: 1, height: 1, takenAt: null },
      ],
      ['begin-act', { point: clearance, act: name }],
      ['end-act', { point: clearance, act: name }],
      ['strike-row', { point: clearance, group: name, row: 1, reason: 'Because' }],
      ['set-photo-aside', { point: clearance, photo: name, reason: 'Because' }],
      ['begin-act', { point: 'constructor', act: name }],
    ] as const;
    for (const [type, body] of bodies) {
      const answer = await own.send('welder', type, body as never);
      expect([409, 422], `${type} ${JSON.stringify(answer.body)}`).toContain(answer.status);
    }
    await (await own.fill()).present();
    const items = [{ limit: name, basis: [name], reason: 'Because' }];
    const concede = await own.send('companyRep', 'concede', { point: clearance, items, ...own.signing(clearance) });
    expect([409, 422]).toContain(concede.status);
    const release = await own.send('companyRep', 'release', { ...own.releaseBody(clearance), statements: [name] });
    expect([409, 422], JSON.stringify(release.body)).toContain(release.status);
  });
});

describe('a clock', () => {
  it.each([
    ['2026-12-01T12:00:00Z', Number.MAX_SAFE_INTEGER],
    ['2026-12-01T12:00:00Z', Number.MIN_SAFE_INTEGER],
    ['9999-12-31T23:59:59Z', 86_400_000],
    ['0000-01-01T00:00:00Z', -86_400_000],
    ['0000-01-01T00:00:00Z', 0],
    ['0001-01-01T00:00:00+23:59', 0],
    ['9999-12-31T23:59:59-23:59', null],
  ])('of %s and %s is refused, and never a failure', async (deviceAt, offsetMs) => {
    const own = await aJobOn(on);
    await own.fill();
    const command = own.command('present', { point: clearance, ...own.signing(clearance) });
    const answer = await own.post('welder', { ...command, clock: { deviceAt, offsetMs, doubtMs: 0 } });
    expect(answer.status, JSON.stringify(answer.body)).toBe(422);
    const desk = await (await browserOf(on, 'companyRep')).get('/api/desk');
    expect(desk.status).toBe(200);
  });
});

describe('numbers near their limits', () => {
  it('in terms are refused or kept, and the job can still be read', async () => {
    for (const value of ['-999999999.999999999', '999999999.999999999', '0', '-0', '0.000000001', '000000001']) {
      const own = await aJobOn(on);
      const { terms } = own.state.plan;
      const settings = Object.fromEntries(
        Object.keys(terms.settings).map((name) => [name, { value, source: 'common-practice' }]),
      ) as typeof terms.settings;
      for (const changed of [
        { ...terms, settings },
        { ...terms, targetHeightIn: value, standOffIn: value },
      ]) {
        const answer = await own.send('companyRep', 'change-terms', {
          terms: changed,
          reason: 'Another programme',
          ...own.signingJob(),
        });
        expect([200, 409, 422], `${value} ${JSON.stringify(answer.body)}`).toContain(answer.status);
        const set = await own.send('companyRep', 'set-again', {
          head: own.state.plan.head,
          targetHeightIn: value,
          reason: 'Set once more',
          ...own.signingJob(),
        });
        expect([200, 409, 422], `${value} ${JSON.stringify(set.body)}`).toContain(set.status);
      }
      const filled = await own.fill().catch((error: Error) => error.message);
      expect(String(filled)).not.toMatch(/: 5\d\d /);
    }
  });
});

describe('text', () => {
  it.each([
    ['NUL', 'a\u0000b'],
    ['right to left', '\u202e\u05d0\u05d1\u200f x'],
    ['emoji', '👩🏽‍🏭🔥'],
    ['combining', 'Z\u0351\u036b\u0343\u036a'],
    ['markup', '<script>alert(1)</script>&amp;'],
    ['a formula', '=1+1'],
    ['very long', '§'.repeat(2000)],
  ])('of %s is stored as typed', async (_name, reason) => {
    const own = await aJobOn(on);
    const answer = await own.send('welder', 'stop-work', { reason: `x${reason}`.slice(0, 2000) });
    expect(answer.status, JSON.stringify(answer.body)).toBe(200);
    expect(answer.body.events[0].body.reason).toBe(`x${reason}`.slice(0, 2000));
    const packet = await own.send('companyRep', 'call-off', {
      reason: `x${reason}`.slice(0, 2000),
      ...own.signingJob(),
    });
    expect(packet.status, JSON.stringify(packet.body)).toBe(200);
    const read = await (await browserOf(on, 'companyRep')).get(`/api/packets/${own.id}`).expect(200);
    expect(read.body.verification.holds).toBe(true);
  });
});

describe('one account', () => {
  it('is not reached, nor its tries counted anew, under another spelling of its address', async () => {
    const { email, password } = on.person('auditor');
    const spellings = [
      email.replace('a', 'á'),
      email.replace('@', '\u00ad@'),
      email.replace('e', 'é'),
      `${email}\u0000`,
    ];
    for (const spelled of spellings) {
      const answer = await on.guest().post('/api/session').send({ email: spelled, password });
      expect([spelled, answer.status]).toEqual([spelled, 401]);
    }
  });
});

describe('an id that something else bears', () => {
  it('is a command like any other, and nobody is given what it names', async () => {
    const own = await aJobOn(on);
    for (const id of [own.id, on.person('coordinator').id, own.state.plan.rig.id]) {
      const command = own.command('hand-over', { line: 'All well', to: null }, id);
      expect((await own.post('welder', command)).status).toBe(200);
    }
    const planning = aPlanning(on.clock());
    const coordinator = await browserOf(on, 'coordinator');
    await coordinator.post('/api/jobs').send(planning).expect(201);
    const taken = await own.post('coordinator', own.command('stop-work', { reason: 'Gas' }, planning.commandId));
    expect([taken.status, taken.body.code]).toEqual([422, 'command.id-reused']);
  });
});
