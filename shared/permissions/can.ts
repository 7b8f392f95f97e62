import { grants, isJobPermission } from './grants';
import type { Permission } from './grants';
import type { Role } from './roles';

/** Somebody signed in. `operatorIds` are the operators whose packets an auditor was granted. */
export interface Actor {
  accountId: string;
  name: string;
  roles: readonly Role[];
  operatorIds: readonly string[];
}

/** What must be known of a job to say who may do what on it. */
export interface JobScope {
  people: readonly { accountId: string; role: Role }[];
  operatorId: string;
  status: 'planned' | 'running' | 'sealed' | 'called-off';
}

/** `not-found` is said as 404: who may not see a job is not told that it exists. */
export type PermissionAnswer = 'yes' | 'not-found' | 'forbidden';

/**
 * The roles that somebody has on a job, none when he is not on it. A role must still be held: an assignment outlives
 * the account's role in the record, not in what it allows. An auditor sees only what can change no more.
 */
export function rolesOnJob(actor: Actor, job: JobScope): Role[] {
  const held = job.people.filter((person) => person.accountId === actor.accountId).map((person) => person.role);
  const finished = job.status === 'sealed' || job.status === 'called-off';
  return actor.roles.filter((role) => {
    if (role === 'coordinator') return true;
    if (role === 'auditor') return finished && actor.operatorIds.includes(job.operatorId);
    return held.includes(role);
  });
}

/**
 * The one question of the house, asked by buttons, routes, pages and tests alike.
 * Who does not see the job gets `not-found`; who sees it in a role without the permission gets `forbidden`.
 */
export function can(actor: Actor, permission: Permission, job?: JobScope): PermissionAnswer {
  const allowed = grants[permission];
  if (!isJobPermission(permission)) return actor.roles.some((role) => allowed.includes(role)) ? 'yes' : 'forbidden';
  if (job === undefined) return 'not-found';
  const roles = rolesOnJob(actor, job);
  if (roles.length === 0) return 'not-found';
  return roles.some((role) => allowed.includes(role)) ? 'yes' : 'forbidden';
}

/** The role under which a permitted act is recorded: the first of the grant's roles that the actor has there. */
export function roleFor(actor: Actor, permission: Permission, job?: JobScope): Role | undefined {
  const roles = job && isJobPermission(permission) ? rolesOnJob(actor, job) : actor.roles;
  return grants[permission].find((role) => roles.includes(role));
}
