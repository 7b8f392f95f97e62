import type { EntityManager } from 'typeorm';
import type { Command, CommandOf } from '../../shared/contracts/commands';
import type { Head } from '../../shared/job/plan';
import type { JobState } from '../../shared/job/state';
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
 * qualifications, a head's dimensions. Everything else goes to the rules as it came.
 */
export async function completeCommand(
  manager: EntityManager,
  command: Command,
  standing: Standing,
): Promise<{ ok: true; command: Command } | Turned> {
  switch (command.type) {
    case 'add-photo':
      return completePhoto(manager, command, standing);
    case 'assign-person': {
      const { accountId, role } = command.body.person;
      const found = await findJobPerson(manager, accountId, role);
      if (!found.ok) return turned(422, `command.${found.fault}`);
      return { ok: true, command: { ...command, body: { person: found.person } } };
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
