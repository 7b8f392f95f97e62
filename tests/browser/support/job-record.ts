import { expect, type Page } from '@playwright/test';
import type { JobEvents } from '../../../shared/contracts/jobs';
import { asEvent } from '../../../shared/job/as-event';
import { foldEvents } from '../../../shared/job/evolve';
import type { JobState } from '../../../shared/job/state';

/** Waits until everything captured on this device has arrived. */
export async function allSent(page: Page): Promise<void> {
  await expect(page.getByRole('status').filter({ hasText: 'Connected, all sent' })).toBeVisible();
}

/** The job's events as the server has them, read in the page's own session. */
export async function eventsOf(page: Page, jobId: string): Promise<JobEvents['events']> {
  const answer = await page.request.get(`/api/jobs/${jobId}/events?after=0`);
  expect(answer.ok()).toBe(true);
  return ((await answer.json()) as JobEvents).events;
}

/** The job as the server has it: tests look at it to know what is asked next, and never write that way. */
export async function readJob(page: Page, jobId: string): Promise<JobState> {
  const events = await eventsOf(page, jobId);
  const state = foldEvents(jobId, events.map(asEvent));
  if (state === null) throw new Error('the job has no events');
  return state;
}
