import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { choice, words } from './fields';
import { commonPractice, judgeFact, standard } from './judging';
import type { LimitKind, Verdict } from './verdict';

/** What a cleaned pass is looked over for. */
export const imperfections = ['porosity', 'slag', 'overlap', 'arc-strike', 'crack'] as const;
export type Imperfection = (typeof imperfections)[number];

/** Hours of the clock: 12 faces the V-door, clockwise seen from above. */
export const clockHours = ['12', '1', '2', '3', '4', '5', '6', '7', '8', '9', '10', '11'] as const;

/** When the look is taken: at a hot pass, which may be repaired there and then, or cold at the finished weld. */
export type Look = 'pass' | 'cold';

const at = (found: Imperfection, what: 'state' | 'clock' | 'how'): string => `look.${found}.${what}`;

/** A crack found cold is never put right on the spot: that is a repair round. */
const statesOf = (found: Imperfection, look: Look): readonly string[] =>
  found === 'crack' && look === 'cold' ? ['none', 'present'] : ['none', 'repaired', 'present'];

/** One group per imperfection: what was found, and where and how it was repaired once that is to be told. */
export const lookGroups = (context: PointContext, look: Look): GroupDefinition[] =>
  imperfections.map((found) => {
    const state = context.value(at(found, 'state'));
    return {
      key: `look-${found}`,
      fields: [
        choice(at(found, 'state'), statesOf(found, look)),
        choice(at(found, 'clock'), clockHours, { required: state === 'repaired' || state === 'present' }),
        ...(statesOf(found, look).includes('repaired')
          ? [words(at(found, 'how'), { required: state === 'repaired' })]
          : []),
      ],
    };
  });

const kindOf = (found: Imperfection, state: string): LimitKind =>
  found === 'crack' && state !== 'repaired' ? 'stop' : 'hold';

const judgeOne = (context: PointContext, found: Imperfection, look: Look): Verdict[] => {
  const state = context.value(at(found, 'state'));
  if (state === undefined) return [];
  const repairedCrack = found === 'crack' && state === 'repaired';
  return judgeFact(context, {
    limit: at(found, 'state'),
    kind: look === 'cold' && found === 'crack' ? 'stop' : kindOf(found, state),
    about: [at(found, 'state'), at(found, 'clock')],
    source: found === 'crack' ? standard('AWS D1.1') : commonPractice,
    says: repairedCrack ? 'look-crack-repaired' : look === 'cold' ? `cold-look-${found}` : `look-${found}`,
    params: { clock: context.value(at(found, 'clock')) ?? '?' },
    holds: state === 'none' || (state === 'repaired' && found !== 'crack'),
  });
};

/** A crack that is there stops the work, a repaired one is conceded or not; anything else left in is a hold. */
export const judgeLook = (context: PointContext, look: Look): Verdict[] =>
  imperfections.flatMap((found) => judgeOne(context, found, look));
