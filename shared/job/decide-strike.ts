import { readingsOfRow, rowPrefix, stands } from '../hold-points/rows';
import { accept, event, pointNamed, refuse, type Decider } from './decision';
import { reviewPoint } from './review';
import type { PointState, Reading } from './state';

/** A row of a repeated group that was begun by mistake: its readings stay on record, struck, and count no more. */
export const decideStrikeRow: Decider<'strike-row'> = (input) => {
  const { state, command } = input;
  const { point: id, group: key, row, reason } = command.body;
  const point = pointNamed(state, id);
  if (!point) return refuse('no-such-point');
  if (point.status !== 'open') return refuse('point-not-open', { since: point.release ?? point.presentation });
  const group = reviewPoint(state, point).groups.find((one) => one.key === key && one.rows !== undefined);
  const standing = group ? readingsOfRow(point, rowPrefix(group), row).filter(stands) : [];
  if (standing.length === 0) return refuse('no-such-row', { params: { row } });
  return accept(
    event(input, 'row-struck', { point: id, group: key, row, readings: standing.map((one) => one.id), reason }),
  );
};

/** Who struck the row that one of these fields lies in; null when all of them may be written to. */
export const strikeOver = (point: PointState, fields: readonly string[]): Reading['struck'] => {
  for (const field of fields) {
    const [, prefix, row] = /^([^.]+)\.(\d+)\./.exec(field) ?? [];
    const strike = prefix && readingsOfRow(point, prefix, Number(row)).find((one) => one.struck)?.struck;
    if (strike) return strike;
  }
  return null;
};
