import type { Role } from '../../shared/permissions/roles';

/** Where each role's work waits. Somebody with two roles lands on the first of these that fits. */
const places: readonly (readonly [Role, string])[] = [
  ['company_rep', '/desk'],
  ['tool_pusher', '/desk'],
  ['welder', '/jobs'],
  ['coordinator', '/jobs'],
  ['auditor', '/packets'],
];

/** The first page after signing in. */
export function landingFor(roles: readonly Role[]): string {
  return places.find(([role]) => roles.includes(role))?.[1] ?? '/account';
}

/** An address that was wanted before sign-in, if it is one of our own; anything else would lead out of the house. */
export function wantedAddress(wanted: unknown): string | undefined {
  return typeof wanted === 'string' && /^\/(?![/\\])/.test(wanted) && !wanted.startsWith('/sign-in')
    ? wanted
    : undefined;
}
