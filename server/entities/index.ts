import { Account } from './account';
import { AccountRole } from './account-role';
import { AttemptThrottle } from './attempt-throttle';
import { CatalogueItem } from './catalogue-item';
import { CommandReceipt } from './command-receipt';
import { DeskView } from './desk-view';
import { JobEventRow } from './job-event';
import { JobFile } from './job-file';
import { JobFileUploader } from './job-file-uploader';
import { JobHead } from './job-head';
import { JobPersonView } from './job-person-view';
import { JobView } from './job-view';
import { Operator } from './operator';
import { OperatorGrant } from './operator-grant';
import { Rig } from './rig';
import { SessionRow } from './session-row';
import { UploadCount } from './upload-count';

/** Every table there is. One line for each. */
export const entities = [
  Account,
  AccountRole,
  AttemptThrottle,
  CatalogueItem,
  CommandReceipt,
  DeskView,
  JobEventRow,
  JobFile,
  JobFileUploader,
  JobHead,
  JobPersonView,
  JobView,
  Operator,
  OperatorGrant,
  Rig,
  SessionRow,
  UploadCount,
];
