import { z } from 'zod';
import { defineRoute } from './contract';

export const readClock = defineRoute({
  method: 'get',
  path: '/api/clock',
  permission: 'signed-in',
  response: z.strictObject({ now: z.iso.datetime() }),
  summary: "The server's time, for measuring how far a device's clock is off",
});

export const clockRoutes = [readClock];
