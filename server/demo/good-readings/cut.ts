import type { PointContext } from '../../../shared/hold-points/context';
import { quarters } from '../../../shared/hold-points/fields';
import { measuredOnHead, takeoffOf } from '../../../shared/hold-points/takeoff-of';
import { toDecimal } from '../../../shared/units/decimal';
import { instrumentOf, middle, type Answers } from './answers';

/** Height of the string above ground at both stakes. */
const stringIn = 24;
const string = { 'string.a': toDecimal(stringIn), 'string.b': toDecimal(stringIn) };

const twice = (base: string, value: number): Record<string, string> => ({
  [`${base}.first`]: toDecimal(value),
  [`${base}.second`]: toDecimal(value),
});

/** From the string down to where the casing is to be cut, by the string as it stands in these readings. */
const markIn = (context: PointContext): number => stringIn - (takeoffOf(context)?.cutElevationIn ?? 0);

export const goodTakeoff: Answers = (context, at) => {
  const { head, terms } = context.state.plan;
  const { base, drawingIn } = measuredOnHead(context.state.plan);
  const mark = markIn(context);
  const socketBelowCut = Number(head.socketDepthIn) - Number(terms.standOffIn);
  return {
    'nameplate.serial': 'CH-77310',
    'nameplate.size': head.nominalSize,
    'nameplate.pressure': String(head.ratedPressurePsi),
    'tape.first': instrumentOf(context, at, (one) => one.kind === 'tape'),
    'tape.second': instrumentOf(context, at, (one) => one.kind === 'tape'),
    ...twice(base, drawingIn),
    ...string,
    ...twice('mark', mark),
    'stub-top': toDecimal(5 - mark),
    'conductor-top': toDecimal(0 - mark - socketBelowCut - 16),
    collar: toDecimal(socketBelowCut + 40),
    'plumb.x': '0.1',
    'plumb.y': '0.05',
  };
};

/** Cut on the mark, a thirty-second high at 3 o'clock. */
export const goodCut: Answers = (context) => {
  const mark = markIn(context);
  return {
    'fluid.below-weld': '60',
    'fluid.no-water': 'yes',
    ...string,
    ...Object.fromEntries(
      quarters.map((quarter) => [`cut.${quarter}`, toDecimal(quarter === '3' ? mark - 0.03125 : mark)]),
    ),
    visual: 'yes',
  };
};

export const goodBevel: Answers = ({ state }) => {
  const { casing, head, procedure, terms } = state.plan;
  const od = Object.fromEntries(
    ['seal', 'weld'].flatMap((place) => [
      [`od.${place}.x`, casing.odIn],
      [`od.${place}.y`, toDecimal(Number(casing.odIn) + 0.015625)],
    ]),
  );
  return {
    'bevel.angle': middle(procedure.bevelDeg),
    'bevel.land': middle(procedure.landIn),
    ...od,
    'clean.outside': toDecimal(Number(head.socketDepthIn) - Number(terms.standOffIn) + 4),
    'clean.inside': '2',
    'no-sharp-edge': 'yes',
    'inside-deburred': 'yes',
    'bright-metal': 'yes',
    'seal-area-smooth': 'yes',
  };
};
