import { Account } from '../entities/account';
import type { AppDeps } from '../services/deps';
import { loadDemoCatalogue } from './load-catalogue';
import { loadDemoPeople } from './load-people';

/** Loads the invented scenario into an empty installation; one that has accounts is left alone. */
export async function loadDemo(deps: AppDeps): Promise<boolean> {
  if ((await deps.dataSource.getRepository(Account).count()) > 0) return false;
  await loadDemoCatalogue(deps);
  await loadDemoPeople(deps);
  return true;
}
