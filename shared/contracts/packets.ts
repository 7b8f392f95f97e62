import { z } from 'zod';
import { roles } from '../permissions/roles';
import { defineRoute } from './contract';
import { getFile } from './files';
import { eventsQuery, eventsSchema, jobAddress, jobSummarySchema, pageAfter } from './jobs';

/** What recomputing the chain found: that it holds, or the first link that does not and why. */
export const verificationSchema = z.union([
  z.strictObject({ holds: z.literal(true), links: z.int(), head: z.string() }),
  z.strictObject({
    holds: z.literal(false),
    seq: z.int(),
    why: z.enum(['gap', 'prev', 'hash', 'unreadable', 'cut-short']),
  }),
]);
export type Verification = z.infer<typeof verificationSchema>;

export const listPackets = defineRoute({
  method: 'get',
  path: '/api/packets',
  permission: 'packet.list',
  query: z.strictObject({ q: z.string().max(120).optional(), after: pageAfter }),
  response: z.strictObject({ packets: z.array(jobSummarySchema), next: z.string().nullable() }),
  summary:
    'Sealed and called-off jobs that the reader may read, newest first; `q` looks through operator, rig, well, casing',
});

export const readPacket = defineRoute({
  method: 'get',
  path: '/api/packets/{id}',
  permission: 'packet.read',
  params: jobAddress,
  response: z.strictObject({
    packet: jobSummarySchema,
    roles: z.array(z.enum(roles)),
    verification: verificationSchema,
  }),
  summary: 'One packet with the result of recomputing its chain',
});

export const readPacketEvents = defineRoute({
  method: 'get',
  path: '/api/packets/{id}/events',
  permission: 'packet.read',
  params: jobAddress,
  query: eventsQuery,
  response: eventsSchema,
  summary: 'The whole story of a packet, event by event',
});

export const getPacketFile = defineRoute({
  method: 'get',
  path: '/api/packets/{id}/files/{sha256}',
  permission: 'packet.read',
  params: getFile.params,
  response: 'bytes',
  summary: 'The original bytes of a file of a packet',
});

export const packetRoutes = [listPackets, readPacket, readPacketEvents, getPacketFile];
