import { expect } from 'vitest';
import type { Outcome } from '../../shared/calculations';

/** The answer of a calculation that must have one; a refusal fails the test with its reason. */
export const answer = <Result extends object>(outcome: Outcome<Result>): Readonly<Result> => {
  if (!outcome.ok) expect.fail(`refused: ${outcome.reason} (${outcome.input ?? 'no input'})`);
  return outcome;
};

/** The reason of a calculation that must be refused. */
export const reason = <Result extends object>(outcome: Outcome<Result>): string => {
  if (outcome.ok) expect.fail('expected a refusal');
  return outcome.reason;
};
