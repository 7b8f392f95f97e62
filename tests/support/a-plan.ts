import type { Chemistry, Head, JobPlan, Procedure, ProcedurePass, SettingName, Terms } from '../../shared/job/plan';
import { settingsWith } from '../../shared/job/settings';

/** The people of the invented job, by role. */
export const welder = { accountId: '0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1001', name: 'W. Calder' };
export const helper = { accountId: '0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1002', name: 'J. Ostrom' };
export const companyRep = { accountId: '0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1003', name: 'O. Brandt' };
export const toolPusher = { accountId: '0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1004', name: 'T. Rhule' };
export const coordinator = { accountId: '0b1f6c1e-3c5a-4d1f-9a51-6a0c9a3f1005', name: 'M. Dray' };

/** An 11 in 3000 psi head for 9-5/8 in casing: 16 holes, one seal, one port, welded outside. */
const elevenInchHead: Head = {
  id: 'head-11-3000',
  name: 'HD-11-3M rev 2',
  nominalSize: '11',
  ratedPressurePsi: 3000,
  casingOdIn: '9.625',
  faceToShoulderIn: '14',
  overallHeightIn: '24',
  faceToOutletIn: '8',
  outletReachIn: '14',
  socketDepthIn: '10',
  socketBoreIn: '9.75',
  baseOdIn: '14',
  seals: 1,
  sealAboveBaseIn: ['7.75'],
  sealRatedPsi: 3000,
  sealRatedF: '300',
  welds: 'outside',
  ports: 1,
  portAboveBaseIn: '4.25',
  boltHoles: 16,
  boltCircleIn: '18.5',
};

const pass = (name: ProcedurePass['name'], own: Partial<ProcedurePass> = {}): ProcedurePass => ({
  name,
  weld: 'outside',
  process: 'SMAW',
  electrodeClass: 'E8018-C3',
  electrodeDiameterIn: '0.125',
  currentA: { min: '90', max: '130' },
  voltageV: { min: '20', max: '26' },
  heatInputKjPerIn: { min: '14', max: '32' },
  interpassF: { min: '250', max: '450' },
  ...own,
});

/** A steel of iron and carbon alone: its carbon equivalents are its carbon. */
export const carbonAlone = (carbon: string): Chemistry['composition'] => ({
  carbon,
  manganese: '0',
  silicon: '0',
  chromium: '0',
  molybdenum: '0',
  vanadium: '0',
  nickel: '0',
  copper: '0',
  boron: '0',
});

/** Four passes of E8018 under preheat. */
const fourPasses: Procedure = {
  id: 'procedure-hf-2',
  number: 'HF-2',
  revision: '3',
  preheatF: { min: '250', max: '450' },
  bevelDeg: { min: '27.5', max: '32.5' },
  landIn: { min: '0', max: '0.0625' },
  filletLegIn: '0.5',
  insideLegIn: null,
  preheatDistance: 'aws-d1.1',
  surfaceExam: 'none',
  chemistry: null,
  passes: [pass('root'), pass('hot-pass'), pass('fill'), pass('cap')],
};

interface TermsOverrides extends Partial<Omit<Terms, 'settings' | 'test'>> {
  settings?: Partial<Record<SettingName, string>>;
  test?: Partial<Terms['test']>;
}

/** What a test says of its plan; head, procedure, casing and terms are filled up from the invented job. */
export interface PlanOverrides extends Partial<Omit<JobPlan, 'head' | 'procedure' | 'casing' | 'terms'>> {
  head?: Partial<Head>;
  procedure?: Partial<Procedure>;
  casing?: Partial<JobPlan['casing']>;
  terms?: TermsOverrides;
}

const termsOf = (own: TermsOverrides = {}): Terms => ({
  datum: 'face',
  targetHeightIn: '6',
  standOffIn: '0',
  ...own,
  test: { medium: 'hydraulic-oil', pressurePsi: 1500, holdMin: 15, allowedDropPsi: 75, ...own.test },
  settings: settingsWith(own.settings ?? {}),
});

/** The plan of an invented job: Tallgrass 14-2H on Pronghorn 7, its face 6 in above ground. */
export const aPlan = (own: PlanOverrides = {}): JobPlan => ({
  operator: { id: 'operator-marrow-creek', name: 'Marrow Creek Resources' },
  rig: { id: 'rig-pronghorn-7', name: 'Pronghorn 7' },
  well: 'Tallgrass 14-2H',
  zone: 'America/Chicago',
  instruments: [
    {
      id: 'meter-1',
      kind: 'gas-meter',
      name: 'Four-gas meter',
      serial: 'GM-4410',
      calibratedUntil: '2026-12-31',
      fullScalePsi: null,
    },
    {
      id: 'pyrometer-1',
      kind: 'pyrometer',
      name: 'Contact pyrometer',
      serial: 'PY-218',
      calibratedUntil: '2026-12-31',
      fullScalePsi: null,
    },
    {
      id: 'gauge-1',
      kind: 'gauge',
      name: 'Test gauge',
      serial: 'PG-77',
      calibratedUntil: '2026-12-31',
      fullScalePsi: 3000,
    },
    {
      id: 'recorder-1',
      kind: 'recorder',
      name: 'Chart recorder',
      serial: 'CR-12',
      calibratedUntil: '2026-12-31',
      fullScalePsi: 5000,
    },
  ],
  people: [
    { ...welder, role: 'welder', qualifications: [{ process: 'SMAW', lastUsed: '2026-08-20' }] },
    { ...helper, role: 'welder', qualifications: [] },
    { ...companyRep, role: 'company_rep', qualifications: [] },
    { ...toolPusher, role: 'tool_pusher', qualifications: [] },
    { ...coordinator, role: 'coordinator', qualifications: [] },
  ],
  proposedDirection: null,
  rateCardId: null,
  ...own,
  casing: {
    odIn: '9.625',
    weightLbFt: '40',
    wallIn: '0.395',
    idIn: '8.835',
    driftIn: '8.679',
    grade: 'J55',
    collapsePsi: 2570,
    internalYieldPsi: 3950,
    source: 'API Bulletin 5C2 (21st ed.) / TR 5C3 table value',
    ownRow: false,
    ...own.casing,
  },
  head: { ...elevenInchHead, ...own.head },
  procedure: { ...fourPasses, ...own.procedure },
  terms: termsOf(own.terms),
});
