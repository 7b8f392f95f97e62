import type { Role } from '../permissions/roles';

/** A number as it stands in the record: a canonical decimal string, never a float. */
export type Decimal = string;

/** Lowest and highest value that is still right, both ends included. */
export interface Range {
  min: Decimal;
  max: Decimal;
}

/** Where on the head the operator's target height is taken. */
export type Datum = 'face' | 'outlet' | 'base';

/** A slip-on-weld casing head as its drawing shows it. Lengths in inches, pressures in psi, temperatures in °F. */
export interface Head {
  id: string;
  name: string;
  /** flange size in inches, as stamped: `11`, `13-5/8` */
  nominalSize: string;
  ratedPressurePsi: number;
  casingOdIn: Decimal;
  /** flange face down to the landing shoulder */
  faceToShoulderIn: Decimal;
  overallHeightIn: Decimal;
  faceToOutletIn: Decimal;
  /** bore axis to the outlet's face: the arm that a rotation error swings */
  outletReachIn: Decimal;
  /** base up to the landing shoulder */
  socketDepthIn: Decimal;
  socketBoreIn: Decimal;
  baseOdIn: Decimal;
  seals: 0 | 1 | 2;
  /** the upper edge of each seal above the base, as many as there are seals */
  sealAboveBaseIn: Decimal[];
  sealRatedPsi: number | null;
  sealRatedF: Decimal | null;
  welds: 'outside' | 'outside-and-inside';
  ports: 1 | 2;
  portAboveBaseIn: Decimal;
  boltHoles: number;
  boltCircleIn: Decimal;
}

/** A row of the casing table, or one typed by the coordinator (`ownRow`). */
export interface Casing {
  odIn: Decimal;
  weightLbFt: Decimal;
  wallIn: Decimal;
  idIn: Decimal;
  driftIn: Decimal;
  grade: string;
  collapsePsi: number;
  internalYieldPsi: number;
  source: string;
  ownRow: boolean;
}

export type WeldSide = 'outside' | 'inside';
export type PassName = 'root' | 'hot-pass' | 'fill' | 'cap';

/** One pass of the welding procedure. */
export interface ProcedurePass {
  name: PassName;
  weld: WeldSide;
  process: string;
  electrodeClass: string;
  electrodeDiameterIn: Decimal;
  currentA: Range;
  voltageV: Range;
  heatInputKjPerIn: Range | null;
  interpassF: Range;
}

export const elements = [
  'carbon',
  'manganese',
  'silicon',
  'chromium',
  'molybdenum',
  'vanadium',
  'nickel',
  'copper',
  'boron',
] as const;
export type Element = (typeof elements)[number];

/** The steel as its mill certificate has it (mass %), with what the preheat advice needs beside it. */
export interface Chemistry {
  composition: Record<Element, Decimal>;
  thicknessMm: Decimal;
  /** diffusible hydrogen of the electrode, ml per 100 g of weld metal */
  hydrogenMl: Decimal;
  heatInputKjPerMm: Decimal;
}

/** A welding procedure in one revision. It governs; Headfast only holds the work against it. */
export interface Procedure {
  id: string;
  number: string;
  revision: string;
  preheatF: Range;
  bevelDeg: Range;
  landIn: Range;
  filletLegIn: Decimal;
  insideLegIn: Decimal | null;
  /** which rule says how far from the joint the preheat is measured */
  preheatDistance: 'aws-d1.1' | 'iso-13916';
  /** surface examination asked for at the cold look */
  surfaceExam: 'none' | 'magnetic-particle' | 'penetrant';
  /** for the preheat advice, when the mill certificate is at hand; a grade's name fixes no chemistry */
  chemistry: Chemistry | null;
  passes: ProcedurePass[];
}

export type InstrumentKind = 'gas-meter' | 'tape' | 'level' | 'pyrometer' | 'gauge' | 'recorder';

export interface Instrument {
  id: string;
  kind: InstrumentKind;
  name: string;
  serial: string;
  /** ISO date of the last day in calibration */
  calibratedUntil: string;
  fullScalePsi: number | null;
}

/** A welder's right to use a process: it lapses when the process has not been used for six months. */
export interface Qualification {
  process: string;
  /** ISO date */
  lastUsed: string;
}

/** Somebody who works on the job under his account. */
export interface JobPerson {
  accountId: string;
  name: string;
  role: Role;
  qualifications: Qualification[];
}

export type TestMedium = 'hydraulic-oil' | 'nitrogen';

export interface TestTerms {
  medium: TestMedium;
  pressurePsi: number;
  holdMin: number;
  allowedDropPsi: number;
}

/** What the operator asked for: shown beside the defaults and signed with the release of point 1. */
export interface Terms {
  datum: Datum;
  /** target height of the datum above ground */
  targetHeightIn: Decimal;
  /** stand-off left between casing end and landing shoulder */
  standOffIn: Decimal;
  test: TestTerms;
  settings: Settings;
}

/** A limit that the operator's programme may replace, with where its value came from. */
export interface Setting {
  value: Decimal;
  source: 'common-practice' | 'job';
}

export const settingNames = [
  'gasFreshMin',
  'lelMaxPct',
  'tapesAgreeIn',
  'markAgreesIn',
  'stubAboveMarkIn',
  'takeoffAgreesIn',
  'cutHighIn',
  'cutLowIn',
  'cutSpreadIn',
  'greaseClearIn',
  'rotationDeg',
  'tiltDeg',
  'datumWithinIn',
  'passTemperatureMin',
  'touchF',
  'collapseSharePct',
  'gaugeLowPct',
  'gaugeHighPct',
] as const;
export type SettingName = (typeof settingNames)[number];
export type Settings = Record<SettingName, Setting>;

/** Everything a job starts with. It stands whole in the first event, so that the record needs no other table. */
export interface JobPlan {
  operator: { id: string; name: string };
  rig: { id: string; name: string };
  well: string;
  /** IANA zone of the site, for every printed time */
  zone: string;
  casing: Casing;
  head: Head;
  procedure: Procedure;
  instruments: Instrument[];
  people: JobPerson[];
  terms: Terms;
  proposedDirection: string | null;
  rateCardId: string | null;
}
