import { createHash } from 'node:crypto';
import type { Command, CommandOf, CommandType, Shown } from '../../shared/contracts/commands';
import type { Times } from '../../shared/job/actor';
import { contentHashOf, jobContentHashOf } from '../../shared/job/content';
import { decide } from '../../shared/job/decide';
import type { Decision, JobActor } from '../../shared/job/decision';
import { evolve } from '../../shared/job/evolve';
import type { JobEvent } from '../../shared/job/events';
import type { JobPlan } from '../../shared/job/plan';
import { findPoint } from '../../shared/job/points';
import type { JobState, PointState } from '../../shared/job/state';
import type { Role } from '../../shared/permissions/roles';
import { aPlan } from './a-plan';

export const hash = (text: string): string => createHash('sha256').update(text).digest('hex');
export const shown: Shown = { language: 'en', units: 'imperial' };

/** An id that counts up: tests are the same every time. */
export const idNumber = (n: number): string => `0190a000-0000-7000-8000-${n.toString(16).padStart(12, '0')}`;

/** A job in memory, driven by commands as server and phone drive it. Time stands still until a test moves it. */
export class TestJob {
  state: JobState | null = null;
  readonly events: JobEvent[] = [];
  readonly id = idNumber(1);
  private ids = 1000;
  constructor(
    readonly plan: JobPlan = aPlan(),
    public now = Date.parse('2026-09-14T06:00:00.000Z'),
  ) {}

  get job(): JobState {
    if (!this.state) throw new Error('the job is not planned yet');
    return this.state;
  }

  point(id: string): PointState {
    const point = findPoint(this.job, id);
    if (!point) throw new Error(`no point ${id}`);
    return point;
  }

  minutes(count: number): this {
    this.now += count * 60_000;
    return this;
  }

  times(): Times {
    const at = new Date(this.now).toISOString();
    return { device: at, corrected: at, received: at, doubtMs: 200 };
  }

  /** The person of the plan with this role, the n-th one. */
  person(role: Role, n = 0): JobActor {
    const person = (this.state?.people ?? this.plan.people).filter((one) => one.role === role)[n];
    if (!person) throw new Error(`nobody is ${role}`);
    return { accountId: person.accountId, name: person.name, roles: [role] };
  }

  command<T extends CommandType>(type: T, body: CommandOf<T>['body']): Command {
    const at = new Date(this.now).toISOString();
    const id = idNumber(this.ids++);
    return {
      id,
      type,
      basedOn: this.events.length,
      clock: { deviceAt: at, offsetMs: 0, doubtMs: 200 },
      body,
    } as Command;
  }

  /** Decides and, when accepted, applies. */
  try<T extends CommandType>(type: T, body: CommandOf<T>['body'], actor: JobActor): Decision {
    const decision = decide(this.state, this.command(type, body), actor, this.times(), hash);
    if (decision.ok) {
      for (const event of decision.events) {
        this.events.push(event);
        this.state = evolve(this.id, this.state, event);
      }
    }
    return decision;
  }

  /** Like `try`, but a refusal fails the test and says why. */
  do<T extends CommandType>(type: T, body: CommandOf<T>['body'], actor: JobActor): this {
    const decision = this.try(type, body, actor);
    if (!decision.ok) throw new Error(`${type} was refused: ${JSON.stringify(decision.refusal)}`);
    return this;
  }

  /** The code of the refusal; fails when it was accepted. */
  refused<T extends CommandType>(type: T, body: CommandOf<T>['body'], actor: JobActor): string {
    const decision = this.try(type, body, actor);
    if (decision.ok) throw new Error(`${type} was accepted`);
    return decision.refusal.code;
  }

  planned(): this {
    return this.do('plan-job', { plan: this.plan }, { ...this.person('coordinator'), roles: ['coordinator'] });
  }

  /** What signing this point is bound to as it stands. */
  signing(point: string): { contentHash: string; shown: Shown } {
    return { contentHash: contentHashOf(this.job, this.point(point), shown, hash), shown };
  }

  signingJob(): { contentHash: string; shown: Shown } {
    return { contentHash: jobContentHashOf(this.job, shown, hash), shown };
  }
}

export const aJob = (plan?: JobPlan): TestJob => new TestJob(plan).planned();
