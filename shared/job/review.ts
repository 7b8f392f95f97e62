import { contextOf, type PointContext } from '../hold-points/context';
import type { ActDefinition, FieldDefinition, GroupDefinition, ShotDefinition } from '../hold-points/definition';
import { templateKey } from '../hold-points/definition';
import { definitionOf } from '../hold-points/definitions';
import { generalVerdicts } from '../hold-points/general';
import { rowPrefix, rowsAsked } from '../hold-points/rows';
import type { Computed, Verdict } from '../hold-points/verdict';
import type { Concession, JobState, Photo, PointState } from './state';

/** A field as it stands in the form: repeated fields carry their row's number. */
export interface PlacedField extends FieldDefinition {
  group: string;
  row: number | null;
}

/** Everything that can be said about a point from its evidence alone: what is there, what is missing, what is outside. */
export interface PointReview {
  context: PointContext;
  definition: { kind: string; version: number };
  groups: GroupDefinition[];
  fields: PlacedField[];
  shots: ShotDefinition[];
  acts: ActDefinition[];
  cautions: string[];
  statements: readonly string[];
  computed: Computed[];
  verdicts: Verdict[];
  /** `field:…`, `shot:…`, `act:…` that must be there before it can be presented */
  missing: string[];
  /** outside and nobody can concede it */
  stops: Verdict[];
  /** outside, released only with a concession */
  holds: Verdict[];
  /** those of them that no valid concession covers */
  unconceded: Verdict[];
  /** concessions whose reading still stands */
  conceded: Concession[];
}

const rowKey = (key: string, row: number): string => key.replace('.#.', `.${row}.`);

const placeFields = (context: PointContext, groups: GroupDefinition[]): PlacedField[] =>
  groups.flatMap((group): PlacedField[] => {
    if (!group.rows) return group.fields.map((field) => ({ ...field, group: group.key, row: null }));
    const rows = rowsAsked(context.point.readings, rowPrefix(group), group.rows.min);
    return rows.flatMap((row) =>
      group.fields.map((field) => ({ ...field, key: rowKey(field.key, row), group: group.key, row })),
    );
  });

const standing = (photos: Photo[]): Photo[] => photos.filter((photo) => photo.setAside === null && !photo.late);

const missingOf = (
  point: PointState,
  context: PointContext,
  fields: PlacedField[],
  shots: ShotDefinition[],
  acts: ActDefinition[],
): string[] => [
  ...fields
    .filter((field) => field.required && context.read(field.key) === undefined)
    .map((field) => `field:${field.key}`),
  ...acts
    .filter((act) => act.required && !point.acts.some((run) => run.act === act.key && run.ended))
    .map((act) => `act:${act.key}`),
  ...point.acts.filter((run) => !run.ended).map((run) => `act-end:${run.act}`),
  ...shots
    .filter((shot) => shot.required && !standing(point.photos).some((photo) => photo.shot === shot.key))
    .map((shot) => `shot:${shot.key}`),
];

const sameBasis = (a: readonly string[], b: readonly string[]): boolean =>
  a.length === b.length && [...a].sort().join() === [...b].sort().join();

const sameJudgement = (a: Verdict, b: Verdict): boolean =>
  a.measured?.value === b.measured?.value && a.allowed?.min === b.allowed?.min && a.allowed?.max === b.allowed?.max;

/**
 * Whether a concession still stands for this verdict: it binds the readings that it was judged on, what they came to,
 * and one limit as it was then.
 */
export const covers = (concession: Pick<Concession, 'limit' | 'basis' | 'verdict'>, verdict: Verdict): boolean =>
  concession.limit === verdict.limit &&
  sameBasis(concession.basis, verdict.basis) &&
  sameJudgement(concession.verdict, verdict);

/** Judges a point by its evidence; no clock, so that the same content always gives the same review. */
export const reviewPoint = (state: JobState, point: PointState): PointReview => {
  const context = contextOf(state, point);
  const definition = definitionOf(point.place.kind);
  const groups = definition.groups(context);
  const fields = placeFields(context, groups);
  const shots = definition.shots(context);
  const acts = definition.acts(context);
  const verdicts = [...definition.judge(context), ...generalVerdicts(context, fields)];
  const outside = verdicts.filter((verdict) => verdict.outcome === 'outside');
  const holds = outside.filter((verdict) => verdict.kind === 'hold');
  const conceded = point.concessions.filter((concession) => holds.some((verdict) => covers(concession, verdict)));
  return {
    context,
    definition: { kind: definition.kind, version: definition.version },
    groups,
    fields,
    shots,
    acts,
    cautions: definition.cautions(context),
    statements: definition.statements,
    computed: definition.compute(context),
    verdicts,
    missing: missingOf(point, context, fields, shots, acts),
    stops: outside.filter((verdict) => verdict.kind === 'stop'),
    holds,
    unconceded: holds.filter((verdict) => !conceded.some((concession) => covers(concession, verdict))),
    conceded,
  };
};

/** The definition of one field of a point, rows included; undefined when the point has no such field. */
export const fieldOf = (
  review: Pick<PointReview, 'groups'>,
  key: string,
): (FieldDefinition & { group: string }) | undefined => {
  const template = templateKey(key);
  for (const group of review.groups) {
    const row = /\.(\d+)\./.exec(key)?.[1];
    const match = group.fields.find((field) => field.key === key || (group.rows && field.key === template));
    if (!match) continue;
    // a row has one name: `007` would be another row 7
    const rowFits = row !== undefined && /^[1-9]\d*$/.test(row) && Number(row) <= (group.rows?.max ?? 0);
    if (group.rows && match.key !== key && !rowFits) return undefined;
    return { ...match, key, group: group.key };
  }
  return undefined;
};

/** Photos that count: not set aside, not late. */
export const standingPhotos = standing;
