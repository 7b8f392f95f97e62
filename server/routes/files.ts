import { Router } from 'express';
import type { Request } from 'express';
import { getFile, putFile } from '../../shared/contracts/files';
import type { FileRefusal } from '../../shared/photos/refusals';
import { bytesOfBody, drainBody, kindOfBody, lengthOfBody } from '../middleware/file-body';
import { Problem } from '../middleware/problem';
import type { AppDeps } from '../services/deps';
import { findJobScope } from '../services/find-job-scope';
import { jobFileRegister } from '../services/register-job-file';
import { storeFile } from '../services/store-file';
import { takeUpload } from '../services/take-upload';
import { makeStorage } from '../storage/make-storage';
import { answerFile } from './answer-file';
import { mount } from './mount';

const statusOf = (code: FileRefusal): number =>
  code.endsWith('.too-large') ? 413 : code === 'file.incomplete' ? 400 : 422;

/** Sending and reading the files of a job. */
export function fileRoutes(deps: AppDeps): Router {
  const router = Router();
  const storage = makeStorage(deps.config, deps.ids);
  const register = jobFileRegister(deps.dataSource, deps.clock);
  const job = (params: { id: string }) => findJobScope(deps.dataSource, params.id);

  mount(
    router,
    putFile,
    async ({ params, account, req }) => {
      const kind = kindOfBody(req);
      const wait = await takeUpload(deps.dataSource, account.accountId, deps.clock());
      if (wait !== null) throw new Problem(429, 'file.too-often', { retryAfter: wait, params: { seconds: wait } });
      const sent = { jobId: params.id, sha256: params.sha256, kind, accountId: account.accountId };
      const result = await storeFile(
        { storage, register },
        { ...sent, stream: bytesOfBody(req), declaredLength: lengthOfBody(req) },
      ).catch((error: unknown) => brokenOff(req, error));
      if (result.ok) return result.file;
      await drainBody(req).catch(() => undefined);
      throw new Problem(statusOf(result.code), result.code);
    },
    { job },
  );

  mount(router, getFile, (asked) => answerFile(deps, storage, asked), { job });

  return router;
}

/** A sender that went away is no failure of the house. */
function brokenOff(req: Request, error: unknown): never {
  if (req.destroyed && !req.readableEnded) throw new Problem(400, 'file.incomplete');
  throw error;
}
