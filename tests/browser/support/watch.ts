import { expect, type Page } from '@playwright/test';

/** What a page complained of: console errors, exceptions, requests that failed or that the server refused. */
export interface Watched {
  readonly complaints: string[];
  /** Answers that a test provokes: `409 POST /api/jobs`. */
  expectAnswer(status: number, part: string): void;
  none(): void;
}

/** Listens to a page from now on. */
export function watchPage(page: Page): Watched {
  const complaints: string[] = [];
  const provoked: { status: number; part: string }[] = [];
  const isProvoked = (status: number, url: string) =>
    provoked.some((one) => one.status === status && url.includes(one.part));
  page.on('console', (message) => {
    if (message.type() !== 'error') return;
    // The browser repeats every refused answer here; those are judged by their response.
    if (/Failed to load resource/.test(message.text())) return;
    complaints.push(`console: ${message.text()}`);
  });
  page.on('pageerror', (error) => complaints.push(`exception: ${error.message}`));
  page.on('response', (response) => {
    if (response.status() >= 400 && !isProvoked(response.status(), response.url()))
      complaints.push(`${response.status()} ${response.request().method()} ${response.url()}`);
  });
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText ?? '';
    // What the page itself gave up by going elsewhere is no failure.
    if (!/ERR_ABORTED/.test(why) && !isProvoked(0, request.url()))
      complaints.push(`${why} ${request.method()} ${request.url()}`);
  });
  return {
    complaints,
    expectAnswer: (status, part) => void provoked.push({ status, part }),
    none: () => expect(complaints).toEqual([]),
  };
}
