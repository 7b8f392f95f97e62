import { definitionsVersion } from '../hold-points/definitions';
import type { Command, CommandOf, CommandType } from '../contracts/commands';
import type { HashText } from '../ledger/chain';
import { commandGrants } from '../permissions/commands';
import type { Times } from './actor';
import { accept, event, refuse, type Decider, type Decision, type Deciding, type JobActor } from './decision';
import {
  decideCallOff,
  decideOpenRepairRound,
  decideResumeWork,
  decideSeal,
  decideSetAgain,
  decideStopWork,
} from './decide-failure';
import { decideAddInstrument } from './decide-instrument';
import {
  decideAssignPerson,
  decideChangeTerms,
  decideHandOver,
  decideNameDirection,
  decideProposeDirection,
  decideRemovePerson,
} from './decide-people';
import { decidePresent, decideWithdraw } from './decide-present';
import { decideAddPhoto, decideBeginAct, decideEndAct, decideRecord, decideSetPhotoAside } from './decide-record';
import { decideStrikeRow } from './decide-strike';
import { decideConcede, decideRelease, decideReopen, decideSendBack } from './decide-release';
import { planRefused } from './plan-refused';
import { withTrueSources } from './settings';
import type { JobState } from './state';

type Running = Exclude<CommandType, 'plan-job'>;

const deciders: { [T in Running]: Decider<T> } = {
  record: decideRecord,
  'add-photo': decideAddPhoto,
  'set-photo-aside': decideSetPhotoAside,
  'strike-row': decideStrikeRow,
  'begin-act': decideBeginAct,
  'end-act': decideEndAct,
  present: decidePresent,
  withdraw: decideWithdraw,
  release: decideRelease,
  'send-back': decideSendBack,
  concede: decideConcede,
  reopen: decideReopen,
  'open-repair-round': decideOpenRepairRound,
  'set-again': decideSetAgain,
  'name-direction': decideNameDirection,
  'propose-direction': decideProposeDirection,
  'stop-work': decideStopWork,
  'resume-work': decideResumeWork,
  'change-terms': decideChangeTerms,
  'hand-over': decideHandOver,
  'add-instrument': decideAddInstrument,
  'assign-person': decideAssignPerson,
  'remove-person': decideRemovePerson,
  'call-off': decideCallOff,
  seal: decideSeal,
};

const planJob = (command: CommandOf<'plan-job'>, actor: JobActor, at: Times): Decision => {
  const { plan } = command.body;
  const unworkable = planRefused(plan, at);
  if (unworkable) return unworkable;
  const stamp = { accountId: actor.accountId, name: actor.name, role: 'coordinator' as const };
  return accept(
    event({ stamp, at, command }, 'job-planned', {
      plan: { ...plan, terms: withTrueSources(plan.terms) },
      definitions: definitionsVersion,
    }),
  );
};

/**
 * The one place where a command becomes events or a refusal. Pure: the phone asks it for the verdict at once, the
 * server asks it again under the row lock. `at` holds the three times; ages are judged by the corrected one.
 */
export const decide = (
  state: JobState | null,
  command: Command,
  actor: JobActor,
  at: Times,
  hash: HashText,
): Decision => {
  if (command.type === 'plan-job') return state ? refuse('already-planned') : planJob(command, actor, at);
  if (!state || state.ended) return refuse('not-running', { since: state?.ended ?? null });
  const role = commandGrants[command.type].find((one) => actor.roles.includes(one));
  if (!role) return refuse('not-yours-to-do');
  const stamp = { accountId: actor.accountId, name: actor.name, role };
  const decider = deciders[command.type] as (input: Deciding<Running>) => Decision;
  return decider({ state, command, actor, stamp, at, hash } as Deciding<Running>);
};
