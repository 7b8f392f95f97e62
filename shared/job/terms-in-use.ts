import type { PointKind } from '../hold-points/points';
import { pointKinds } from '../hold-points/points';
import type { SettingName, Terms } from './plan';
import type { JobState, PointState } from './state';

/**
 * Which points are judged by which term. A term that a released point used is changed only after that point is reopened.
 */
export const settingUsedBy: Record<SettingName, readonly PointKind[]> = {
  gasFreshMin: ['height-takeoff', 'final-cut', 'bevel-prep', 'preheat-reached', 'pass-inspected'],
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

/** Limits of the air. They are looked at before every flame, so a stricter one is never refused: it holds from then on. */
const ofTheAir: readonly SettingName[] = ['gasFreshMin', 'lelMaxPct'];

export const isOfTheAir = (name: string): boolean => (ofTheAir as readonly string[]).includes(name);

/** Whether a setting moves to the safe side in a way that no release has to be taken back for. */
export const onlyStricter = (name: SettingName, from: Terms, to: Terms): boolean =>
  isOfTheAir(name) && Number(to.settings[name].value) < Number(from.settings[name].value);

export type TermName = keyof typeof termUsedBy | SettingName;

/** The released points that were judged by a term: while there are any, it is not changed. */
export const releasedBy = (state: JobState, name: TermName): PointState[] => {
  const kinds = name in termUsedBy ? termUsedBy[name as keyof typeof termUsedBy] : settingUsedBy[name as SettingName];
  return state.points.filter((point) => point.status === 'released' && kinds.includes(point.place.kind));
};
