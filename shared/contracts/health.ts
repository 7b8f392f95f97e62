import { z } from 'zod';
import { defineRoute } from './contract';

export const healthz = defineRoute({
  method: 'get',
  path: '/healthz',
  permission: 'public',
  response: z.strictObject({ status: z.literal('up') }),
  summary: 'The process answers',
});

export const readyz = defineRoute({
  method: 'get',
  path: '/readyz',
  permission: 'public',
  response: z.strictObject({ status: z.literal('ready') }),
  summary: 'The process and its database answer; 503 when the database does not',
});

export const openApiDocument = defineRoute({
  method: 'get',
  path: '/api/openapi.json',
  permission: 'public',
  response: z.looseObject({ openapi: z.string() }),
  summary: 'This document',
});

export const healthRoutes = [healthz, readyz, openApiDocument];
