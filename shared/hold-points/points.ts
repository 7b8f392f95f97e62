import type { Role } from '../permissions/roles';

/** The kinds of hold point, in the order of the work. */
export const pointKinds = [
  'hot-work-clearance',
  'height-takeoff',
  'final-cut',
  'bevel-prep',
  'seal-greased-and-checked',
  'valve-orientation',
  'test-plug-removed',
  'preheat-reached',
  'pass-inspected',
  'cooled-to-touch',
  'pressure-test-held',
] as const;
export type PointKind = (typeof pointKinds)[number];

/** Who releases each kind. */
export const ownerOf: Record<PointKind, Role> = {
  'hot-work-clearance': 'company_rep',
  'height-takeoff': 'company_rep',
  'final-cut': 'company_rep',
  'bevel-prep': 'company_rep',
  'seal-greased-and-checked': 'company_rep',
  'valve-orientation': 'tool_pusher',
  'test-plug-removed': 'company_rep',
  'preheat-reached': 'company_rep',
  'pass-inspected': 'company_rep',
  'cooled-to-touch': 'company_rep',
  'pressure-test-held': 'company_rep',
};

/** A hold point's name within its job: `final-cut`, `pass-2-inspected`, `pass-1-inspected-r1`. */
export type PointId = string;

/** A hold point's place in the sequence. `round` 0 is the first go; 1 and up are repair rounds. */
export interface PointPlace {
  id: PointId;
  kind: PointKind;
  /** 1-based pass number; null for every other kind */
  pass: number | null;
  round: number;
}
