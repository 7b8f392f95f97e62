import { can } from '../../shared/permissions';
import type { Actor, JobScope, Permission } from '../../shared/permissions';
import { Problem } from './problem';

/** Lets somebody through or throws the answer: 404 for a job that he may not see, 403 for a role without the permission. */
export function allow(actor: Actor, permission: Permission, job?: JobScope | null): void {
  const answer = can(actor, permission, job ?? undefined);
  if (answer === 'not-found') throw new Problem(404, 'permission.not-found');
  if (answer === 'forbidden') throw new Problem(403, 'permission.forbidden');
}
