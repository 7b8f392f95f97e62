import type { PointContext } from './context';
import type { FieldDefinition, GroupDefinition } from './definition';
import { quantity } from './fields';
import { commonPractice, judgeFact } from './judging';
import { stringHeightOf } from './takeoff-of';
import type { Verdict } from './verdict';

const atStakes = (): FieldDefinition[] =>
  ['a', 'b'].map((stake) => quantity(`string.${stake}`, 'in', { likely: { min: -12, max: 72 } }));

/** The string over the cellar: its height above ground at both stakes, and where the casing stands between them. */
export const stringGroup = (context: PointContext): GroupDefinition => ({
  key: 'string',
  fields: [
    ...atStakes(),
    quantity('string.apart', 'in', { required: false, likely: { min: 48, max: 600 } }),
    quantity('string.from-a', 'in', {
      required: false,
      likely: { min: 12, max: context.number('string.apart') ?? 600 },
    }),
  ],
});

/** The string again before the cut is measured from it: it may have been walked into since. */
export const stringAgainGroup = (): GroupDefinition => ({ key: 'string-again', fields: atStakes() });

/** Without a height of the string nothing can be measured from it: a stop until the numbers are set right. */
export const judgeStringHeight = (context: PointContext): Verdict[] => {
  const read = context.number('string.a') !== undefined && context.number('string.b') !== undefined;
  return judgeFact(context, {
    limit: 'string-height',
    kind: 'stop',
    about: ['string.a', 'string.b', 'string.apart', 'string.from-a'].filter((field) => context.read(field)),
    source: commonPractice,
    holds: read ? stringHeightOf(context) !== undefined : undefined,
  });
};
