import type { MigrationInterface } from 'typeorm';
import { AccountsAndCatalogue0001 } from './0001-accounts-and-catalogue';
import { Jobs0002 } from './0002-jobs';
import { JobFiles0003 } from './0003-job-files';

/**
 * Every migration in its order, one line for each; what has landed is never edited. A class is called for what it makes;
 * its `name` ends in a number of thirteen digits that grows, as TypeORM sorts by it.
 */
export const migrations: (new () => MigrationInterface)[] = [AccountsAndCatalogue0001, Jobs0002, JobFiles0003];
