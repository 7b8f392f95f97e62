import { Brackets } from 'typeorm';
import type { Actor, Role } from '../../shared/permissions';

/** Roles that see a job because they were put on it. */
const byAssignment: readonly Role[] = ['welder', 'company_rep', 'tool_pusher'];

/** Narrows a query over `job` to the jobs that somebody is on, in a role that the account still holds. */
export function onJobsOf(actor: Actor): Brackets {
  const roles = actor.roles.filter((role) => byAssignment.includes(role));
  return new Brackets((where) =>
    roles.length === 0
      ? where.where('1 = 0')
      : where.where(
          `EXISTS (SELECT 1 FROM job_people_view p
                    WHERE p.job_id = job.id AND p.account_id = :accountId AND p.role IN (:...assigned))`,
          { accountId: actor.accountId, assigned: roles },
        ),
  );
}
