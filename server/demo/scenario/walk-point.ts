import type { CommandOf, CommandType, RecordEntry, Shown } from '../../../shared/contracts/commands';
import { gasMinutesLeft } from '../../../shared/hold-points/gas';
import { ownerOf, type PointId, type PointKind } from '../../../shared/hold-points/points';
import { sitePoint } from '../../../shared/hold-points/site';
import type { PersonRef } from '../../../shared/job/actor';
import { findPoint } from '../../../shared/job/points';
import { reviewPoint, type PlacedField, type PointReview } from '../../../shared/job/review';
import type { JobState } from '../../../shared/job/state';
import type { Role } from '../../../shared/permissions/roles';
import { goodEntry } from './good-answers';

/** Whoever carries the scenario's commands to a job: in memory, over HTTP, or into the ledger of a demo. */
export interface Driver {
  state(): Promise<JobState>;
  /** milliseconds on the scenario's clock */
  now(): number;
  advance(minutes: number): void;
  give<T extends CommandType>(type: T, body: CommandOf<T>['body'], role: Role): Promise<void>;
  /** stores a picture for this shot and returns what `add-photo` names */
  photograph(point: PointId, shot: string): Promise<Omit<CommandOf<'add-photo'>['body'], 'point' | 'shot'>>;
  /** the hash that a signer of this point signs now */
  signing(point: PointId): Promise<{ contentHash: string; shown: Shown }>;
}

/** Answers that stand before the last act of a point begins; the others are given after it. */
const beforeLastAct: Partial<Record<PointKind, RegExp>> = {
  'height-takeoff': /^(nameplate|takeoff|socket|string|mark|plumb)\./,
  'seal-greased-and-checked': /^(direction-marked|seal\.(part|condition|sound)|grease)/,
  'preheat-reached': /^excavated-cracks/,
  'pass-inspected': /^(tacked|temps)\./,
  'pressure-test-held': /^(port-probed|fitting-in|exclusion|gauge|full-scale|volume)/,
};

/** How long each act takes in the scenario, minutes. */
const actMinutes: Record<string, number> = { 'conductor-cut': 12, 'rough-cut': 10, 'final-cut': 15, bevel: 12, 'set-head': 9, preheat: 35, tacks: 8, pass: 24, excavation: 20 };

const crewOf = (state: JobState): { first: PersonRef; second: PersonRef } => {
  const [first, second] = state.people.filter((person) => person.role === 'welder');
  const ref = (person: { accountId: string; name: string }): PersonRef => ({ accountId: person.accountId, name: person.name });
  if (!first) throw new Error('the scenario needs a welder');
  return { first: ref(first), second: second ? ref(second) : { accountId: null, name: 'P. Lind' } };
};

const reviewOf = async (driver: Driver, id: PointId): Promise<PointReview> => {
  const state = await driver.state();
  const point = findPoint(state, id);
  if (!point) throw new Error(`the job has no point ${id}`);
  return reviewPoint(state, point);
};

const wanting = (review: PointReview): PlacedField[] =>
  review.fields.filter((field) => review.missing.includes(`field:${field.key}`));

/** Answers every missing field that `which` picks, in as many rounds as answers open new fields. */
const answer = async (driver: Driver, id: PointId, which: (field: PlacedField) => boolean, own: Record<string, string>): Promise<void> => {
  for (let round = 0; round < 6; round++) {
    const review = await reviewOf(driver, id);
    const fields = wanting(review).filter(which);
    if (fields.length === 0) return;
    const crew = crewOf(review.context.state);
    const entries: RecordEntry[] = fields.map((field) => {
      const typed = own[field.key];
      return typed === undefined
        ? goodEntry(field, review, crew, driver.now())
        : { field: field.key, typed, unit: field.of.type === 'quantity' ? field.of.unit : null, measuredBy: field.confirms ? crew.second : crew.first };
    });
    await driver.give('record', { point: id, entries }, 'welder');
  }
};

