import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { rebuildProjections } from '../../server/services/rebuild-projections';
import { aJobOn } from '../support/a-job-on';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

let on: TestApp;
beforeAll(async () => {
  on = await startTestApp();
  const sealedOne = await aJobOn(on, { well: 'Tallgrass 15-1H' });
  await sealedOne.do('companyRep', 'call-off', { reason: 'Well plugged back', ...sealedOne.signingJob() });
  const presented = await aJobOn(on, { well: 'Tallgrass 16-3H' });
  await (await (await presented.walkTo('height-takeoff')).fill()).present();
  const changed = await aJobOn(on, { well: 'Tallgrass 17-2H' });
  await changed.do('coordinator', 'remove-person', {
    accountId: on.person('secondWelder').id,
    role: 'welder',
    reason: 'Sent home',
  });
  await aJobOn(on);
});
afterAll(() => on.stop());

const views = ['jobs_view', 'job_people_view', 'desk_view'] as const;

async function rows(): Promise<Record<string, unknown>> {
  const found = views.map(async (view) => {
    const all = await on.deps.dataSource.query<unknown[]>(`SELECT * FROM ${view} ORDER BY 1, 2, 3`);
    return [view, all.map((row) => ({ ...(row as object) }))] as const;
  });
  return Object.fromEntries(await Promise.all(found));
}

describe('projections', () => {
  it('made again from the events are the same, row by row', async () => {
    const before = await rows();
    expect(before.jobs_view).toHaveLength(4);
    expect(before.desk_view).toHaveLength(1);
    expect(await rebuildProjections(on.deps.dataSource)).toBe(4);
    expect(await rows()).toEqual(before);
  });

  it('come back when they were thrown away, and what nothing stands behind goes', async () => {
    const before = await rows();
    for (const view of views) await on.deps.dataSource.query(`DELETE FROM ${view}`);
    await on.deps.dataSource.query(
      "INSERT INTO job_people_view (job_id, account_id, role) VALUES (UUID(), UUID(), 'company_rep')",
    );
    await rebuildProjections(on.deps.dataSource);
    expect(await rows()).toEqual(before);
  });
});
