import { mkdir, open, rename } from 'node:fs/promises';
import { dirname } from 'node:path';

/**
 * Moves a flushed file to its place so that it is still there after a power cut: the folder's own entry is
 * flushed too, and those of the folders that had to be made.
 */
export async function durableRename(from: string, to: string): Promise<void> {
  const folder = dirname(to);
  const topmostMade = await mkdir(folder, { recursive: true, mode: 0o700 });
  await rename(from, to);
  await flushFolder(folder);
  if (!topmostMade) return;
  const above = dirname(topmostMade);
  for (let at = folder; at !== above;) {
    at = dirname(at);
    await flushFolder(at);
  }
}

async function flushFolder(path: string): Promise<void> {
  const folder = await open(path, 'r');
  try {
    await folder.sync();
  } finally {
    await folder.close();
  }
}
