import type { FieldDefinition, GroupDefinition } from '../../../shared/hold-points/definition';
import { siteGroups } from '../../../shared/hold-points/site';
import { hasWords } from '../../../shared/locales/say';
import en from '../../../shared/locales/en';
import type { AnyPoint } from './any-point';

/** Rows share their words; ports, of which each has its own, do not. */
const withoutRow = (key: string): string => key.replace('.#.', '.');

const isNumber = (choice: string): boolean => /^\d+$/.test(choice);

const choicesOf = ({ key, of }: FieldDefinition): string[] =>
  of.type === 'choice' ? of.choices.map((choice) => `${withoutRow(key)}.${choice}`) : [];

const wordsOf = (groups: readonly GroupDefinition[]): [area: string, names: string[]][] => {
  const fields = groups.flatMap((group) => group.fields);
  return [
    ['groups', groups.map((group) => group.key)],
    ['fields', fields.map((field) => withoutRow(field.key))],
    ['choices', fields.flatMap(choicesOf)],
  ];
};

/** Every key that one point's definition makes: of its form, its photos, its work, its cautions and what it works out. */
export const pointKeys = ({ review }: AnyPoint): string[] => {
  const kind = `points.${review.definition.kind}`;
  const named: [string, readonly string[]][] = [
    ...wordsOf(review.groups),
    ['shots', review.shots.map((shot) => shot.key)],
    ['acts', review.acts.map((act) => act.key)],
    ['statements', review.statements],
    ['cautions', review.cautions],
    ['computed', review.computed.map((one) => one.key)],
  ];
  return named
    .flatMap(([area, names]) => names.map((name) => `${kind}.${area}.${name}`))
    .filter((key) => hasWords(en, key) || !isNumber(key.split('.').at(-1) ?? ''));
};

/** Readings of the site have their words at the first point, and the look at a hot joint on the job's page. */
export const siteKeys = (): string[] =>
  wordsOf(siteGroups()).flatMap(([area, names]) =>
    names.map((name) => {
      const first = `points.hot-work-clearance.${area}.${name}`;
      return hasWords(en, first) ? first : `job.site${area.charAt(0).toUpperCase()}${area.slice(1)}.${name}`;
    }),
  );
