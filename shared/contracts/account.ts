import { z } from 'zod';
import { defineRoute } from './contract';
import { preferencesSchema } from './session';

const password = z.string().min(1).max(1000);

export const changePassword = defineRoute({
  method: 'put',
  path: '/api/account/password',
  permission: 'account.self',
  request: z.strictObject({ current: password, next: password }),
  response: 'nothing',
  summary: 'Change the password; every other device is signed out',
});

export const changePin = defineRoute({
  method: 'put',
  path: '/api/account/pin',
  permission: 'account.self',
  request: z.strictObject({ password, pin: z.string().min(1).max(64) }),
  response: 'nothing',
  summary: 'Set the signing PIN',
});

export const changePreferences = defineRoute({
  method: 'put',
  path: '/api/account/preferences',
  permission: 'account.self',
  request: preferencesSchema,
  response: preferencesSchema,
  summary: 'Language, units and theme',
});

export const accountRoutes = [changePassword, changePin, changePreferences];
