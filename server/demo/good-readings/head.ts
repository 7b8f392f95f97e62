import { quarters } from '../../../shared/hold-points/fields';
import type { OrientationPrefix } from '../../../shared/hold-points/orientation';
import type { JobPlan } from '../../../shared/job/plan';
import type { Answers } from './answers';

export const goodSeal: Answers = () => ({
  'direction-marked': 'yes',
  'seal.part': 'S-9625 lot 18',
  'seal.condition': 'new, no nick, no flat',
  'seal.sound': 'yes',
  'grease.product': 'Silicone grease',
  'grease.clear': '1.5',
  'greased.casing': 'yes',
  'greased.head': 'yes',
  'seal.sight': 'seen',
  'seal.state-after': 'sound',
});

/** The level that stays in calibration longest; nothing to choose where the job lists none. */
const levelOf = ({ instruments }: JobPlan): string =>
  instruments
    .filter((one) => one.kind === 'level')
    .sort((a, b) => b.calibratedUntil.localeCompare(a.calibratedUntil))[0]?.id ?? '';

/** Two-hole, level and height with as little error as a crew gets on a good day. */
export const goodOrientation = (plan: JobPlan, prefix: OrientationPrefix): Record<string, string> => ({
  [`${prefix}.holes`]: '4 and 12',
  [`${prefix}.offset.a`]: '62',
  [`${prefix}.offset.b`]: '62.0625',
  [`${prefix}.length`]: '16',
  [`${prefix}.level.x`]: '0.1',
  [`${prefix}.level.y`]: '0.05',
  [`${prefix}.instrument`]: levelOf(plan),
  [`${prefix}.height`]: plan.terms.targetHeightIn,
});

export const goodValve: Answers = ({ state }) => ({
  faces: 'yes',
  ...goodOrientation(state.plan, 'set'),
  ...Object.fromEntries(quarters.map((quarter) => [`gap.${quarter}`, '0.03125'])),
  'seal-again': 'sound',
});

export const goodPlug: Answers = ({ state }) => ({
  'bled-to-zero': 'yes',
  drained: 'yes',
  ...Object.fromEntries(
    Array.from({ length: state.plan.head.ports }, (_, index) => index + 1).flatMap((port) => [
      [`plug.${port}.out`, 'yes'],
      [`port.${port}.clear`, 'yes'],
      [`plug.${port}.where`, `Tray ${port} on the truck`],
      [`plug.${port}.holder`, 'W. Calder'],
    ]),
  ),
  'bore-covered': 'yes',
  'bore-vented': 'yes',
});
