import { Problem } from '../middleware/problem';
import type { Refused, Turned } from '../services/command-answer';

/** A command that was not recorded, as it leaves: what the rules said stands whole under `refusal`. */
export function commandProblem(answer: Refused | Turned): Problem {
  if (answer.kind === 'refused') {
    return new Problem(answer.status, `command.${answer.refusal.kind}`, { extra: { refusal: answer.refusal } });
  }
  const { status, code, retryAfter } = answer;
  return new Problem(status, code, retryAfter === undefined ? {} : { retryAfter, params: { seconds: retryAfter } });
}
