import { describe, expect, it } from 'vitest';
import { commandTypes } from '../../../shared/contracts/commands';
import { can, commandGrants, commandPermission, grants, roleFor, roles } from '../../../shared/permissions';
import type { Actor, JobScope, Permission, Role } from '../../../shared/permissions';

const actor = (role: Role | Role[], operatorIds: string[] = []): Actor => ({
  accountId: 'me',
  name: 'W. Calder',
  roles: [role].flat(),
  operatorIds,
});
const job = (people: JobScope['people'], status: JobScope['status'] = 'running'): JobScope => ({
  people,
  operatorId: 'marrow-creek',
  status,
});
const onIt = (role: Role) => job([{ accountId: 'me', role }]);
const nobodyOnIt = job([{ accountId: 'somebody', role: 'welder' }]);

describe('who may do what', () => {
  it('gives every command to somebody', () => {
    for (const type of commandTypes) expect(commandGrants[type].length, type).toBeGreaterThan(0);
  });

  it('never lets a coordinator release, concede, reopen or seal', () => {
    for (const type of ['release', 'send-back', 'concede', 'reopen', 'seal', 'record', 'present'] as const) {
      expect(commandGrants[type], type).not.toContain('coordinator');
    }
  });

  it('keeps money from tool pusher and auditor', () => {
    expect(grants['ticket.read']).toEqual(['welder', 'company_rep', 'coordinator']);
  });

  it('gives an auditor nothing that changes anything', () => {
    for (const type of commandTypes) expect(commandGrants[type], type).not.toContain('auditor');
    expect(grants['file.put']).not.toContain('auditor');
  });

  it.each(['welder', 'company_rep', 'tool_pusher'] as const)('hides a job from a %s who is not on it', (role) => {
    for (const permission of Object.keys(grants) as Permission[]) {
      if (
        permission === 'job.command.plan-job' ||
        !/^(job\.read|job\.command|packet\.read|file\.|ticket)/.test(permission)
      )
        continue;
      expect(can(actor(role), permission, nobodyOnIt), permission).toBe('not-found');
    }
  });

  it('answers forbidden to somebody on the job in another role', () => {
    expect(can(actor('welder'), commandPermission('release'), onIt('welder'))).toBe('forbidden');
    expect(can(actor('tool_pusher'), commandPermission('record'), onIt('tool_pusher'))).toBe('forbidden');
    expect(can(actor('coordinator'), commandPermission('release'), nobodyOnIt)).toBe('forbidden');
  });

  it('counts the role held on the job, not another that the account has', () => {
    const both = actor(['welder', 'coordinator']);
    expect(can(both, commandPermission('record'), nobodyOnIt)).toBe('forbidden');
    expect(can(both, commandPermission('record'), onIt('welder'))).toBe('yes');
    expect(can(actor('tool_pusher'), commandPermission('record'), onIt('welder'))).toBe('not-found');
  });

  it('shows an auditor finished jobs of the operators granted, and no others', () => {
    const granted = actor('auditor', ['marrow-creek']);
    for (const status of ['planned', 'running'] as const) {
      expect(can(granted, 'packet.read', job([], status))).toBe('not-found');
    }
    for (const status of ['sealed', 'called-off'] as const) {
      expect(can(granted, 'packet.read', job([], status))).toBe('yes');
      expect(can(granted, 'file.get', job([], status))).toBe('yes');
      expect(can(granted, 'job.read', job([], status))).toBe('forbidden');
      expect(can(actor('auditor', ['another']), 'packet.read', job([], status))).toBe('not-found');
    }
  });

  it('answers not found when there is no job', () => {
    expect(can(actor('coordinator'), 'job.read')).toBe('not-found');
  });

  it('asks for no job where there is none yet', () => {
    for (const role of roles) {
      expect(can(actor(role), 'job.command.plan-job'), role).toBe(role === 'coordinator' ? 'yes' : 'forbidden');
    }
  });

  it('names the role under which an act is recorded', () => {
    const both = actor(['coordinator', 'welder']);
    expect(roleFor(both, commandPermission('record'), onIt('welder'))).toBe('welder');
    expect(roleFor(both, commandPermission('stop-work'), nobodyOnIt)).toBe('coordinator');
    expect(roleFor(both, 'job.plan')).toBe('coordinator');
    expect(roleFor(actor('auditor'), 'job.plan')).toBeUndefined();
  });
});
