import { mount } from '@vue/test-utils';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { blankPoint } from '../../../shared/job/points';
import type { PointState } from '../../../shared/job/state';
import DeskGone from '../../../src/components/desk/DeskGone.vue';
import { useDeskStore } from '../../../src/stores/desk';
import { aDeskEntry } from '../../support/a-summary';
import { serverSays, signedInAs } from '../mount-with-ways';

const jobId = '0190a000-0000-7000-8000-000000000001';
const at = (corrected: string) => ({ device: corrected, corrected, received: corrected, doubtMs: 0 });
const point: PointState = {
  ...blankPoint({ id: 'final-cut', kind: 'final-cut', pass: null, round: 0 }),
  status: 'open',
  sentBack: [
    {
      reason: 'Measure at 6 o’clock again.',
      contentHash: '',
      by: { accountId: 'brandt', name: 'O. Brandt', role: 'company_rep' },
      at: at('2026-09-14T06:10:00.000Z'),
    },
  ],
  withdrawn: [{ by: { accountId: 'calder', name: 'W. Calder', role: 'welder' }, at: at('2026-09-14T06:20:00.000Z') }],
};

/** What stands on the desk when the point in hand is gone and these still wait. */
async function said(entries: unknown[]) {
  serverSays({ 'GET /api/desk': { entries } });
  const { pinia } = signedInAs(['company_rep']);
  await useDeskStore().load();
  return mount(DeskGone, { props: { jobId, point }, global: { plugins: [pinia] } });
}

afterEach(() => vi.unstubAllGlobals());

describe('a point that does not wait any more', () => {
  it('says who withdrew it and when, though it was sent back before', async () => {
    expect((await said([])).text()).toContain('Withdrawn by W. Calder, 14 Sep 2026 06:20');
  });

  it('offers what waits next only where something does', async () => {
    expect((await said([aDeskEntry({ jobId })])).text()).toContain('Nothing else waits for you.');
    const other = await said([aDeskEntry({ jobId }), aDeskEntry({ jobId, point: 'bevel-prep' })]);
    expect(other.get('button').text()).toBe('Show what waits next');
  });
});
