import type { WireEvent } from '../../shared/contracts/jobs';
import type { Refusal } from '../../shared/job/refusal';
import type { ChainLink } from '../../shared/ledger/chain';
import type { PermissionAnswer } from '../../shared/permissions';

/** A command was not looked at by the job's rules, and nothing is kept of it: the same command may be sent again. */
export interface Turned {
  ok: false;
  kind: 'turned';
  status: 403 | 404 | 409 | 422 | 429;
  /** message key under `errors` */
  code: string;
  retryAfter?: number;
}

/** The job's rules refused it. Sent again it is refused alike; what mends it is a new command. */
export interface Refused {
  ok: false;
  kind: 'refused';
  status: 403 | 409 | 422;
  refusal: Refusal;
}

export interface Recorded {
  ok: true;
  events: WireEvent[];
  seq: number;
  /** answered from its receipt */
  replayed: boolean;
  /** both components of the signature were given: the session counts as opened with the password now */
  passwordGiven: boolean;
}

export type CommandAnswer = Recorded | Refused | Turned;

export const turned = (status: Turned['status'], code: string, retryAfter?: number): Turned => ({
  ok: false,
  kind: 'turned',
  status,
  code,
  ...(retryAfter !== undefined && { retryAfter }),
});

const statusOf = { conflict: 409, blocked: 422, forbidden: 403 } as const satisfies Record<Refusal['kind'], number>;

export const refused = (refusal: Refusal): Refused => ({
  ok: false,
  kind: 'refused',
  status: statusOf[refusal.kind],
  refusal,
});

/** The answer for who may not: 404 hides the job, 403 names the role. Null when he may. */
export function turnedBy(answer: PermissionAnswer): Turned | null {
  switch (answer) {
    case 'yes':
      return null;
    case 'not-found':
      return turned(404, 'permission.not-found');
    case 'forbidden':
      return turned(403, 'permission.forbidden');
  }
}

/** A link as it travels: the body as JSON, whose canonical spelling is the stored text. */
export const toWire = ({ body, ...link }: ChainLink): WireEvent => ({
  ...link,
  body: JSON.parse(body) as WireEvent['body'],
});
