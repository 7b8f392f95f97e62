import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

/** An empty folder that only this test knows. */
export function aFolder(): { path: string; remove: () => void } {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'headfast-test-'));
  return { path: folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
