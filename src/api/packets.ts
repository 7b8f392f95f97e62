import type { ResponseOf } from '../../shared/contracts/contract';
import type { JobEvents, JobSummary } from '../../shared/contracts/jobs';
import type { listPackets, readPacket } from '../../shared/contracts/packets';
import { ask } from './client';

export type { JobSummary };
export type PacketPage = ResponseOf<typeof listPackets>;
export type PacketAnswer = ResponseOf<typeof readPacket>;

const place = (id: string) => `/api/packets/${encodeURIComponent(id)}`;

/** Sealed and called-off jobs. `after` is the page's key as the page before gave it. */
export const askPackets = (q: string, after?: string) =>
  ask<PacketPage>('GET', '/api/packets', { query: { q, after } });

export const askPacket = (id: string) => ask<PacketAnswer>('GET', place(id));
export const askPacketEvents = (id: string, after: number) =>
  ask<JobEvents>('GET', `${place(id)}/events`, { query: { after } });

/** Where a photo of the packet is fetched. */
export const packetFileAddress = (id: string, sha256: string): string => `${place(id)}/files/${sha256}`;
