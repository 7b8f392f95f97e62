import type { PointKind } from '../hold-points/points';
import { pointKinds } from '../hold-points/points';
import type { SettingName, Terms } from './plan';

/**
 * Which points are judged by which term. A term that a released point used is changed only after that point is reopened.
 * Gas freshness is looked at before every flame, so it may move at any time and holds from then on.
 */
export const settingUsedBy: Record<SettingName, readonly PointKind[]> = {
  gasFreshMin: [],
  lelMaxPct: ['hot-work-clearance'],
  tapesAgreeIn: ['height-takeoff'],
  markAgreesIn: ['height-takeoff'],
  stubAboveMarkIn: ['height-takeoff'],
  takeoffAgreesIn: ['height-takeoff'],
  cutHighIn: ['final-cut'],
  cutLowIn: ['final-cut'],
  cutSpreadIn: ['final-cut'],
  greaseClearIn: ['seal-greased-and-checked'],
  rotationDeg: ['valve-orientation', 'pass-inspected', 'cooled-to-touch'],
  tiltDeg: ['valve-orientation', 'pass-inspected', 'cooled-to-touch'],
  datumWithinIn: ['valve-orientation', 'pass-inspected', 'cooled-to-touch'],
  passTemperatureMin: ['pass-inspected'],
  touchF: ['cooled-to-touch'],
  collapseSharePct: ['pressure-test-held'],
  gaugeLowPct: ['pressure-test-held'],
  gaugeHighPct: ['pressure-test-held'],
};

const fromTakeoff: readonly PointKind[] = pointKinds.slice(pointKinds.indexOf('height-takeoff'));

export const termUsedBy: Record<Exclude<keyof Terms, 'settings'>, readonly PointKind[]> = {
  datum: fromTakeoff,
  targetHeightIn: fromTakeoff,
  standOffIn: fromTakeoff,
  test: ['pressure-test-held'],
};