/** Reads the air again when the last check will not last for another act. */
export const freshAir = async (driver: Driver, id: PointId): Promise<void> => {
  const review = await reviewOf(driver, id);
  const left = gasMinutesLeft(review.context, new Date(driver.now()).toISOString());
  if (left !== undefined && left > 15) return;
  const { state } = review.context;
  const first = state.points[0];
  if (!first) return;
  const air = reviewPoint(state, { ...first, release: null }).fields.filter((field) => field.key.startsWith('gas.'));
  const entries = air.map((field) => goodEntry(field, review, crewOf(state), driver.now()));
  await driver.give('record', { point: sitePoint, entries }, 'welder');
};

const act = async (driver: Driver, id: PointId, key: string): Promise<void> => {
  await driver.give('begin-act', { point: id, act: key }, 'welder');
  const { context } = await reviewOf(driver, id);
  driver.advance(key === 'pressure-test' ? context.state.plan.terms.test.holdMin + 6 : (actMinutes[key] ?? 10));
  await driver.give('end-act', { point: id, act: key }, 'welder');
};

/** Carries one point from open to complete: acts, readings and photos, all of it right but for what `own` says. */
export const recordPoint = async (driver: Driver, id: PointId, own: Record<string, string> = {}): Promise<void> => {
  const start = await reviewOf(driver, id);
  const before = beforeLastAct[start.context.point.place.kind];
  if (start.acts.some((one) => one.flame)) await freshAir(driver, id);
  const acts = start.acts.map((one) => one.key);
  for (const key of acts.slice(0, -1)) await act(driver, id, key);
  if (before) await answer(driver, id, (field) => before.test(field.key), own);
  for (const key of acts.slice(-1)) {
    if (start.acts.find((one) => one.key === key)?.flame) await freshAir(driver, id);
    await act(driver, id, key);
  }
  if (start.context.point.place.kind === 'cooled-to-touch') driver.advance(185);
  await answer(driver, id, () => true, own);
  for (const shot of (await reviewOf(driver, id)).shots)
    await driver.give('add-photo', { point: id, shot: shot.key, ...(await driver.photograph(id, shot.key)) }, 'welder');
  driver.advance(3);
};

export const presentPoint = async (driver: Driver, id: PointId): Promise<void> => {
  await driver.give('present', { point: id, ...(await driver.signing(id)) }, 'welder');
  driver.advance(4);
};

/** Releases a presented point as its owner, conceding first what is outside a hold. */
export const releasePoint = async (driver: Driver, id: PointId, reason = 'Seen on site; the operator accepts it as it stands.'): Promise<void> => {
  const review = await reviewOf(driver, id);
  if (review.unconceded.length > 0) {
    const items = review.unconceded.map(({ limit, basis }) => ({ limit, basis, reason }));
    await driver.give('concede', { point: id, items, ...(await driver.signing(id)) }, 'company_rep');
  }
  const role = ownerOf[review.context.point.place.kind];
  await driver.give('release', { point: id, statements: [...review.statements], ...(await driver.signing(id)) }, role);
  driver.advance(2);
};

/** One point from open to released. */
export const walkPoint = async (driver: Driver, id: PointId, own: Record<string, string> = {}): Promise<void> => {
  if ((await reviewOf(driver, id)).context.point.place.kind === 'seal-greased-and-checked' && (await driver.state()).direction === null)
    await driver.give('name-direction', { direction: 'mud-tanks', words: null }, 'tool_pusher');
  await recordPoint(driver, id, own);
  await presentPoint(driver, id);
  await releasePoint(driver, id);
};

/** Walks every point in order up to, and not including, `until`; without it the whole row. */
export const walkTo = async (driver: Driver, until: PointId | null): Promise<void> => {
  for (;;) {
    const state = await driver.state();
    const next = state.points.find((point) => point.status === 'open' && point.carriedInto === null);
    if (!next || next.place.id === until) return;
    await walkPoint(driver, next.place.id);
  }
};
