import type { RouteLocationNormalized, RouteLocationRaw } from 'vue-router';
import { can } from '../../shared/permissions/can';
import { useSessionStore } from '../stores/session';
import { firstPage } from './first-page';
import { landingFor } from './landing';

/** Lets through who may pass; sends others to sign-in, keeping what they wanted, or to the place of their role. */
export async function guard(to: RouteLocationNormalized): Promise<true | RouteLocationRaw> {
  const session = useSessionStore();
  await session.known();
  const actor = session.actor;
  if (to.name === 'sign-in') return actor === undefined ? true : await firstPage();
  if (to.name === 'start') return actor === undefined ? { name: 'sign-in' } : await firstPage();
  if (to.meta.public === true) return true;
  if (actor === undefined) {
    return to.fullPath === '/jobs' ? { name: 'sign-in' } : { name: 'sign-in', query: { to: to.fullPath } };
  }
  const { permission } = to.meta;
  if (permission === undefined || can(actor, permission) === 'yes') return true;
  return landingFor(actor.roles);
}
