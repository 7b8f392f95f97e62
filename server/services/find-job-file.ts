import type { DataSource } from 'typeorm';
import { JobFile } from '../entities/job-file';

/** What is known of a job's file, or null when nobody sent it to this job. */
export function findJobFile(dataSource: DataSource, jobId: string, sha256: string): Promise<JobFile | null> {
  return dataSource.getRepository(JobFile).findOneBy({ jobId, sha256 });
}
