import { begunAt, instrumentOf, minutesAfter, type Answers } from './answers';

/** A hold that loses ten pounds, read at its start, half way and at its end. */
export const goodTest: Answers = (context, at) => {
  const { test, settings } = context.state.plan.terms;
  const [low, high] = [Number(settings.gaugeLowPct.value), Number(settings.gaugeHighPct.value)];
  const inRange = (scale: number | null) =>
    scale !== null && (test.pressurePsi / scale) * 100 >= low && (test.pressurePsi / scale) * 100 <= high;
  const gauge = instrumentOf(
    context,
    at,
    (one) => (one.kind === 'gauge' || one.kind === 'recorder') && inRange(one.fullScalePsi),
  );
  const start = minutesAfter(begunAt(context, 'pressure-test', at), 2);
  const readings = [0, test.holdMin / 2, test.holdMin].flatMap((minute, index) => [
    [`hold-readings.${index + 1}.at`, minutesAfter(start, minute)],
    [`hold-readings.${index + 1}.pressure`, String(test.pressurePsi + 20 - 5 * index)],
  ]);
  return {
    'port-probed': 'yes',
    'fitting-in': 'yes',
    exclusion: 'yes',
    gauge,
    volume: '42',
    'hold.start': start,
    'hold.end': minutesAfter(start, test.holdMin),
    ...(Object.fromEntries(readings) as Record<string, string>),
    highest: String(test.pressurePsi + 25),
    leak: 'none',
    'run-by': 'welder',
    'run-by-name': 'W. Calder',
    'bled-to-zero': 'yes',
    ...Object.fromEntries(context.state.custody.map(({ port }) => [`plug.${port}.back`, 'same'])),
  };
};
