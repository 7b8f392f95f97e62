import type { PointDefinition } from './definition';
import { names, words } from './fields';
import { gasGroups, judgeGas, judgeGasMeter, permitGroup } from './gas';
import { commonPractice, judgeFact } from './judging';

/** Point 1: the air is read, the permit in force, the people in place. Everything about the air is a stop. */
export const hotWorkClearance: PointDefinition = {
  kind: 'hot-work-clearance',
  version: 1,
  groups: () => [
    ...gasGroups(),
    permitGroup(),
    {
      key: 'people',
      fields: [words('fire-watch'), words('attendant'), names('crew')],
    },
    { key: 'cellar', fields: [words('water-level', { required: false })] },
  ],
  shots: () => [{ key: 'meter-at-cellar', required: true }],
  acts: () => [],
  statements: ['cement-wait-over', 'float-holding', 'no-flow', 'casing-supported'],
  cautions: () => ['cellar', 'permit'],
  compute: () => [],
  judge: (context) => {
    const expires = context.read('permit.expires');
    return [
      ...judgeGas(context),
      ...judgeGasMeter(context),
      ...judgeFact(context, {
        limit: 'permit-in-force',
        kind: 'stop',
        about: ['permit.expires'],
        source: commonPractice,
        ...(expires && { params: { expires: { instant: expires.value } } }),
        holds: expires ? Date.parse(expires.value) > Date.parse(expires.at.corrected) : undefined,
      }),
    ];
  },
};
