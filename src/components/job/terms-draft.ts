import { settingNames, type Datum, type Settings, type Terms, type TestMedium } from '../../../shared/job/plan';
import { settingDefinitions } from '../../../shared/job/settings';
import { isOfTheAir, type TermName } from '../../../shared/job/terms-in-use';
import type { Text } from '../../../shared/locales/text';
import type { Unit } from '../../../shared/units';
import type { UnitSystem } from '../../../shared/units/format';
import { readTyped, readWhole } from '../../stores/planning/typed-number';

/** A number of the terms as the form asks for it; `term` is what the rules call what it belongs to. */
export interface TermNumber {
  key: string;
  term: TermName;
  label: string;
  unit: Unit;
  /** psi and minutes are kept whole */
  whole?: true;
  min?: string;
  max?: string;
  now: string;
}

/** What was typed and chosen; a number that is left open stays as it is. */
export interface TermsDraft {
  datum: Datum;
  medium: TestMedium;
  typed: Record<string, string>;
}

/** The numbers of the terms, each with what is in force now. */
export const termNumbers = ({ targetHeightIn, standOffIn, test, settings }: Terms): TermNumber[] => [
  { key: 'targetHeightIn', term: 'targetHeightIn', label: 'job.numbers.target', unit: 'in', now: targetHeightIn },
  { key: 'standOffIn', term: 'standOffIn', label: 'job.terms.standOff', unit: 'in', now: standOffIn },
  ...(
    [
      ['pressurePsi', 'plan.fields.test.pressurePsi', 'psi', '1', '20000'],
      ['holdMin', 'plan.fields.test.holdMin', 'min', '1', '1440'],
      ['allowedDropPsi', 'plan.fields.test.allowedDropPsi', 'psi', '0', '5000'],
    ] as const
  ).map(([key, label, unit, min, max]) => ({
    key,
    term: 'test' as const,
    label,
    unit,
    whole: true as const,
    min,
    max,
    now: String(test[key]),
  })),
  ...settingNames.map((name) => {
    const { unit, min, max } = settingDefinitions[name];
    return { key: name, term: name, label: `settings.${name}`, unit, min, max, now: settings[name].value };
  }),
];

const faultOf = (number: TermNumber, value: string, used: boolean): Text | null => {
  const { min, max, now, unit } = number;
  const end = (quantity: string) => ({ quantity, unit });
  if ((min !== undefined && Number(value) < Number(min)) || (max !== undefined && Number(value) > Number(max)))
    return { key: 'job.terms.outOfRange', params: { min: end(min ?? ''), max: end(max ?? '') } };
  // a limit of the air that was released by may become stricter, never laxer
  const laxer = used && isOfTheAir(number.key) && Number(value) > Number(now);
  return laxer ? { key: 'job.terms.onlyStricter', params: { now: end(now) } } : null;
};

/**
 * The terms that a draft comes to, and what is wrong at which number. `terms` is null while anything is.
 * @param used whether a released point was judged by a term
 */
export function readTerms(
  current: Terms,
  draft: TermsDraft,
  system: UnitSystem,
  used: (term: TermName) => boolean,
): { terms: Terms | null; wrong: ReadonlyMap<string, Text> } {
  const wrong = new Map<string, Text>();
  const typed = new Map<string, string>();
  for (const number of termNumbers(current)) {
    const read = (number.whole ? readWhole : readTyped)(draft.typed[number.key] ?? '', number.unit, system);
    if (read.is === 'unread') wrong.set(number.key, read.text);
    if (read.is !== 'read') continue;
    const fault = faultOf(number, read.decimal, used(number.term));
    if (fault) wrong.set(number.key, fault);
    else typed.set(number.key, read.decimal);
  }
  if (wrong.size > 0) return { terms: null, wrong };
  const of = (key: string, otherwise: string): string => typed.get(key) ?? otherwise;
  const settings = { ...current.settings };
  for (const name of settingNames) {
    const value = typed.get(name);
    if (value !== undefined) settings[name] = { value, source: 'job' } satisfies Settings[typeof name];
  }
  const { test } = current;
  return {
    wrong,
    terms: {
      datum: draft.datum,
      targetHeightIn: of('targetHeightIn', current.targetHeightIn),
      standOffIn: of('standOffIn', current.standOffIn),
      test: {
        medium: draft.medium,
        pressurePsi: Number(of('pressurePsi', String(test.pressurePsi))),
        holdMin: Number(of('holdMin', String(test.holdMin))),
        allowedDropPsi: Number(of('allowedDropPsi', String(test.allowedDropPsi))),
      },
      settings,
    },
  };
}
