import { useJobListStore } from '../stores/job-list';
import { useSessionStore } from '../stores/session';
import { landingFor } from './landing';

/**
 * The first page for whoever is signed in. A welder with one running job has one thing to do, so the list is left out;
 * with a longer list than one page nobody can tell, and the list is shown.
 */
export async function firstPage(): Promise<string> {
  const { me } = useSessionStore();
  const place = landingFor(me?.roles ?? []);
  if (place !== '/jobs' || me?.roles.includes('welder') !== true) return place;
  const list = useJobListStore();
  await list.load();
  const running = list.jobs.filter((job) => job.status === 'running');
  const [only] = running;
  return only !== undefined && running.length === 1 && list.next === null ? `/jobs/${only.id}` : place;
}
