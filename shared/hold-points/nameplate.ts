import { parseQuantity } from '../units/parse-quantity';
import type { PointContext } from './context';
import type { GroupDefinition } from './definition';
import { quantity, words } from './fields';
import { byDrawing, judgeFact } from './judging';
import type { Verdict } from './verdict';

/** The head as it stands on the floor, read off its nameplate. */
export const nameplateGroup = (context: PointContext): GroupDefinition => {
  const rated = context.state.plan.head.ratedPressurePsi;
  return {
    key: 'nameplate',
    fields: [
      words('nameplate.serial'),
      words('nameplate.size'),
      quantity('nameplate.pressure', 'psi', { likely: { min: rated, max: rated } }),
    ],
  };
};

/** `13-5/8`, `13 5/8` and `13 5/8"` are one flange. */
const sameSize = (a: string, b: string): boolean => {
  const [first, second] = [parseQuantity(a, 'in'), parseQuantity(b, 'in')];
  return first.ok && second.ok ? first.exact === second.exact : a.trim().toLowerCase() === b.trim().toLowerCase();
};

/** Another head than the job's has another takeoff and another rating: a stop. */
export const judgeNameplate = (context: PointContext): Verdict[] => {
  const { head } = context.state.plan;
  const size = context.value('nameplate.size');
  const pressure = context.number('nameplate.pressure');
  const frame = { kind: 'stop' as const, source: byDrawing(context) };
  return [
    ...judgeFact(context, {
      ...frame,
      limit: 'nameplate.size',
      about: ['nameplate.size'],
      params: { read: size ?? '', planned: head.nominalSize },
      holds: size === undefined || size === '' ? undefined : sameSize(size, head.nominalSize),
    }),
    ...judgeFact(context, {
      ...frame,
      limit: 'nameplate.pressure',
      about: ['nameplate.pressure'],
      params: {
        read: { quantity: context.value('nameplate.pressure') ?? '', unit: 'psi' },
        planned: { quantity: String(head.ratedPressurePsi), unit: 'psi' },
      },
      // A rating typed in another unit comes back a hair off; the classes lie a thousand psi apart.
      holds: pressure === undefined ? undefined : Math.abs(pressure - head.ratedPressurePsi) < 10,
    }),
  ];
};
