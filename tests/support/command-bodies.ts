import type { CommandOf, CommandType } from '../../shared/contracts/commands';
import type { Head, Instrument } from '../../shared/job/plan';
import { demoHeads } from '../../server/demo/heads';
import { demoInstruments } from '../../server/demo/instruments';
import { demoPeopleByKey } from '../../server/demo/people';
import { aPlan } from './a-plan';
import { sha256, shown } from './a-job-on';

const first = 'hot-work-clearance';
const signed = { contentHash: sha256('nothing'), shown };
const reason = 'Because it is so';
const anInstrument = demoInstruments(new Date('2026-09-14'))[0] as Instrument;
const nobody = '01940000-0000-7000-8000-0000000000ff';

/** A well-formed body of every command, which a job that is only planned mostly refuses: what is asked is who may. */
export const commandBodies: { [T in CommandType]: CommandOf<T>['body'] } = {
  'plan-job': { plan: aPlan() },
  record: { point: first, entries: [{ field: 'no-such-field', typed: '1', unit: null, measuredBy: null }] },
  'add-photo': {
    point: first,
    shot: 'meter-at-cellar',
    sha256: sha256('never sent'),
    previewSha256: null,
    width: 1,
    height: 1,
    takenAt: null,
  },
  'set-photo-aside': { point: first, photo: 'none', reason },
  'strike-row': { point: first, group: 'rods', row: 1, reason },
  'begin-act': { point: first, act: 'no-such-act' },
  'end-act': { point: first, act: 'no-such-act' },
  present: { point: first, ...signed },
  withdraw: { point: first, reason: null },
  release: { point: first, statements: [], ...signed },
  'send-back': { point: first, reason, contentHash: signed.contentHash },
  concede: { point: first, items: [{ limit: 'none', basis: [], reason }], ...signed },
  reopen: { point: first, reason, ...signed },
  'open-repair-round': { reason, passes: 1, ...signed },
  'set-again': { reason, head: demoHeads[0] as Head, targetHeightIn: '5', ...signed },
  'name-direction': { direction: 'v-door', words: null },
  'propose-direction': { direction: 'v-door' },
  'stop-work': { reason },
  'resume-work': { note: reason, ...signed },
  'change-terms': { terms: aPlan().terms, reason, ...signed },
  'hand-over': { line: reason, to: null },
  'add-instrument': { instrument: { ...anInstrument, id: nobody } },
  'assign-person': { person: { accountId: nobody, name: 'Nobody', role: 'welder', qualifications: [] } },
  'remove-person': { accountId: demoPeopleByKey.auditor.id, role: 'welder', reason },
  'call-off': { reason, ...signed },
  seal: { concessions: 0, ...signed },
};
