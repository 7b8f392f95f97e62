import { Account } from '../entities/account';
import { JobHead } from '../entities/job-head';
import type { AppDeps } from '../services/deps';
import { loadDemoCatalogue } from './load-catalogue';
import { loadDemoJobs } from './load-jobs';
import { loadDemoPeople } from './load-people';
import { demoPeopleByKey } from './people';

/** Loads the invented scenario into an empty installation; one that has accounts or jobs of its own is left alone. */
export async function loadDemo(deps: AppDeps): Promise<boolean> {
  const { dataSource } = deps;
  const accounts = dataSource.getRepository(Account);
  if ((await accounts.count()) === 0) {
    await loadDemoCatalogue(deps);
    await loadDemoPeople(deps);
  }
  const isDemo = await accounts.existsBy({ id: demoPeopleByKey.coordinator.id, demo: true });
  if (!isDemo || (await dataSource.getRepository(JobHead).exists())) return false;
  await loadDemoJobs(deps);
  return true;
}
