import type { CommandType } from '../contracts/commands';
import type { Role } from './roles';

/**
 * Who may give which command, by the role held on the job. What a role may do only in some places stands in `decide`:
 * a tool pusher releases and sends back `valve-orientation` alone, a coordinator changes terms before point 1 is released.
 * Any coordinator may stop work: stopping is never wrong for want of a paper.
 */
export const commandGrants: Record<CommandType, readonly Role[]> = {
  'plan-job': ['coordinator'],
  record: ['welder'],
  'add-photo': ['welder'],
  'set-photo-aside': ['welder'],
  'strike-row': ['welder'],
  'begin-act': ['welder'],
  'end-act': ['welder'],
  present: ['welder'],
  withdraw: ['welder'],
  release: ['company_rep', 'tool_pusher'],
  'send-back': ['company_rep', 'tool_pusher'],
  concede: ['company_rep'],
  reopen: ['company_rep'],
  'open-repair-round': ['company_rep'],
  'set-again': ['company_rep'],
  'name-direction': ['tool_pusher'],
  'propose-direction': ['coordinator'],
  'stop-work': ['welder', 'company_rep', 'tool_pusher', 'coordinator'],
  'resume-work': ['company_rep'],
  'change-terms': ['company_rep', 'coordinator'],
  'hand-over': ['welder', 'company_rep', 'tool_pusher'],
  'add-instrument': ['welder', 'coordinator'],
  'assign-person': ['coordinator'],
  'remove-person': ['coordinator'],
  'call-off': ['company_rep'],
  seal: ['company_rep'],
};

/** The permission that a command of this type asks for. */
export const commandPermission = <T extends CommandType>(type: T) => `job.command.${type}` as const;
