import type { Request, Response } from 'express';
import { sendFile } from '../middleware/file-answer';
import { Problem } from '../middleware/problem';
import type { AppDeps } from '../services/deps';
import { findJobFile } from '../services/find-job-file';
import type { FileStorage } from '../storage/file-storage';

interface FileAsked {
  readonly params: { readonly id: string; readonly sha256: string };
  readonly req: Request;
  readonly res: Response;
}

/** Answers with a job's file, whether the job runs or lies in a packet; one that nobody sent to this job is not found. */
export async function answerFile(
  deps: AppDeps,
  storage: FileStorage,
  { params, req, res }: FileAsked,
): Promise<undefined> {
  const file = await findJobFile(deps.dataSource, params.id, params.sha256);
  if (!file) throw new Problem(404, 'permission.not-found');
  const stored = await storage.open({ jobId: params.id, sha256: file.sha256 });
  if (!stored) throw new Error('a file of the record is not in the storage');
  await sendFile(req, res, file, stored);
  return undefined;
}
