import type { EntityManager } from 'typeorm';
import type { Command, CommandOf, RecordEntry } from '../../shared/contracts/commands';
import { settingNames } from '../../shared/job/plan';
import type { Head, Instrument, Settings } from '../../shared/job/plan';
import type { JobState } from '../../shared/job/state';
import { Account } from '../entities/account';
import { filesUploadedBy } from './files-uploaded-by';
import { findCatalogueItem } from './find-catalogue-item';
import { findJobPerson } from './find-job-person';
import { turned } from './command-answer';
import type { Turned } from './command-answer';

/** What a command is completed against: the job as it stands and who gives it. */
export interface Standing {
  state: JobState;
  accountId: string;
}

/**
 * Puts the server's own knowledge in the place of what a caller claims: a photo's pixels, a person's name and
 * qualifications, a head's dimensions, an instrument's calibration, where a setting comes from. Everything else goes to the rules as it came.
 */
export async function completeCommand(
  manager: EntityManager,
  command: Command,
  standing: Standing,
): Promise<{ ok: true; command: Command } | Turned> {
  switch (command.type) {
    case 'record':
      return completeHands(manager, command, standing);
    case 'add-photo':
      return completePhoto(manager, command, standing);
    case 'change-terms': {
      const { terms } = command.body;
      const settings = namingSources(terms.settings, standing.state.plan.terms.settings);
      return { ok: true, command: { ...command, body: { ...command.body, terms: { ...terms, settings } } } };
    }
    case 'assign-person': {
      const { accountId, role } = command.body.person;
      const found = await findJobPerson(manager, accountId, role);
      if (!found.ok) return turned(422, `command.${found.fault}`);
      return { ok: true, command: { ...command, body: { person: found.person } } };
    }
    case 'add-instrument': {
      const instrument = await findCatalogueItem<Instrument>(manager, 'instrument', command.body.instrument.id);
      if (!instrument) return turned(422, 'command.instrument-unknown');
      return { ok: true, command: { ...command, body: { instrument } } };
    }
    case 'set-again': {
      const head = await findCatalogueItem<Head>(manager, 'head', command.body.head.id);
      if (!head) return turned(422, 'command.head-unknown');
      return { ok: true, command: { ...command, body: { ...command.body, head } } };
    }
    default:
      return { ok: true, command };
  }
}

/** Whoever is said to have measured under an account is called by that account's name. */
async function completeHands(
  manager: EntityManager,
  command: CommandOf<'record'>,
  { state }: Standing,
): Promise<{ ok: true; command: Command } | Turned> {
  const names = new Map(state.people.map((one) => [one.accountId, one.name]));
  const entries: RecordEntry[] = [];
  for (const entry of command.body.entries) {
    const { accountId } = entry.measuredBy ?? {};
    if (!accountId) {
      entries.push(entry);
      continue;
    }
    const name = names.get(accountId) ?? (await manager.findOneBy(Account, { id: accountId }))?.name;
    if (name === undefined) return turned(422, 'command.person-unknown');
    entries.push({ ...entry, measuredBy: { accountId, name } });
  }
  return { ok: true, command: { ...command, body: { ...command.body, entries } } };
}

/** A setting that is not as it was is the operator's from now on, whatever the caller says of it. */
const namingSources = (asked: Settings, before: Settings): Settings =>
  Object.fromEntries(
    settingNames.map((name) => {
      const { value } = asked[name];
      return [name, value === before[name].value ? before[name] : { value, source: 'job' as const }];
    }),
  ) as Settings;

/** Evidence is what its recorder sent himself, to this job; how large it is, is read from the stored bytes. */
async function completePhoto(
  manager: EntityManager,
  command: CommandOf<'add-photo'>,
  { state, accountId }: Standing,
): Promise<{ ok: true; command: Command } | Turned> {
  const { sha256, previewSha256 } = command.body;
  const named = previewSha256 === null ? [sha256] : [sha256, previewSha256];
  const files = await filesUploadedBy(manager, state.id, accountId, named);
  if (named.some((one) => !files.has(one))) return turned(422, 'command.file-not-sent');
  if (named.some((one) => !files.get(one)?.width)) return turned(422, 'command.file-no-photo');
  const { width, height } = files.get(sha256) ?? {};
  if (!width || !height) return turned(422, 'command.file-no-photo');
  return { ok: true, command: { ...command, body: { ...command.body, width, height } } };
}
