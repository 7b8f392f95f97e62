import { In, type EntityManager } from 'typeorm';
import { JobFile } from '../entities/job-file';
import { JobFileUploader } from '../entities/job-file-uploader';

/**
 * Of the named files, those that this account sent to this job, with what is known of them.
 * What is missing in the answer may not be named by a command of this account.
 */
export async function filesUploadedBy(
  manager: EntityManager,
  jobId: string,
  accountId: string,
  sha256: readonly string[],
): Promise<ReadonlyMap<string, JobFile>> {
  if (sha256.length === 0) return new Map();
  const sent = await manager.findBy(JobFileUploader, { jobId, accountId, sha256: In([...sha256]) });
  if (sent.length === 0) return new Map();
  const files = await manager.findBy(JobFile, { jobId, sha256: In(sent.map((each) => each.sha256)) });
  return new Map(files.map((file) => [file.sha256, file]));
}
