import { Readable } from 'node:stream';
import { createHash } from 'node:crypto';
import type { Command, CommandOf, CommandType, Shown } from '../../shared/contracts/commands';
import type { Planning } from '../../shared/contracts/jobs';
import { ownerOf } from '../../shared/hold-points/points';
import { asEvent } from '../../shared/job/as-event';
import { contentHashOf, jobContentHashOf } from '../../shared/job/content';
import { concessionTotal } from '../../shared/job/decide-failure';
import { evolve } from '../../shared/job/evolve';
import { currentPoint, findPoint } from '../../shared/job/points';
import { reviewPoint } from '../../shared/job/review';
import type { JobState } from '../../shared/job/state';
import { sha256 } from '../ledger/sha256';
import { readLinks } from '../ledger/read-links';
import { upcast } from '../ledger/upcast';
import type { AppDeps } from '../services/deps';
import { planJob } from '../services/plan-job';
import { commitCommand } from '../services/record-command';
import { jobFileRegister } from '../services/register-job-file';
import { loadAccount } from '../services/signed-in-account';
import { storeFile } from '../services/store-file';
import { makeStorage } from '../storage/make-storage';
import { nextStep } from './good-readings/next-step';
import type { Step } from './good-readings/next-step';
import { demoPeopleByKey } from './people';
import type { DemoKey } from './people';
import { pictureOf } from './pictures/scenes';
import { demoPlanning } from './planning';

const shown: Shown = { language: 'en', units: 'imperial' };

/** A job of the invented scenario, moved through the server's own commands under a clock of the past. */
export class DemoJob {
  private pictures = 0;

  private constructor(
    private readonly deps: AppDeps,
    private now: number,
    public state: JobState,
  ) {}

  /** Plans a job at a time of the past. */
  static async plan(deps: AppDeps, at: Date, own: Partial<Planning> = {}): Promise<DemoJob> {
    const coordinator = await loadAccount(deps.dataSource, demoPeopleByKey.coordinator.id);
    if (!coordinator) throw new Error('the demo has no coordinator');
    const then = { ...deps, clock: () => at };
    const answer = await planJob(then, coordinator, demoPlanning(deps.ids(), at, own));
    if (!answer.ok) throw new Error(`the demo's plan was not taken: ${JSON.stringify(answer)}`);
    const [first] = await readLinks(deps.dataSource.manager, answer.id);
    if (!first) throw new Error("the demo's job has no first event");
    return new DemoJob(deps, at.getTime(), evolve(answer.id, null, upcast(first)));
  }

  private get at(): string {
    return new Date(this.now).toISOString();
  }

  wait(minutes: number): this {
    this.now += minutes * 60_000;
    return this;
  }

  /** Gives a command as one of the demo's people; signatures need no PIN here, for nobody types one. */
  async give<T extends CommandType>(key: DemoKey, type: T, body: CommandOf<T>['body']): Promise<this> {
    const actor = await loadAccount(this.deps.dataSource, demoPeopleByKey[key].id);
    if (!actor) throw new Error(`the demo has no ${key}`);
    const clock = { deviceAt: this.at, offsetMs: 0, doubtMs: 120 };
    const command = { id: this.deps.ids(), type, basedOn: this.state.eventCount, clock, body } as Command;
    const then = { dataSource: this.deps.dataSource, clock: () => new Date(this.now) };
    const answer = await commitCommand(then, { actor, jobId: this.state.id, command });
    if (!answer.ok) throw new Error(`the demo's ${type} was not taken: ${JSON.stringify(answer)}`);
    for (const event of answer.events) this.state = evolve(this.state.id, this.state, asEvent(event));
    return this;
  }

  private async photograph(shot: string): Promise<string> {
    const { plan } = this.state;
    this.pictures += 1;
    const bytes = pictureOf(shot, {
      seed: this.pictures,
      temperatureF: String(Number(plan.procedure.preheatF.min) + 20),
      pressurePsi: plan.terms.test.pressurePsi,
      fullScalePsi: 3000,
      headSize: plan.head.nominalSize.replace(/\D.*$/, ''),
      ratedPsi: String(plan.head.ratedPressurePsi),
    });
    const hash = createHash('sha256').update(bytes).digest('hex');
    const stored = await storeFile(
      {
        storage: makeStorage(this.deps.config, this.deps.ids),
        register: jobFileRegister(this.deps.dataSource, () => new Date(this.now)),
      },
      {
        jobId: this.state.id,
        sha256: hash,
        kind: 'photo',
        stream: Readable.from([bytes]),
        declaredLength: bytes.length,
        accountId: demoPeopleByKey.welder.id,
      },
    );
    if (!stored.ok) throw new Error(`the demo's picture of ${shot} was not taken: ${stored.code}`);
    return hash;
  }

  private async take(point: string, step: Step): Promise<void> {
    if (step.do === 'record') await this.give('welder', 'record', { point: step.point, entries: step.entries });
    else if (step.do === 'add-photo') {
      // these pictures are small: each is its own preview
      const sha256 = await this.photograph(step.shot);
      const file = { sha256, previewSha256: sha256, width: 1, height: 1 };
      await this.give('welder', 'add-photo', { point, shot: step.shot, ...file, takenAt: this.at });
    } else await this.give('welder', step.do, { point, act: step.act });
    this.wait(step.minutes);
  }

  /** Records what the open point asks for; `until` ends before a step. */
  async fill(until: (step: Step) => boolean = () => false): Promise<this> {
    for (;;) {
      const point = currentPoint(this.state);
      const step = point && nextStep(this.state, point, this.at);
      if (!point || !step || until(step)) return this;
      await this.take(point.place.id, step);
    }
  }

  signing(point: string): { contentHash: string; shown: Shown } {
    const found = findPoint(this.state, point);
    if (!found) throw new Error(`the demo's job has no ${point}`);
    return { contentHash: contentHashOf(this.state, found, shown, sha256), shown };
  }

  async present(): Promise<this> {
    const point = currentPoint(this.state)?.place.id ?? '';
    await this.give('welder', 'present', { point, ...this.signing(point) });
    return this.wait(4);
  }

  async release(): Promise<this> {
    const point = currentPoint(this.state);
    if (!point) return this;
    const owner = ownerOf[point.place.kind] === 'tool_pusher' ? 'toolPusher' : 'companyRep';
    const statements = [...reviewPoint(this.state, point).statements];
    const { id } = point.place;
    await this.give(owner, 'release', { point: id, statements, ...this.signing(id) });
    return this.wait(3);
  }

  /** Carries the job on until this point is open; without one until all are released. */
  async walkTo(point: string | null): Promise<this> {
    for (let open = currentPoint(this.state); open && open.place.id !== point; open = currentPoint(this.state)) {
      if (open.status === 'open') await (await this.fill()).present();
      await this.release();
    }
    return this;
  }

  seal(): Promise<this> {
    const contentHash = jobContentHashOf(this.state, shown, sha256);
    return this.give('companyRep', 'seal', { concessions: concessionTotal(this.state), contentHash, shown });
  }
}
