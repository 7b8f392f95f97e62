import type { Text, TextParam } from '../locales/text';
import type { Unit } from '../units/units';
import { toDecimal } from '../units/decimal';
import type { SettingName } from '../job/plan';
import type { PointContext } from './context';
import type { LimitKind, Source, Verdict } from './verdict';

/** Two decimal fractions of an inch are never exactly equal in binary; this is far below any instrument. */
const slack = 1e-7;

export const standard = (ref: string): Source => ({ kind: 'standard', ref });
export const commonPractice: Source = { kind: 'common-practice', ref: null };
export const byProcedure = (context: PointContext): Source => ({
  kind: 'procedure',
  ref: `${context.state.plan.procedure.number} rev ${context.state.plan.procedure.revision}`,
});
export const byJob: Source = { kind: 'job', ref: null };
export const byDrawing = (context: PointContext): Source => ({ kind: 'drawing', ref: context.state.plan.head.name });

/** The source of a setting: common practice until the operator's programme replaces it. */
export const bySetting = (context: PointContext, name: SettingName): Source => ({
  kind: context.state.plan.terms.settings[name].source,
  ref: name,
});

interface LimitFrame {
  limit: string;
  kind: LimitKind;
  /** fields it is shown at; its readings are what the verdict rests on */
  about: string[];
  source: Source;
  /** message key under `limits.`, with `.within` and `.outside`; else the limit's own name, row numbers dropped, dots as dashes */
  says?: string;
  params?: Record<string, TextParam>;
}

const basisOf = (context: PointContext, about: string[]): string[] =>
  about.flatMap((field) => context.read(field)?.id ?? []);

const saying = (frame: LimitFrame, outcome: 'within' | 'outside', params: Record<string, TextParam>): Text => ({
  key: `limits.${frame.says ?? frame.limit.replace(/\.\d+/g, '').replaceAll('.', '-')}.${outcome}`,
  params: { ...params, ...frame.params },
});

/**
 * Holds a number against a lowest and a highest value, both included. Says nothing while the number is not there.
 * `exclusiveMax`: the highest value itself is already outside (gas ceilings).
 */
export const judgeRange = (
  context: PointContext,
  frame: LimitFrame & {
    measured: number | undefined;
    unit: Unit;
    min?: number;
    max?: number;
    exclusiveMax?: boolean;
  },
): Verdict[] => {
  const { measured, min, max, unit } = frame;
  if (measured === undefined || !Number.isFinite(measured)) return [];
  const low = min !== undefined && measured < min - slack ? min - measured : null;
  const high =
    max !== undefined && (frame.exclusiveMax ? measured >= max - slack : measured > max + slack)
      ? measured - max
      : null;
  const by = low ?? high;
  const outcome = by === null ? 'within' : 'outside';
  const difference: TextParam = { quantity: toDecimal(Math.max(by ?? 0, 0)), unit, difference: true };
  const params: Record<string, TextParam> = { measured: { quantity: toDecimal(measured), unit }, by: difference };
  if (min !== undefined) params.min = { quantity: toDecimal(min), unit };
  if (max !== undefined) params.max = { quantity: toDecimal(max), unit };
  return [
    {
      limit: frame.limit,
      kind: frame.kind,
      outcome,
      about: frame.about,
      basis: basisOf(context, frame.about),
      measured: { value: toDecimal(measured), unit },
      allowed: {
        min: min === undefined ? null : toDecimal(min),
        max: max === undefined ? null : toDecimal(max),
        ...(frame.exclusiveMax ? { below: true as const } : {}),
        unit,
      },
      by: by === null ? null : { value: toDecimal(Math.max(by, 0)), unit },
      source: frame.source,
      text: saying(frame, outcome, params),
    },
  ];
};

/** Holds a check, choice or any other yes-or-no fact against what it must be. Silent while it is undefined. */
export const judgeFact = (context: PointContext, frame: LimitFrame & { holds: boolean | undefined }): Verdict[] => {
  if (frame.holds === undefined) return [];
  const outcome = frame.holds ? 'within' : 'outside';
  return [
    {
      limit: frame.limit,
      kind: frame.kind,
      outcome,
      about: frame.about,
      basis: basisOf(context, frame.about),
      measured: null,
      allowed: null,
      by: null,
      source: frame.source,
      text: saying(frame, outcome, {}),
    },
  ];
};

/** A check that must be answered with yes. */
export const judgeCheck = (
  context: PointContext,
  field: string,
  kind: LimitKind,
  source: Source = commonPractice,
  says?: string,
): Verdict[] => {
  const value = context.value(field);
  return judgeFact(context, {
    limit: field,
    kind,
    about: [field],
    source,
    says,
    holds: value === undefined ? undefined : value === 'yes',
  });
};
