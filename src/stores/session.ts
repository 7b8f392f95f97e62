import { defineStore } from 'pinia';
import { computed, ref } from 'vue';
import type { Me } from '../../shared/contracts/session';
import type { Actor } from '../../shared/permissions/can';
import type { Role } from '../../shared/permissions/roles';
import { askSession, askSignIn, askSignOut, askSignOutEverywhere, type SignInForm } from '../api/account';
import type { Problem } from '../api/problem';
import { onSignal } from '../api/signals';
import { keepObject, keptObject, letGo } from './kept';
import { usePreferencesStore } from './preferences';

const isMe = (value: unknown): value is Me =>
  typeof value === 'object' && value !== null && 'id' in value && 'roles' in value && Array.isArray(value.roles);

/**
 * Who is signed in on this device. The last answer is kept, so that the app starts without a signal as the person who
 * used it last; the server decides again as soon as it is reached.
 */
export const useSessionStore = defineStore('session', () => {
  const me = ref<Me>();
  /** The session ended by itself: the way back goes through sign-in, what is unsent stays. */
  const ended = ref(false);
  let asked: Promise<void> | undefined;

  const actor = computed<Actor | undefined>(() =>
    me.value === undefined
      ? undefined
      : { accountId: me.value.id, name: me.value.name, roles: me.value.roles, operatorIds: me.value.operatorIds },
  );

  onSignal('session-ended', () => {
    if (me.value === undefined) return;
    me.value = undefined;
    ended.value = true;
  });

  function adopt(answer: Me): void {
    me.value = answer;
    ended.value = false;
    keepObject('me', answer);
    usePreferencesStore().adopt(answer.preferences);
  }

  function leave(): void {
    me.value = undefined;
    asked = Promise.resolve();
    letGo('me');
    letGo('job-list');
  }

  /** Asks once who is signed in; without a signal it is the person kept on this device. */
  function known(): Promise<void> {
    asked ??= load();
    return asked;
  }

  async function load(): Promise<void> {
    const answer = await askSession();
    if (answer.ok) adopt(answer.value);
    else if (answer.problem.status === 0 || answer.problem.status >= 500) me.value = keptObject('me', isMe);
    else me.value = undefined;
  }

  async function signIn(form: SignInForm): Promise<Problem | undefined> {
    const answer = await askSignIn(form);
    if (!answer.ok) return answer.problem;
    asked = Promise.resolve();
    adopt(answer.value);
    return undefined;
  }

  /** The server ends the session; without a signal nothing is ended, and the caller says so. */
  async function signOut(everywhere = false): Promise<Problem | undefined> {
    const answer = everywhere ? await askSignOutEverywhere() : await askSignOut();
    if (!answer.ok && answer.problem.status !== 401) return answer.problem;
    leave();
    return undefined;
  }

  function has(role: Role): boolean {
    return me.value?.roles.includes(role) === true;
  }

  /** Signing asks for the password too, once the session's own is older than the server allows. */
  function needsPasswordToSign(now: Date): boolean {
    return me.value === undefined || now >= new Date(me.value.signingFreshUntil);
  }

  return { me, actor, ended, known, load, adopt, signIn, signOut, has, needsPasswordToSign };
});
