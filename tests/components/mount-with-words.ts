import { enableAutoUnmount, mount } from '@vue/test-utils';
import { createPinia } from 'pinia';
import { afterEach } from 'vitest';
import type { Component } from 'vue';

enableAutoUnmount(afterEach);

/** Mounts a component as the app would: with its stores and in English. */
export function mountWithWords(
  component: Component,
  props: Record<string, unknown> = {},
  slots: Record<string, string> = {},
) {
  return mount(component, { props, slots, global: { plugins: [createPinia()] }, attachTo: document.body });
}
