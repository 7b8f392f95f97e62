import { bevelPrep } from './bevel-prep';
import { cooledToTouch } from './cooled-to-touch';
import type { PointDefinition } from './definition';
import { finalCut } from './final-cut';
import { heightTakeoff } from './height-takeoff';
import { hotWorkClearance } from './hot-work-clearance';
import { passInspected } from './pass-inspected';
import type { PointKind } from './points';
import { preheatReached } from './preheat-reached';
import { pressureTestHeld } from './pressure-test-held';
import { sealGreasedAndChecked } from './seal-greased-and-checked';
import { testPlugRemoved } from './test-plug-removed';
import { valveOrientation } from './valve-orientation';

/** Raised when a definition changes; a job keeps the version that it started with. */
export const definitionsVersion = 1;

const definitions: Record<PointKind, PointDefinition> = {
  'hot-work-clearance': hotWorkClearance,
  'height-takeoff': heightTakeoff,
  'final-cut': finalCut,
  'bevel-prep': bevelPrep,
  'seal-greased-and-checked': sealGreasedAndChecked,
  'valve-orientation': valveOrientation,
  'test-plug-removed': testPlugRemoved,
  'preheat-reached': preheatReached,
  'pass-inspected': passInspected,
  'cooled-to-touch': cooledToTouch,
  'pressure-test-held': pressureTestHeld,
};

/** The one place where a kind of hold point is looked up. */
export const definitionOf = (kind: PointKind): PointDefinition => definitions[kind];
