import type { CommandType } from '../contracts/commands';
import { commandGrants } from './commands';
import type { Role } from './roles';

/** Permissions that concern one job: the answer depends on who is on it. Money is `ticket.read`. */
const jobGrants = {
  'job.read': ['welder', 'company_rep', 'tool_pusher', 'coordinator'],
  'packet.read': ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'],
  'file.get': ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'],
  'file.put': ['welder'],
  'ticket.read': ['welder', 'company_rep', 'coordinator'],
} as const satisfies Record<string, readonly Role[]>;

/** Permissions that concern no job in particular; a list then shows only what its reader may see. */
const houseGrants = {
  'job.plan': ['coordinator'],
  'job.list': ['welder', 'company_rep', 'tool_pusher', 'coordinator'],
  'packet.list': ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'],
  'desk.read': ['company_rep', 'tool_pusher'],
  'catalogue.read': ['welder', 'coordinator'],
  'heads.read': ['company_rep', 'coordinator'],
  'account.self': ['welder', 'company_rep', 'tool_pusher', 'auditor', 'coordinator'],
} as const satisfies Record<string, readonly Role[]>;

export type HousePermission = keyof typeof houseGrants;
export type CommandPermission = `job.command.${CommandType}`;
export type JobPermission = keyof typeof jobGrants | CommandPermission;
export type Permission = HousePermission | JobPermission;

const ofCommands = Object.fromEntries(
  Object.entries(commandGrants).map(([type, roles]) => [`job.command.${type}`, roles]),
) as Record<CommandPermission, readonly Role[]>;

/** Every permission with the roles that have it. */
export const grants: Record<Permission, readonly Role[]> = { ...houseGrants, ...jobGrants, ...ofCommands };

/** Whether a permission asks which job. Planning is a command, yet there is no job to be on before it. */
export const isJobPermission = (permission: Permission): permission is JobPermission =>
  permission !== 'job.command.plan-job' && !(permission in houseGrants);
