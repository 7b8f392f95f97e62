import type { changePassword, changePin, changePreferences } from '../../shared/contracts/account';
import type { BodyOf, ResponseOf } from '../../shared/contracts/contract';
import type { demoAccounts, listDevices, readSession, signIn } from '../../shared/contracts/session';
import { ask } from './client';

export type SignInForm = BodyOf<typeof signIn>;
export type DemoAccount = ResponseOf<typeof demoAccounts>['accounts'][number];

/** The doors of sign-in and account. Wrong passwords answer 401 and end nothing. */
export const askSession = () => ask<ResponseOf<typeof readSession>>('GET', '/api/session', { expects401: true });
export const askSignIn = (body: SignInForm) =>
  ask<ResponseOf<typeof signIn>>('POST', '/api/session', { body, expects401: true });
export const askSignOut = () => ask<undefined>('DELETE', '/api/session', { expects401: true });
export const askDemoAccounts = () =>
  ask<ResponseOf<typeof demoAccounts>>('GET', '/api/demo-accounts', { expects401: true });
export const askDevices = () => ask<ResponseOf<typeof listDevices>>('GET', '/api/sessions');
export const askSignOutEverywhere = () => ask<undefined>('DELETE', '/api/sessions', { expects401: true });
export const askNewPassword = (body: BodyOf<typeof changePassword>) =>
  ask<undefined>('PUT', '/api/account/password', { body, expects401: true });
export const askNewPin = (body: BodyOf<typeof changePin>) =>
  ask<undefined>('PUT', '/api/account/pin', { body, expects401: true });
export const askPreferences = (body: BodyOf<typeof changePreferences>) =>
  ask<ResponseOf<typeof changePreferences>>('PUT', '/api/account/preferences', { body });
