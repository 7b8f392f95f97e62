import { pointKinds, type PointId, type PointPlace } from './points';

const NAME = /^(?:pass-(?<pass>\d+)-inspected|(?<kind>[a-z-]+?))(?:-r(?<round>\d+))?$/;

/**
 * The place that a hold point's name says: lists carry names alone. Null when it is none of the sequence.
 * @example placeNamed('pass-2-inspected-r1') // kind pass-inspected, pass 2, round 1
 */
export const placeNamed = (id: PointId): PointPlace | null => {
  const found = NAME.exec(id)?.groups;
  if (found === undefined) return null;
  const round = Number(found['round'] ?? 0);
  if (found['pass'] !== undefined) return { id, kind: 'pass-inspected', pass: Number(found['pass']), round };
  const kind = pointKinds.find((one) => one === found['kind'] && one !== 'pass-inspected');
  return kind === undefined ? null : { id, kind, pass: null, round };
};
