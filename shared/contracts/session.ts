import { z } from 'zod';
import { roles } from '../permissions/roles';
import { defineRoute } from './contract';

export const preferencesSchema = z.strictObject({
  language: z.enum(['en', 'es']),
  units: z.enum(['imperial', 'metric']),
  theme: z.enum(['day', 'night', 'system']),
});
export type Preferences = z.infer<typeof preferencesSchema>;

/** The person signed in. `passwordAt`: when this session last had the password; signing asks for the PIN alone until 12 hours later. */
export const meSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  roles: z.array(z.enum(roles)),
  operatorIds: z.array(z.string()),
  preferences: preferencesSchema,
  hasPin: z.boolean(),
  passwordAt: z.iso.datetime(),
  signingFreshUntil: z.iso.datetime(),
});
export type Me = z.infer<typeof meSchema>;

/** One device that is signed in. */
export const deviceSchema = z.strictObject({
  id: z.uuid(),
  userAgent: z.string(),
  createdAt: z.iso.datetime(),
  seenAt: z.iso.datetime(),
  current: z.boolean(),
});
export type Device = z.infer<typeof deviceSchema>;

export const signIn = defineRoute({
  method: 'post',
  path: '/api/session',
  permission: 'public',
  request: z.strictObject({ email: z.string().trim().min(3).max(254), password: z.string().min(1).max(1000) }),
  response: meSchema,
  summary: 'Sign in with e-mail and password',
});

export const readSession = defineRoute({
  method: 'get',
  path: '/api/session',
  permission: 'signed-in',
  response: meSchema,
  summary: 'Who is signed in',
});

export const signOut = defineRoute({
  method: 'delete',
  path: '/api/session',
  permission: 'public',
  response: 'nothing',
  summary: 'Sign out on this device',
});

export const listDevices = defineRoute({
  method: 'get',
  path: '/api/sessions',
  permission: 'account.self',
  response: z.strictObject({ devices: z.array(deviceSchema) }),
  summary: 'The devices that are signed in',
});

export const signOutEverywhere = defineRoute({
  method: 'delete',
  path: '/api/sessions',
  permission: 'account.self',
  response: 'nothing',
  summary: 'Sign out on every device, this one included',
});

export const demoAccounts = defineRoute({
  method: 'get',
  path: '/api/demo-accounts',
  permission: 'public',
  response: z.strictObject({
    accounts: z.array(
      z.strictObject({
        name: z.string(),
        email: z.string(),
        password: z.string(),
        pin: z.string(),
        roles: z.array(z.enum(roles)),
      }),
    ),
  }),
  summary: 'The demo accounts in demo mode, which exists on loopback only; none otherwise',
});

export const sessionRoutes = [signIn, readSession, signOut, listDevices, signOutEverywhere, demoAccounts];
