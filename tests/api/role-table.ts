import type { CommandType } from '../../shared/contracts/commands';
import type { Role } from '../../shared/permissions';

/**
 * Who gets which answer, written down by hand: nothing here is computed from the grants. 401 nobody is signed in, 403
 * the role does not do this, 404 the job is not yours to see; any other number is the answer of the deed itself.
 */
export interface HouseRow {
  nobody: number;
  each: Record<Role, number>;
}
export interface JobRow {
  nobody: number;
  /** on a job, or a packet, that the person is on or was granted */
  own: Record<Role, number>;
  /** on one that the person has nothing to do with */
  other: Record<Role, number>;
}

const five = (
  welder: number,
  company_rep: number,
  tool_pusher: number,
  auditor: number,
  coordinator: number,
): Record<Role, number> => ({ welder, company_rep, tool_pusher, auditor, coordinator });

const all = (status: number): Record<Role, number> => five(status, status, status, status, status);

/** Addresses that name no job. */
export const houseTable: Record<string, HouseRow> = {
  //                                               welder, company_rep, tool_pusher, auditor, coordinator
  'put /api/account/password': { nobody: 401, each: all(422) },
  'put /api/account/pin': { nobody: 401, each: all(422) },
  'put /api/account/preferences': { nobody: 401, each: all(422) },
  'get /api/catalogue': { nobody: 401, each: five(200, 403, 403, 403, 200) },
  'get /api/heads': { nobody: 401, each: five(403, 200, 403, 403, 200) },
  'get /api/clock': { nobody: 401, each: all(200) },
  'get /healthz': { nobody: 200, each: all(200) },
  'get /readyz': { nobody: 200, each: all(200) },
  'get /api/openapi.json': { nobody: 200, each: all(200) },
  'post /api/session': { nobody: 422, each: all(422) },
  'get /api/session': { nobody: 401, each: all(200) },
  'delete /api/session': { nobody: 204, each: all(204) },
  'get /api/sessions': { nobody: 401, each: all(200) },
  'delete /api/sessions': { nobody: 401, each: all(204) },
  'get /api/demo-accounts': { nobody: 200, each: all(200) },
  'get /api/jobs': { nobody: 401, each: five(200, 200, 200, 403, 200) },
  'post /api/jobs': { nobody: 401, each: five(403, 403, 403, 403, 422) },
  'get /api/desk': { nobody: 401, each: five(403, 200, 200, 403, 403) },
  'get /api/packets': { nobody: 401, each: all(200) },
};

/** Addresses that name a job, running, or from `/api/packets` on one that has ended. */
export const jobTable: Record<string, JobRow> = {
  //                                                                 welder, rep, pusher, auditor, coordinator
  'get /api/jobs/{id}': { nobody: 401, own: five(200, 200, 200, 404, 200), other: five(404, 404, 404, 404, 200) },
  'get /api/jobs/{id}/events': {
    nobody: 401,
    own: five(200, 200, 200, 404, 200),
    other: five(404, 404, 404, 404, 200),
  },
  'put /api/jobs/{id}/files/{sha256}': {
    nobody: 401,
    own: five(200, 403, 403, 404, 403),
    other: five(404, 404, 404, 404, 403),
  },
  'get /api/jobs/{id}/files/{sha256}': {
    nobody: 401,
    own: five(200, 200, 200, 404, 200),
    other: five(404, 404, 404, 404, 200),
  },
  'get /api/packets/{id}': { nobody: 401, own: all(200), other: five(404, 404, 404, 404, 200) },
  'get /api/packets/{id}/events': { nobody: 401, own: all(200), other: five(404, 404, 404, 404, 200) },
  'get /api/packets/{id}/files/{sha256}': { nobody: 401, own: all(200), other: five(404, 404, 404, 404, 200) },
};

/** The one address of all commands; who may give which stands below. */
export const commandAddress = 'post /api/jobs/{id}/commands';

/** A job that is planned, to which each command is sent once in this order. A tool pusher releases one point alone. */
export const commandTable: Record<CommandType, { own: Record<Role, number>; other: Record<Role, number> }> = {
  //                                 welder, rep, pusher, auditor, coordinator
  'plan-job': { own: five(403, 403, 403, 404, 409), other: five(404, 404, 404, 404, 409) },
  record: { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'add-photo': { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'set-photo-aside': { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'strike-row': { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'begin-act': { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'end-act': { own: five(409, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  present: { own: five(422, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  withdraw: { own: five(409, 403, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  release: { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'send-back': { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  concede: { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  reopen: { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'open-repair-round': { own: five(403, 422, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'set-again': { own: five(403, 422, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'name-direction': { own: five(403, 403, 200, 404, 403), other: five(404, 404, 404, 404, 403) },
  'propose-direction': { own: five(403, 403, 403, 404, 200), other: five(404, 404, 404, 404, 200) },
  'stop-work': { own: five(200, 200, 200, 404, 200), other: five(404, 404, 404, 404, 200) },
  'resume-work': { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  'change-terms': { own: five(403, 409, 403, 404, 409), other: five(404, 404, 404, 404, 409) },
  'hand-over': { own: five(200, 200, 200, 404, 403), other: five(404, 404, 404, 404, 403) },
  'add-instrument': { own: five(422, 403, 403, 404, 422), other: five(404, 404, 404, 404, 422) },
  'assign-person': { own: five(403, 403, 403, 404, 422), other: five(404, 404, 404, 404, 422) },
  'remove-person': { own: five(403, 403, 403, 404, 422), other: five(404, 404, 404, 404, 422) },
  'call-off': { own: five(403, 409, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
  seal: { own: five(403, 422, 403, 404, 403), other: five(404, 404, 404, 404, 403) },
};

/** On a packet that an auditor may read he does nothing at all. */
export const auditorOnPacket = 403;
