import { extendZodWithOpenApi, OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi';
import type { ResponseConfig, RouteConfig } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';
import { allRoutes } from '../../shared/contracts';
import type { RouteContract } from '../../shared/contracts/contract';
import { problemSchema } from '../../shared/contracts/problem';

extendZodWithOpenApi(z);

const problem: ResponseConfig = {
  description: 'A problem (RFC 9457); `code` is a message key',
  content: { 'application/problem+json': { schema: problemSchema } },
};

const binary = { type: 'string', format: 'binary' } as const;
const mediaTypes = {
  bytes: 'application/octet-stream',
  form: 'multipart/form-data',
  events: 'text/event-stream',
} as const;

function success({ response, status }: RouteContract): Record<string, ResponseConfig> {
  if (response === 'nothing') return { 204: { description: 'Done' } };
  const content =
    typeof response === 'string'
      ? { [mediaTypes[response]]: { schema: binary } }
      : { 'application/json': { schema: response } };
  return { [status ?? 200]: { description: 'Good', content } };
}

function pathOf(route: RouteContract): RouteConfig {
  const { method, path, summary, permission, params, query, request } = route;
  const body =
    request === undefined
      ? undefined
      : typeof request === 'string'
        ? { content: { [mediaTypes[request]]: { schema: binary } } }
        : { content: { 'application/json': { schema: request } } };
  return {
    method,
    path,
    summary,
    description: `Permission: ${permission}`,
    security: permission === 'public' ? [] : [{ session: [] }],
    request: { ...(params && { params }), ...(query && { query }), ...(body && { body }) },
    responses: { ...success(route), default: problem },
  };
}

let made: ReturnType<OpenApiGeneratorV31['generateDocument']> | undefined;

/** The API in OpenAPI 3.1, made once from the contracts themselves. */
export function openApiDocument() {
  if (made) return { ...made };
  const registry = new OpenAPIRegistry();
  registry.registerComponent('securitySchemes', 'session', { type: 'apiKey', in: 'cookie', name: 'headfast' });
  for (const route of allRoutes) registry.registerPath(pathOf(route));
  made = new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Headfast', version: '1', description: 'A slip-on-weld casing head job from planned to sealed.' },
  });
  return { ...made };
}
