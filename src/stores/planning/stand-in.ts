import type { Casing, Head, Procedure } from '../../../shared/job/plan';

/**
 * Parts of a plan that are not chosen yet, strong enough that no rule objects to them: so the rules can be asked about
 * what is there. They never leave the form, and what the rules say at them is left out.
 */
const STRONG_PSI = 99_999;

export const standInCasing = (odIn: string): Casing => ({
  odIn,
  weightLbFt: '40',
  wallIn: '0.4',
  idIn: '8.8',
  driftIn: '8.6',
  grade: '',
  collapsePsi: STRONG_PSI,
  internalYieldPsi: STRONG_PSI,
  source: '',
  ownRow: false,
});

export const standInHead = (casingOdIn: string): Head => ({
  id: '',
  name: '',
  nominalSize: '',
  ratedPressurePsi: STRONG_PSI,
  casingOdIn,
  faceToShoulderIn: '0',
  overallHeightIn: '0',
  faceToOutletIn: '0',
  outletReachIn: '0',
  socketDepthIn: '0',
  socketBoreIn: '999',
  baseOdIn: '0',
  seals: 0,
  sealAboveBaseIn: [],
  sealRatedPsi: null,
  sealRatedF: null,
  welds: 'outside',
  ports: 1,
  portAboveBaseIn: '0',
  boltHoles: 4,
  boltCircleIn: '0',
});

export const standInProcedure: Procedure = {
  id: '',
  number: '',
  revision: '',
  preheatF: { min: '0', max: '0' },
  bevelDeg: { min: '0', max: '0' },
  landIn: { min: '0', max: '0' },
  filletLegIn: '0',
  insideLegIn: null,
  preheatDistance: 'aws-d1.1',
  surfaceExam: 'none',
  chemistry: null,
  passes: [],
};
