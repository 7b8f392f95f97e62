import { flushPromises, mount } from '@vue/test-utils';
import { createPinia, setActivePinia } from 'pinia';
import { vi } from 'vitest';
import type { Component } from 'vue';
import { createMemoryHistory, createRouter } from 'vue-router';
import type { Role } from '../../shared/permissions/roles';
import { useSessionStore } from '../../src/stores/session';

const nothing = { render: () => null };
const ways = ['/', '/sign-in', '/jobs', '/jobs/new', '/packets', '/account'];

/** What the server answers, by method and path; anything else is no signal. */
export function serverSays(answers: Record<string, unknown>): void {
  vi.stubGlobal('fetch', (address: string, { method }: { method: string }) => {
    const key = `${method} ${address.split('?')[0]}`;
    if (!(key in answers)) return Promise.reject(new TypeError('no link'));
    return Promise.resolve(
      new Response(JSON.stringify(answers[key]), { headers: { 'content-type': 'application/json' } }),
    );
  });
}

/** Signs somebody in without a server, into stores of a new app. */
export function signedInAs(roles: Role[], id = '0190a000-0000-7000-8000-00000000000a') {
  const pinia = createPinia();
  setActivePinia(pinia);
  const session = useSessionStore();
  session.adopt({
    id,
    name: 'O. Brandt',
    email: 'brandt@headfast.example',
    roles,
    operatorIds: [],
    preferences: { language: 'en', units: 'imperial', theme: 'day' },
    hasPin: true,
    passwordAt: '2026-09-14T06:00:00.000Z',
    signingFreshUntil: '2026-09-14T18:00:00.000Z',
  });
  return { pinia, session };
}

/** Mounts a page with the ways of the app, at an address, and waits until it has settled. */
export async function mountPage(page: Component, at: string, pinia: ReturnType<typeof createPinia>) {
  const router = createRouter({
    history: createMemoryHistory(),
    routes: [
      ...ways.map((path) => ({ path, component: nothing })),
      { path: '/desk', name: 'desk', component: nothing },
      { path: '/jobs/:id', name: 'job', component: nothing },
      { path: '/jobs/:id/:point', name: 'hold-point', component: nothing },
    ],
  });
  await router.push(at);
  const wrapper = mount(page, { global: { plugins: [pinia, router] }, attachTo: document.body });
  await flushPromises();
  return { wrapper, router };
}
