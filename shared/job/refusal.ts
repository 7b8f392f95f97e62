import type { Text, TextParam } from '../locales/text';
import type { Verdict } from '../hold-points/verdict';
import type { ActorStamp, Times } from './actor';

/**
 * Why a command was not carried out. `conflict`: somebody was faster or the content moved (409, with who and when);
 * `blocked`: a rule stands in the way (422); `forbidden`: not this person's to do (403).
 */
export interface Refusal {
  code: RefusalCode;
  kind: 'conflict' | 'blocked' | 'forbidden';
  text: Text;
  /** who was faster, and when */
  since: { by: ActorStamp; at: Times } | null;
  /** what stands in the way, one by one */
  blockers: Verdict[];
  /** keys of what is not there yet: `field:…`, `shot:…`, `act:…`, `statement:…`, `concession:…` */
  missing: string[];
}

export const refusalCodes = {
  'already-planned': 'conflict',
  'not-running': 'conflict',
  'no-such-point': 'blocked',
  'point-shut': 'conflict',
  'point-not-open': 'conflict',
  'point-presented': 'conflict',
  'point-not-presented': 'conflict',
  'point-already-released': 'conflict',
  'point-not-released': 'conflict',
  'content-changed': 'conflict',
  'no-such-field': 'blocked',
  'not-understood': 'blocked',
  'same-person-measured': 'blocked',
  'first-measurement-missing': 'blocked',
  'measurer-not-on-job': 'blocked',
  'of-earlier-setting': 'conflict',
  'no-such-shot': 'blocked',
  'no-such-photo': 'blocked',
  'no-such-row': 'blocked',
  'row-struck': 'conflict',
  'no-such-act': 'blocked',
  'act-not-ready': 'blocked',
  'act-running': 'conflict',
  'act-not-running': 'conflict',
  'not-complete': 'blocked',
  'outside-stop': 'blocked',
  'outside-hold': 'blocked',
  'statements-missing': 'blocked',
  'own-evidence': 'forbidden',
  'not-the-owner': 'forbidden',
  'not-yours-to-do': 'forbidden',
  'cannot-concede-stop': 'blocked',
  'nothing-to-concede': 'blocked',
  'verdict-moved': 'conflict',
  'no-round-here': 'blocked',
  'round-under-way': 'conflict',
  'head-already-set': 'blocked',
  'work-stopped': 'blocked',
  'work-not-stopped': 'conflict',
  'not-ready-to-resume': 'blocked',
  'terms-in-use': 'blocked',
  'terms-need-signature': 'forbidden',
  'instrument-already-listed': 'conflict',
  'instruments-full': 'blocked',
  'person-not-on-job': 'blocked',
  'role-already-held': 'conflict',
  'roles-not-together': 'blocked',
  'direction-without-words': 'blocked',
  'last-of-role': 'blocked',
  'not-all-released': 'blocked',
  'concessions-miscounted': 'conflict',
  'plan-not-workable': 'blocked',
} as const satisfies Record<string, Refusal['kind']>;
export type RefusalCode = keyof typeof refusalCodes;

type Extra = Partial<Pick<Refusal, 'since' | 'blockers' | 'missing'>> & { params?: Record<string, TextParam> };

/** A refusal as a value; its sentence is `refusals.<code>`. */
export const refusal = (code: RefusalCode, extra: Extra = {}): Refusal => ({
  code,
  kind: refusalCodes[code],
  text: extra.params ? { key: `refusals.${code}`, params: extra.params } : { key: `refusals.${code}` },
  since: extra.since ?? null,
  blockers: extra.blockers ?? [],
  missing: extra.missing ?? [],
});
