import type { DataSource, EntityTarget, ObjectLiteral } from 'typeorm';
import { JobFile } from '../entities/job-file';
import { JobFileUploader } from '../entities/job-file-uploader';
import type { JobFileRegister } from './store-file';

/** The register of a job's files in the database: file and sender in one transaction, each written once. */
export function jobFileRegister(dataSource: DataSource, clock: () => Date): JobFileRegister {
  return {
    register: (jobId, file, accountId) =>
      dataSource.transaction(async (manager) => {
        const once = (table: EntityTarget<ObjectLiteral>, row: ObjectLiteral) =>
          manager.createQueryBuilder().insert().into(table).values(row).orIgnore().execute();
        const createdAt = clock();
        await once(JobFile, { jobId, ...file, uploadedBy: accountId, createdAt });
        await once(JobFileUploader, { jobId, sha256: file.sha256, accountId, createdAt });
      }),
  };
}
