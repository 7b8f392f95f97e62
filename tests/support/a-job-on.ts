import { createHash } from 'node:crypto';
import type { Response } from 'supertest';
import { v7 } from 'uuid';
import type { DemoKey } from '../../server/demo/people';
import { signedCommands } from '../../shared/contracts/commands';
import type { Command, CommandOf, CommandType, Shown } from '../../shared/contracts/commands';
import type { Planning, WireEvent } from '../../shared/contracts/jobs';
import { ownerOf } from '../../shared/hold-points/points';
import { asEvent } from '../../shared/job/as-event';
import { contentHashOf, jobContentHashOf } from '../../shared/job/content';
import { concessionTotal } from '../../shared/job/decide-failure';
import type { JobEvent } from '../../shared/job/events';
import { foldEvents } from '../../shared/job/evolve';
import { currentPoint, findPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import type { JobState, PointState } from '../../shared/job/state';
import { aPlanning } from './a-planning';
import { nextStep } from './good-readings';
import { aJpeg } from './images/make';
import type { Agent, TestApp } from './test-app';
import { minutes } from './test-clock';

export const sha256 = (data: string | Buffer): string => createHash('sha256').update(data).digest('hex');
export const shown: Shown = { language: 'en', units: 'imperial' };

const agents = new WeakMap<TestApp, Map<DemoKey, Promise<Agent>>>();

/** The browser of a demo person in this app, signed in once. */
export function browserOf(on: TestApp, key: DemoKey): Promise<Agent> {
  const known = agents.get(on) ?? new Map<DemoKey, Promise<Agent>>();
  agents.set(on, known);
  const agent = known.get(key) ?? on.agentFor(key);
  known.set(key, agent);
  return agent;
}

interface Sending {
  /** the command's id, when another than a new one */
  id?: string;
  /** secrets beside it; a signed command gets the person's PIN unless something else is said */
  signing?: { pin: string; password?: string } | null;
}

/** A job on a running server, moved over HTTP as phones and desks move it. */
export class JobOn {
  events: JobEvent[] = [];
  private photos = 0;

  constructor(
    readonly on: TestApp,
    readonly id: string,
  ) {}

  get state(): JobState {
    const state = foldEvents(this.id, this.events);
    if (!state) throw new Error('the job has no events yet');
    return state;
  }

  point(id: string): PointState {
    const point = findPoint(this.state, id);
    if (!point) throw new Error(`no point ${id}`);
    return point;
  }

  private take(events: WireEvent[]): void {
    for (const event of events) {
      if (event.seq === this.events.length + 1) this.events.push(asEvent(event));
    }
  }

  /** Fetches what others have done. */
  async refresh(): Promise<this> {
    const coordinator = await browserOf(this.on, 'coordinator');
    const answer = await coordinator.get(`/api/jobs/${this.id}/events?after=${this.events.length}`).expect(200);
    this.take((answer.body as { events: WireEvent[] }).events);
    return this;
  }

  command<T extends CommandType>(type: T, body: CommandOf<T>['body'], id = v7()): Command {
    const clock = { deviceAt: this.on.clock().toISOString(), offsetMs: 0, doubtMs: 200 };
    return { id, type, basedOn: this.events.length, clock, body } as Command;
  }

  /** Posts a command as it is. */
  async post(key: DemoKey, command: Command, signing: Sending['signing'] = undefined): Promise<Response> {
    const agent = await browserOf(this.on, key);
    const usual = signedCommands.includes(command.type) ? { pin: this.on.person(key).pin } : undefined;
    const beside = signing === undefined ? usual : (signing ?? undefined);
    const answer = await agent
      .post(`/api/jobs/${this.id}/commands`)
      .send({ command, ...(beside && { signing: beside }) });
    if (answer.status === 200) this.take((answer.body as { events: WireEvent[] }).events);
    return answer;
  }

  send<T extends CommandType>(key: DemoKey, type: T, body: CommandOf<T>['body'], how: Sending = {}): Promise<Response> {
    return this.post(key, this.command(type, body, how.id), how.signing);
  }

  /** Like `send`, but anything but 200 fails the test and says why. */
  async do<T extends CommandType>(key: DemoKey, type: T, body: CommandOf<T>['body']): Promise<this> {
    const answer = await this.send(key, type, body);
    if (answer.status !== 200) throw new Error(`${type}: ${answer.status} ${JSON.stringify(answer.body)}`);
    return this;
  }

  signing(point: string): { contentHash: string; shown: Shown } {
    return { contentHash: contentHashOf(this.state, this.point(point), shown, sha256), shown };
  }

  signingJob(): { contentHash: string; shown: Shown } {
    return { contentHash: jobContentHashOf(this.state, shown, sha256), shown };
  }

  /** Sends a small real photo, as the welder does. */
  async upload(key: DemoKey = 'welder'): Promise<string> {
    this.photos += 1;
    const bytes = aJpeg(40 + this.photos, 30);
    const agent = await browserOf(this.on, key);
    const address = `/api/jobs/${this.id}/files/${sha256(bytes)}`;
    await agent.put(address).set('Content-Type', 'image/jpeg').send(bytes).expect(200);
    return sha256(bytes);
  }

  async addPhoto(point: string, shot: string): Promise<this> {
    const photo = { sha256: await this.upload(), previewSha256: null, width: 1, height: 1, takenAt: null };
    return this.do('welder', 'add-photo', { point, shot, ...photo });
  }

  /** Records all that the open point asks for, within limits. */
  async fill(): Promise<this> {
    for (let steps = 0; steps < 80; steps += 1) {
      const point = currentPoint(this.state);
      const step = point && nextStep(this.state, point, this.on.clock().toISOString());
      if (!point || !step) return this;
      const id = point.place.id;
      if (step.do === 'record') await this.do('welder', 'record', { point: step.point, entries: step.entries });
      else if (step.do === 'add-photo') await this.addPhoto(id, step.shot);
      else await this.do('welder', step.do, { point: id, act: step.act });
      this.on.clock.advance(minutes(step.minutes));
    }
    throw new Error('the open point never became complete');
  }

  async present(): Promise<this> {
    const id = currentPoint(this.state)?.place.id ?? '';
    return this.do('welder', 'present', { point: id, ...this.signing(id) });
  }

  releaseBody(point: string): CommandOf<'release'>['body'] {
    const statements = [...reviewPoint(this.state, this.point(point)).statements];
    return { point, ...this.signing(point), statements };
  }

  async release(): Promise<this> {
    const point = currentPoint(this.state);
    if (!point) throw new Error('nothing is left to release');
    const owner = ownerOf[point.place.kind] === 'tool_pusher' ? 'toolPusher' : 'companyRep';
    return this.do(owner, 'release', this.releaseBody(point.place.id));
  }

  /** Carries the job on, everything within limits, until this point is open; without one until all are released. */
  async walkTo(point: string | null): Promise<this> {
    if (!this.state.direction) await this.do('toolPusher', 'name-direction', { direction: 'mud-tanks', words: null });
    for (let open = currentPoint(this.state); open && open.place.id !== point; open = currentPoint(this.state)) {
      if (open.status === 'open') await (await this.fill()).present();
      await this.release();
    }
    if (point !== null && currentPoint(this.state)?.place.id !== point)
      throw new Error(`the job never came to ${point}`);
    return this;
  }

  async seal(): Promise<this> {
    return this.do('companyRep', 'seal', { concessions: concessionTotal(this.state), ...this.signingJob() });
  }
}

/** Plans a job over HTTP and follows it. */
export async function aJobOn(on: TestApp, own: Partial<Planning> = {}): Promise<JobOn> {
  const coordinator = await browserOf(on, 'coordinator');
  const answer = await coordinator.post('/api/jobs').send(aPlanning(on.clock(), own));
  if (answer.status !== 201) throw new Error(`planning: ${answer.status} ${JSON.stringify(answer.body)}`);
  return new JobOn(on, (answer.body as { id: string }).id).refresh();
}

/** Carries a job to this point, open, over HTTP. */
export const walkTo = (job: JobOn, point: string | null): Promise<JobOn> => job.walkTo(point);
