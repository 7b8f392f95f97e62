import { Account } from './account';
import { AccountRole } from './account-role';
import { AttemptThrottle } from './attempt-throttle';
import { CatalogueItem } from './catalogue-item';
import { JobFile } from './job-file';
import { JobFileUploader } from './job-file-uploader';
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
  JobFile,
  JobFileUploader,
  Operator,
  OperatorGrant,
  Rig,
  SessionRow,
  UploadCount,
];
