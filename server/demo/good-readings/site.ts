import { gasPlaces } from '../../../shared/hold-points/gas';
import { instrumentOf, minutesAfter, type Answers } from './answers';

/** Good air in cellar, bore and annulus, and a meter that was tried out today. */
export const goodAir: Answers = (context, at) => ({
  ...Object.fromEntries(
    gasPlaces.flatMap((place) => [
      [`gas.${place}.oxygen`, '20.9'],
      [`gas.${place}.flammable`, '0'],
      [`gas.${place}.h2s`, '0'],
      [`gas.${place}.co`, '2'],
    ]),
  ),
  'gas.meter': instrumentOf(context, at, (one) => one.kind === 'gas-meter'),
  'gas.bump-tested': 'yes',
  'gas.monitor': 'yes',
});

/** A hot work permit that runs for half a day. */
export const goodPermit: Answers = (_context, at) => ({
  'permit.number': 'HW-2214',
  'permit.issuer': 'D. Quist',
  'permit.expires': minutesAfter(at, 720),
});

export const goodClearance: Answers = (context, at) => ({
  ...goodAir(context, at),
  ...goodPermit(context, at),
  'fire-watch': 'P. Lindqvist',
  attendant: 'S. Marlowe',
  crew: 'W. Calder, L. Amaro, P. Lindqvist, S. Marlowe',
});

/** A look at the joint before stopped work goes on. */
export const goodResume: Answers = ({ state }) => ({
  'resume.temperature': String(Number(state.plan.procedure.preheatF.min) + 30),
  'resume.cracks': 'none',
});
