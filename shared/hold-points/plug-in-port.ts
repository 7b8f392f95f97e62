import type { PointContext } from './context';
import { commonPractice, judgeFact } from './judging';
import type { Verdict } from './verdict';

/**
 * A plug that the test put back shuts heat and moisture in: no fire on the joint until it is out again. Custody is the
 * job's own and outlives a reopening, so it knows what the readings of an earlier point have forgotten.
 */
export const judgePlugsOut = (context: PointContext): Verdict[] =>
  context.state.custody.flatMap(({ port, back }) =>
    judgeFact(context, {
      limit: `plug.${port}.back-in`,
      kind: 'stop',
      about: [],
      source: commonPractice,
      params: { port },
      holds: back === null,
    }).filter((verdict) => verdict.outcome === 'outside'),
  );
