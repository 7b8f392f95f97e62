import type { Text } from '../../../shared/locales/text';
import type { Problem } from '../../api/problem';

export interface ProblemWords {
  readonly what: Text;
  readonly now?: Text;
  readonly code?: Text;
}

/** The words for a problem: the message of its code, or else what its status means to a person and what to do. */
export function problemWords(problem: Problem, has: (key: string) => boolean): ProblemWords {
  if (problem.status === 0) return frame('noSignal', 'noSignalDo');
  if (has(`errors.${problem.code}`)) return { what: { key: `errors.${problem.code}`, params: problem.params ?? {} } };
  if (problem.status === 401) return frame('signedOut', 'signedOutDo');
  if (problem.status === 403) return frame('notYours');
  if (problem.status === 404) return frame('notFound', 'notFoundDo');
  if (problem.status === 429) return frame('tooOften', 'tooOftenDo', { seconds: problem.retryAfterS ?? 60 });
  if (problem.status === 502 || problem.status === 503) return frame('busy', 'busyDo');
  return { ...frame('unknown', 'unknownDo'), code: { key: 'app.problem.code', params: { code: problem.code } } };
}

function frame(what: string, now?: string, params: Text['params'] = {}): ProblemWords {
  const key = (name: string) => `app.problem.${name}`;
  return now === undefined
    ? { what: { key: key(what) } }
    : { what: { key: key(what) }, now: { key: key(now), params } };
}
