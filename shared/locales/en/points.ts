import bevelPrep from './points/bevel-prep';
import cooledToTouch from './points/cooled-to-touch';
import finalCut from './points/final-cut';
import heightTakeoff from './points/height-takeoff';
import hotWorkClearance from './points/hot-work-clearance';
import passInspected from './points/pass-inspected';
import preheatReached from './points/preheat-reached';
import pressureTestHeld from './points/pressure-test-held';
import sealGreasedAndChecked from './points/seal-greased-and-checked';
import testPlugRemoved from './points/test-plug-removed';
import valveOrientation from './points/valve-orientation';

/** What each hold point says: titles, fields, groups, shots, acts, statements, cautions, computed values, choices. */
export default {
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
