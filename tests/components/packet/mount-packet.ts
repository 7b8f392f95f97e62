import { flushPromises, mount } from '@vue/test-utils';
import { createPinia } from 'pinia';
import { vi } from 'vitest';
import type { Component } from 'vue';
import { createMemoryHistory, createRouter, type Router } from 'vue-router';

/** Mounts a page at its address, over a server that answers in memory. Says which addresses it asked for. */
export async function mountAt(view: Component, address: string, serve: (address: string) => Response) {
  const asked: string[] = [];
  vi.stubGlobal('fetch', async (path: string) => {
    asked.push(path);
    return serve(path);
  });
  const nothing = { render: () => null };
  const router: Router = createRouter({
    history: createMemoryHistory(),
    routes: [
      { path: '/packets', name: 'packets', component: nothing },
      { path: '/packets/:id', name: 'packet', component: nothing },
      { path: '/:rest(.*)*', name: 'elsewhere', component: nothing },
    ],
  });
  await router.push(address);
  const page = mount(view, {
    props: router.currentRoute.value.params,
    global: { plugins: [createPinia(), router] },
    attachTo: document.body,
  });
  await flushPromises();
  return { page, router, asked };
}
