import { z } from 'zod';
import { elements, settingNames } from '../job/plan';
import { decimal } from './decimal';
import { termsOfJob } from './terms';
import { uuid } from './uuid';

/**
 * The commands that move a job, as they travel and as they wait in the outbox. Secrets are in none of them.
 * Every command type counts as a route in the role table.
 */
const short = z.string().trim().min(1).max(200);
const reason = z.string().trim().min(3).max(2000);
const instant = z.iso.datetime({ offset: true });
const sha256 = z.string().regex(/^[0-9a-f]{64}$/);
const pointId = z.string().regex(/^[a-z0-9-]{3,60}$/);
const fieldKey = z.string().regex(/^[a-z0-9.-]{1,80}$/);
const person = z.strictObject({ accountId: uuid.nullable(), name: short });
const range = z.strictObject({ min: decimal, max: decimal });
/** What the signer saw: part of the signed content. */
const shown = z.strictObject({ language: z.enum(['en', 'es']), units: z.enum(['imperial', 'metric']) });
const signedContent = { contentHash: sha256, shown };

const entry = z.strictObject({
  field: fieldKey,
  /** as typed, never tidied */
  typed: z.string().max(4000),
  /** the unit in force when it was typed; null for checks, choices, texts and times */
  unit: z.string().max(12).nullable(),
  measuredBy: person.nullable(),
});

const setting = z.strictObject({ value: decimal, source: z.enum(['common-practice', 'job']) });
const settings = z.strictObject(
  Object.fromEntries(settingNames.map((name) => [name, setting])) as Record<
    (typeof settingNames)[number],
    typeof setting
  >,
);
const terms = z.strictObject({
  ...termsOfJob,
  settings,
});

const head = z.strictObject({
  id: short,
  name: short,
  nominalSize: short,
  ratedPressurePsi: z.int().positive(),
  casingOdIn: decimal,
  faceToShoulderIn: decimal,
  overallHeightIn: decimal,
  faceToOutletIn: decimal,
  outletReachIn: decimal,
  socketDepthIn: decimal,
  socketBoreIn: decimal,
  baseOdIn: decimal,
  seals: z.union([z.literal(0), z.literal(1), z.literal(2)]),
  sealAboveBaseIn: z.array(decimal).max(2),
  sealRatedPsi: z.int().positive().nullable(),
  sealRatedF: decimal.nullable(),
  welds: z.enum(['outside', 'outside-and-inside']),
  ports: z.union([z.literal(1), z.literal(2)]),
  portAboveBaseIn: decimal,
  boltHoles: z.int().min(4).max(40),
  boltCircleIn: decimal,
});
const pass = z.strictObject({
  name: z.enum(['root', 'hot-pass', 'fill', 'cap']),
  weld: z.enum(['outside', 'inside']),
  process: short,
  electrodeClass: short,
  electrodeDiameterIn: decimal,
  currentA: range,
  voltageV: range,
  heatInputKjPerIn: range.nullable(),
  interpassF: range,
});
const procedure = z.strictObject({
  id: short,
  number: short,
  revision: short,
  preheatF: range,
  bevelDeg: range,
  landIn: range,
  filletLegIn: decimal,
  insideLegIn: decimal.nullable(),
  preheatDistance: z.enum(['aws-d1.1', 'iso-13916']),
  surfaceExam: z.enum(['none', 'magnetic-particle', 'penetrant']),
  chemistry: z
    .strictObject({
      composition: z.strictObject(
        Object.fromEntries(elements.map((name) => [name, decimal])) as Record<
          (typeof elements)[number],
          typeof decimal
        >,
      ),
      thicknessMm: decimal,
      hydrogenMl: decimal,
      heatInputKjPerMm: decimal,
    })
    .nullable(),
  passes: z.array(pass).min(1).max(12),
});
const jobPerson = z.strictObject({
  accountId: uuid,
  name: short,
  role: z.enum(['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator']),
  qualifications: z.array(z.strictObject({ process: short, lastUsed: z.iso.date() })).max(20),
});

const instrument = z.strictObject({
  id: short,
  kind: z.enum(['gas-meter', 'tape', 'level', 'pyrometer', 'gauge', 'recorder']),
  name: short,
  serial: short,
  calibratedUntil: z.iso.date(),
  fullScalePsi: z.int().positive().nullable(),
});

/** The whole plan as the first event holds it; the server fills it from its own tables, never from the caller. */
export const jobPlanSchema = z.strictObject({
  operator: z.strictObject({ id: short, name: short }),
  rig: z.strictObject({ id: short, name: short }),
  well: short,
  zone: short,
  casing: z.strictObject({
    odIn: decimal,
    weightLbFt: decimal,
    wallIn: decimal,
    idIn: decimal,
    driftIn: decimal,
    grade: short,
    collapsePsi: z.int().positive(),
    internalYieldPsi: z.int().positive(),
    source: short,
    ownRow: z.boolean(),
  }),
  head,
  procedure,
  instruments: z.array(instrument).max(40),
  people: z.array(jobPerson).min(1).max(40),
  terms,
  proposedDirection: short.nullable(),
  rateCardId: short.nullable(),
});

