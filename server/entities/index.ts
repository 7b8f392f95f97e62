import { Account } from './account';
import { AccountRole } from './account-role';
import { AttemptThrottle } from './attempt-throttle';
import { CatalogueItem } from './catalogue-item';
import { Operator } from './operator';
import { OperatorGrant } from './operator-grant';
import { Rig } from './rig';
import { SessionRow } from './session-row';

/** Every table there is. One line for each. */
export const entities = [
  Account,
  AccountRole,
  AttemptThrottle,
  CatalogueItem,
  Operator,
  OperatorGrant,
  Rig,
  SessionRow,
];
