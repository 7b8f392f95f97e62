import { fitUpGapInfo } from '../calculations/fit-up-gap';
import { computed } from './computing';
import type { PointContext } from './context';
import { text } from '../locales/text';
import type { FieldDefinition, PointDefinition } from './definition';
import { byQuarter, check, choice } from './fields';
import { gapToAddIn, judgeGaps } from './fit-up-gaps';
import { commonPractice, judgeFact } from './judging';
import { namedDirection } from './named-direction';
import { computeOrientation, judgeOrientation, orientationGroups } from './orientation';
import type { Verdict } from './verdict';

const hasSeal = (context: PointContext): boolean => context.state.plan.head.seals > 0;

/** Whoever looks must be told which way it should point, and not have to remember it. */
const facingHint = (context: PointContext): Pick<FieldDefinition, 'hint'> =>
  context.state.direction === null
    ? {}
    : { hint: text('points.valve-orientation.hints.faces', { direction: namedDirection(context) }) };

/** The two holes alone can't tell one hole pitch from the next: somebody has to look where the valve points. */
const judgeFacing = (context: PointContext): Verdict[] => {
  const faces = context.value('faces');
  return judgeFact(context, {
    limit: 'faces',
    kind: 'stop',
    about: ['faces'],
    source: commonPractice,
    ...(context.state.direction === null
      ? { says: 'faces-unnamed' }
      : { params: { direction: namedDirection(context) } }),
    holds: faces === undefined ? undefined : faces === 'yes' && context.state.direction !== null,
  });
};

const judgeSealAgain = (context: PointContext): Verdict[] => {
  const again = context.value('seal-again');
  return judgeFact(context, {
    limit: 'seal-again',
    kind: 'stop',
    about: ['seal-again'],
    source: commonPractice,
    holds: again === undefined ? undefined : again === 'sound',
  });
};

/** Point 6: the valve faces where the tool pusher wants it, and the flange is square, level and at its height. */
export const valveOrientation: PointDefinition = {
  kind: 'valve-orientation',
  version: 1,
  groups: (context) => [
    { key: 'facing', fields: [check('faces', facingHint(context))] },
    ...orientationGroups(context, 'set'),
    { key: 'gap', fields: byQuarter('gap', 'in', { likely: { min: 0, max: 0.25 } }), picture: 'clock' },
    ...(hasSeal(context)
      ? [{ key: 'seal-again', fields: [choice('seal-again', ['sound', 'not-sound', 'not-done'])] }]
      : []),
  ],
  shots: () => ['valve-and-reference', 'level-on-flange'].map((key) => ({ key, required: true })),
  acts: () => [],
  statements: [],
  cautions: (context) => [...(hasSeal(context) ? ['turning'] : []), 'suspended-head'],
  compute: (context) => [
    ...computeOrientation(context, 'set'),
    ...computed('gap-to-add', gapToAddIn(context), 'in', fitUpGapInfo),
  ],
  judge: (context) => [
    ...judgeFacing(context),
    ...judgeOrientation(context, 'set'),
    ...judgeGaps(context),
    ...(hasSeal(context) ? judgeSealAgain(context) : []),
  ],
};