const bodies = {
  'plan-job': z.strictObject({ plan: jobPlanSchema }),
  record: z.strictObject({ point: pointId, entries: z.array(entry).min(1).max(60) }),
  'add-photo': z.strictObject({
    point: pointId,
    shot: fieldKey,
    sha256,
    previewSha256: sha256.nullable(),
    width: z.int().positive().max(60_000),
    height: z.int().positive().max(60_000),
    takenAt: instant.nullable(),
  }),
  'set-photo-aside': z.strictObject({ point: pointId, photo: z.string().max(80), reason }),
  'strike-row': z.strictObject({ point: pointId, group: fieldKey, row: z.int().min(1).max(999), reason }),
  'begin-act': z.strictObject({ point: pointId, act: fieldKey }),
  'end-act': z.strictObject({ point: pointId, act: fieldKey }),
  present: z.strictObject({ point: pointId, ...signedContent }),
  withdraw: z.strictObject({ point: pointId, reason: reason.nullable() }),
  release: z.strictObject({ point: pointId, ...signedContent, statements: z.array(fieldKey).max(20) }),
  'send-back': z.strictObject({ point: pointId, reason, contentHash: sha256 }),
  concede: z.strictObject({
    point: pointId,
    ...signedContent,
    items: z
      .array(z.strictObject({ limit: fieldKey, basis: z.array(z.string().max(80)).max(60), reason }))
      .min(1)
      .max(40),
  }),
  reopen: z.strictObject({ point: pointId, reason, ...signedContent }),
  'open-repair-round': z.strictObject({ reason, passes: z.int().min(1).max(12), ...signedContent }),
  'set-again': z.strictObject({ reason, head, targetHeightIn: decimal, ...signedContent }),
  'name-direction': z.strictObject({
    direction: z.enum(['v-door', 'mud-tanks', 'pipe-racks', 'doghouse', 'choke-manifold', 'other']),
    words: short.nullable(),
  }),
  'propose-direction': z.strictObject({ direction: short }),
  'stop-work': z.strictObject({ reason }),
  'resume-work': z.strictObject({ note: reason, ...signedContent }),
  'change-terms': z.strictObject({ terms, reason, ...signedContent }),
  'hand-over': z.strictObject({ line: reason, to: short.nullable() }),
  'add-instrument': z.strictObject({ instrument }),
  'assign-person': z.strictObject({ person: jobPerson }),
  'remove-person': z.strictObject({ accountId: uuid, role: jobPerson.shape.role, reason }),
  'call-off': z.strictObject({ reason, ...signedContent }),
  seal: z.strictObject({ concessions: z.int().min(0), ...signedContent }),
} as const;

export type CommandType = keyof typeof bodies;
export const commandTypes = Object.keys(bodies) as CommandType[];

/** From where device clocks begin to count to the last year of four digits: what every form of the record can print. */
const canBeDated = (ms: number): boolean => ms >= 0 && ms < Date.UTC(10_000, 0);

/** What stands beside a command's body: its id, and what the device knew of the time when it was made. */
const clock = z
  .strictObject({
    deviceAt: instant,
    /** add to the device's time to get the server's; null when never measured */
    offsetMs: z.int().nullable(),
    doubtMs: z.int().min(0).nullable(),
  })
  .refine(({ deviceAt, offsetMs }) => [0, offsetMs ?? 0].every((shift) => canBeDated(Date.parse(deviceAt) + shift)), {
    path: ['deviceAt'],
  });

const commandOf = <T extends CommandType>(type: T) =>
  z.strictObject({
    id: uuid,
    type: z.literal(type),
    /** the last event that this device had seen; null for the first */
    basedOn: z.int().min(0).nullable(),
    clock,
    body: bodies[type],
  });

export const commandSchema = z.discriminatedUnion('type', [
  commandOf('plan-job'),
  commandOf('record'),
  commandOf('add-photo'),
  commandOf('set-photo-aside'),
  commandOf('strike-row'),
  commandOf('begin-act'),
  commandOf('end-act'),
  commandOf('present'),
  commandOf('withdraw'),
  commandOf('release'),
  commandOf('send-back'),
  commandOf('concede'),
  commandOf('reopen'),
  commandOf('open-repair-round'),
  commandOf('set-again'),
  commandOf('name-direction'),
  commandOf('propose-direction'),
  commandOf('stop-work'),
  commandOf('resume-work'),
  commandOf('change-terms'),
  commandOf('hand-over'),
  commandOf('add-instrument'),
  commandOf('assign-person'),
  commandOf('remove-person'),
  commandOf('call-off'),
  commandOf('seal'),
]);

export type Command = z.infer<typeof commandSchema>;
export type CommandOf<T extends CommandType> = Extract<Command, { type: T }>;
export type RecordEntry = z.infer<typeof entry>;
export type Shown = z.infer<typeof shown>;

/** The commands that carry a signature: the PIN travels beside them. */
export const signedCommands: readonly CommandType[] = [
  'release',
  'concede',
  'reopen',
  'open-repair-round',
  'set-again',
  'resume-work',
  'change-terms',
  'call-off',
  'seal',
];
