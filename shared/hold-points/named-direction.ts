import type { TextParam } from '../locales/text';
import type { PointContext } from './context';

/** The direction that the tool pusher named, in words for a message: one of the known ones, or his own. */
export const namedDirection = (context: PointContext): TextParam => {
  const named = context.state.direction;
  if (named === null) return '';
  if (named.direction === 'other') return named.words ?? '';
  return { key: `points.valve-orientation.choices.direction.${named.direction}` };
};
