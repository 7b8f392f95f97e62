import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { aFolder } from '../support/a-folder';
import { startTestApp } from '../support/test-app';
import type { TestApp } from '../support/test-app';

describe('the built client', () => {
  const folder = aFolder();
  let test: TestApp;
  beforeAll(async () => {
    mkdirSync(path.join(folder.path, 'assets'));
    writeFileSync(path.join(folder.path, 'index.html'), '<!doctype html><title>Headfast</title>');
    writeFileSync(path.join(folder.path, 'theme-start.js'), '');
    writeFileSync(path.join(folder.path, 'assets', 'main-1f2e3d.js'), '');
    test = await startTestApp({ CLIENT_DIR: folder.path });
  });
  afterAll(async () => {
    await test.stop();
    folder.remove();
  });

  it.each(['/', '/jobs', '/jobs/0194/final-cut', '/sign-in'])(
    'is the page at %s, asked for anew each time',
    async (screen) => {
      const response = await test.guest().get(screen).set('Accept', 'text/html').expect(200);
      expect(response.text).toContain('Headfast');
      expect(response.headers['cache-control']).toBe('no-cache');
      expect(response.headers['content-security-policy']).toContain("script-src 'self'");
    },
  );

  it('keeps what carries a hash in its name for good, and nothing else', async () => {
    const kept = await test.guest().get('/assets/main-1f2e3d.js').expect(200);
    expect(kept.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    const asked = await test.guest().get('/theme-start.js').expect(200);
    expect(asked.headers['cache-control']).toBe('no-cache');
  });

  it('is no page where a file is missing, where JSON is asked for, or outside its folder', async () => {
    await test.guest().get('/assets/gone-000000.js').expect(404);
    await test.guest().get('/jobs').set('Accept', 'application/json').expect(404);
    await test.guest().get('/..%2f..%2fetc%2fpasswd').set('Accept', 'text/plain').expect(404);
    const { headers } = await test.guest().post('/jobs').expect(405);
    expect(headers['allow']).toBe('GET, HEAD');
  });
});
