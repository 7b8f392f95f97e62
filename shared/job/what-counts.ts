import type { PointContext } from '../hold-points/context';
import { namedDirection } from '../hold-points/named-direction';
import type { PointKind } from '../hold-points/points';
import { text, type Text, type TextParam } from '../locales/text';
import { toDecimal } from '../units/decimal';
import type { Chapter } from './story';

/** Looks a number up in a chapter for a sentence; undefined when it was never read or worked out. */
interface Lookup {
  context: PointContext;
  computed(key: string, difference?: true): TextParam | undefined;
  read(field: string, unit: string): TextParam | undefined;
}

/** Names behind an answer that lists accounts or names; a hand without an account stands as it was typed. */
const namesOf = (context: PointContext, field: string): string | undefined =>
  context
    .value(field)
    ?.split(',')
    .map((said) => context.state.people.find((one) => one.accountId === said.trim())?.name ?? said.trim())
    .join(', ');

type Line = (look: Lookup) => Record<string, TextParam | undefined>;

/** What one line says of each kind of hold point: the numbers that an outsider asks for first. */
const lines: Record<PointKind, Line> = {
  'hot-work-clearance': ({ context, read }) => ({
    permit: context.value('permit.number'),
    oxygen: read('gas.cellar.oxygen', 'pct'),
    flammable: read('gas.cellar.flammable', 'pct'),
  }),
  'height-takeoff': ({ context, computed }) => ({
    mark: computed('mark'),
    takeoff: computed('takeoff-by-tape') ?? computed('takeoff-by-drawing'),
    serial: context.value('nameplate.serial'),
  }),
  'final-cut': ({ computed }) => ({ mean: computed('mean'), mark: computed('mark'), spread: computed('spread', true) }),
  'bevel-prep': ({ read }) => ({ angle: read('bevel.angle', 'deg'), land: read('bevel.land', 'in') }),
  'seal-greased-and-checked': ({ context }) => ({
    part: context.value('seal.part'),
    condition: context.value('seal.condition'),
  }),
  'valve-orientation': ({ context, computed }) => ({
    direction: namedDirection(context),
    rotation: computed('set.rotation'),
    tilt: computed('set.tilt'),
  }),
  'test-plug-removed': ({ context }) => ({
    where: context.value('plug.1.where'),
    holder: context.value('plug.1.holder'),
  }),
  'preheat-reached': ({ computed }) => ({ lowest: computed('lowest'), highest: computed('highest') }),
  'pass-inspected': ({ context, computed }) => ({ welders: namesOf(context, 'welders'), heat: computed('heat-input') }),
  'cooled-to-touch': ({ context, computed }) => {
    const last = context.rows('cooling').at(-1);
    const value = last === undefined ? undefined : context.value(`cooling.${last}.temperature`);
    return {
      temperature: value === undefined ? undefined : { quantity: value, unit: 'degF' },
      rotation: computed('as-built.rotation'),
    };
  },
  'pressure-test-held': ({ context, computed }) => {
    const { test } = context.state.plan.terms;
    return {
      pressure: { quantity: String(test.pressurePsi), unit: 'psi' },
      hold: { quantity: String(test.holdMin), unit: 'min' },
      drop: computed('drop', true),
      allowed: { quantity: String(test.allowedDropPsi), unit: 'psi', difference: true },
    };
  },
};

/** Signs stand for a direction that the sentence does not tell: `0.15°` is the size of the error. */
const size = (value: string): string => value.replace(/^-/, '');

/** Decimals that a line in a table of contents needs; inches keep their sixty-fourths. */
const places: Partial<Record<string, number>> = { deg: 2, kJPerIn: 1, psi: 0, degF: 0 };

const rounded = (value: string, unit: string): string => {
  const decimals = places[unit];
  return decimals === undefined ? value : toDecimal(Number(value), decimals);
};

/** The one line that tells a hold point in the table of contents; null when its numbers are not there. */
export const whatCounts = ({ review, point }: Chapter): Text | null => {
  const { context } = review;
  const look: Lookup = {
    context,
    computed: (key, difference) => {
      const found = review.computed.find((one) => one.key === key);
      if (!found) return undefined;
      const quantity = rounded(key.endsWith('rotation') ? size(found.value) : found.value, found.unit);
      return difference ? { quantity, unit: found.unit, difference } : { quantity, unit: found.unit };
    },
    read: (field, unit) => {
      const value = context.value(field);
      return value === undefined ? undefined : { quantity: value, unit };
    },
  };
  const params = Object.entries(lines[point.place.kind](look));
  if (params.some(([, value]) => value === undefined || value === '')) return null;
  return text(`packets.counts.${point.place.kind}`, Object.fromEntries(params) as Record<string, TextParam>);
};
