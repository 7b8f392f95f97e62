import { coolingFit, coolingTime } from '../calculations/newton-cooling';
import type { RefusalReason } from '../calculations/outcome';
import { minutesBetween } from '../job/actor';
import { answer } from './computing';
import type { PointContext } from './context';

/** One temperature of the cooling weld; `row` names its fields. */
export interface CoolingPoint {
  row: number;
  /** ISO */
  at: string;
  temperatureF: number;
}

/** How the weld cools by the readings that count, and when it can be touched. */
export interface WeldCooling {
  ok: true;
  kPerMin: number;
  ambientF: number;
  /** the first reading that counts: minute 0 of the fit */
  startAt: string;
  /** as fitted, at that time */
  startF: number;
  touchF: number;
  touchAfterMin: number;
  /** ISO */
  touchAt: string;
  /** the readings that the fit rests on */
  used: CoolingPoint[];
  /** how far the farthest reading lies from the curve */
  worstMissF: number;
}

/** Every temperature with its time, the earliest first. */
export const coolingPointsOf = (context: PointContext): CoolingPoint[] =>
  context
    .rows('cooling')
    .flatMap((row) => {
      const at = context.value(`cooling.${row}.at`);
      const temperatureF = context.number(`cooling.${row}.temperature`);
      return at === undefined || temperatureF === undefined ? [] : [{ row, at, temperatureF }];
    })
    .sort((a, b) => Date.parse(a.at) - Date.parse(b.at));

const after = (start: string, minutes: number): string =>
  new Date(Date.parse(start) + Math.round(minutes * 60_000)).toISOString();

/**
 * The cooling fit of this point and when the weld comes down to touch. Readings before a cover came off are left out:
 * under a cover it cools by another law. Without an ambient temperature the fit finds its own, from three readings.
 */
export const coolingFitOf = (context: PointContext): WeldCooling | { ok: false; reason: RefusalReason } => {
  const coverOff = context.value('cover-off');
  const used = coolingPointsOf(context).filter(
    (point) => coverOff === undefined || Date.parse(point.at) >= Date.parse(coverOff),
  );
  const startAt = used[0]?.at;
  if (startAt === undefined) return { ok: false, reason: 'too-few-readings' };
  const fit = coolingFit({
    readings: used.map(({ at, temperatureF }) => ({ minute: minutesBetween(startAt, at), temperatureF })),
    ambientF: context.number('ambient') ?? null,
  });
  if (!fit.ok) return { ok: false, reason: fit.reason };
  const touchF = context.setting('touchF');
  const touch = coolingTime({ ...fit, targetF: touchF });
  if (!touch.ok) return { ok: false, reason: touch.reason };
  return {
    ok: true,
    kPerMin: fit.kPerMin,
    ambientF: fit.ambientF,
    startAt,
    startF: fit.startF,
    touchF,
    touchAfterMin: touch.minute,
    touchAt: after(startAt, touch.minute),
    used,
    worstMissF: fit.worstMissF,
  };
};

/** The fitted curve from its start down to touch, `steps` + 1 points of minute and °F, for drawing. */
export const coolingCurve = (fit: WeldCooling, steps = 40): { minute: number; temperatureF: number }[] =>
  Array.from({ length: steps + 1 }, (_, index) => fit.startF + ((fit.touchF - fit.startF) * index) / steps).flatMap(
    (targetF) => {
      const reached = answer(coolingTime({ ...fit, startMinute: 0, targetF }));
      return reached ? [{ minute: reached.minute, temperatureF: targetF }] : [];
    },
  );
