import { qualificationContinuity } from '../calculations/qualification-continuity';
import type { JobPerson } from '../job/plan';
import { answer } from './computing';
import type { PointContext } from './context';
import { judgeFact, standard } from './judging';
import { siteDay } from './site-day';
import type { Verdict } from './verdict';

/** The people behind an answer that names welders: by account, else by name; null where nobody on the job fits. */
const namedIn = (context: PointContext, answer: string): { said: string; person: JobPerson | null }[] =>
  answer
    .split(',')
    .map((said) => said.trim())
    .filter((said) => said !== '')
    .map((said) => {
      const { people } = context.state;
      const welders = people.filter((person) => person.role === 'welder');
      const person =
        welders.find((one) => one.accountId === said) ??
        welders.find((one) => one.name.trim().toLowerCase() === said.toLowerCase()) ??
        null;
      return { said, person };
    });

const mayWeld = (person: JobPerson | null, process: string, day: string): boolean =>
  person?.qualifications.some(
    (one) =>
      one.process.trim().toUpperCase() === process.trim().toUpperCase() &&
      answer(qualificationContinuity({ lastUsed: one.lastUsed, onDay: day }))?.inForce === true,
  ) ?? false;

/** Every welder of the pass may use its process on the day it was welded; one who may not is a stop. */
export const judgeWelders = (context: PointContext): Verdict[] => {
  const reading = context.read('welders');
  const { pass } = context;
  if (!reading || !pass) return [];
  const day = siteDay(context.state.plan.zone, reading.at.corrected);
  const named = namedIn(context, reading.value);
  const without = named.filter(({ person }) => !mayWeld(person, pass.process, day));
  return judgeFact(context, {
    limit: 'welders-qualified',
    kind: 'stop',
    about: ['welders'],
    source: standard('ASME IX QW-322'),
    params: {
      names: (without.length > 0 ? without : named).map(({ said, person }) => person?.name ?? said).join(', '),
      process: pass.process,
    },
    holds: named.length > 0 && without.length === 0,
  });
};
