import type { PointContext } from './context';
import type { GroupDefinition, PointDefinition } from './definition';
import { check, words } from './fields';
import { commonPractice, judgeCheck, judgeFact } from './judging';
import { portsOf } from './ports';
import type { Verdict } from './verdict';

const isRepair = (context: PointContext): boolean => context.point.place.round > 0;

const portGroup = (port: number): GroupDefinition => ({
  key: `port-${port}`,
  fields: [
    check(`plug.${port}.out`),
    check(`port.${port}.clear`),
    words(`plug.${port}.where`),
    words(`plug.${port}.holder`),
  ],
});

/** A plug that is out must lie somewhere and be somebody's: silent until both are answered. */
const judgeCustody = (context: PointContext, port: number): Verdict[] => {
  const [where, holder] = [context.value(`plug.${port}.where`), context.value(`plug.${port}.holder`)];
  return judgeFact(context, {
    limit: `plug.${port}.custody`,
    kind: 'stop',
    about: [`plug.${port}.where`, `plug.${port}.holder`],
    source: commonPractice,
    params: { port, where: where ?? '', holder: holder ?? '' },
    holds: where === undefined || holder === undefined ? undefined : where.trim() !== '' && holder.trim() !== '',
  });
};

/** After a test has put the plug back, an answer from before says nothing any more: it is looked at again. */
const judgeStillOut = (context: PointContext, port: number): Verdict[] => {
  const custody = context.state.custody.find((one) => one.port === port);
  const claimed = context.point.release === null && context.value(`plug.${port}.out`) === 'yes';
  return judgeFact(context, {
    limit: `plug.${port}.still-out`,
    kind: 'stop',
    about: [`plug.${port}.out`],
    source: commonPractice,
    says: 'plug-back-in',
    params: { port },
    holds: claimed && custody ? custody.back === null : undefined,
  }).filter((verdict) => verdict.outcome === 'outside');
};

/**
 * Point 7: every plug out and in somebody's keeping, so that heat and moisture find a way out. In a repair round the
 * pressure and the test medium go first.
 */
export const testPlugRemoved: PointDefinition = {
  kind: 'test-plug-removed',
  version: 1,
  groups: (context) => [
    ...(isRepair(context) ? [{ key: 'made-safe', fields: [check('bled-to-zero'), check('drained')] }] : []),
    ...portsOf(context.state.plan).map(portGroup),
    { key: 'bore', fields: [check('bore-covered'), check('bore-vented')] },
  ],
  shots: () => [
    { key: 'open-port', required: true },
    { key: 'plug-kept', required: true },
  ],
  acts: () => [],
  statements: [],
  cautions: (context) => [...(isRepair(context) ? ['bleeding'] : []), 'trapped-heat', 'procedure'],
  compute: () => [],
  judge: (context) => [
    ...(isRepair(context)
      ? [...judgeCheck(context, 'bled-to-zero', 'stop'), ...judgeCheck(context, 'drained', 'stop')]
      : []),
    ...portsOf(context.state.plan).flatMap((port) => [
      ...judgeCheck(context, `plug.${port}.out`, 'stop'),
      ...judgeStillOut(context, port),
      ...judgeCheck(context, `port.${port}.clear`, 'stop'),
      ...judgeCustody(context, port),
    ]),
    ...judgeCheck(context, 'bore-covered', 'stop'),
    ...judgeCheck(context, 'bore-vented', 'stop'),
  ],
};
