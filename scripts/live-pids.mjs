import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** Whether a process with this number runs (one of another user counts too). */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/** Notes this process in a folder of users. */
export function signIn(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  writeFileSync(path.join(folder, String(process.pid)), '');
}

/** Takes this process out of the folder and answers whether any living one is left. */
export function signOutAndSeeOthers(folder) {
  rmSync(path.join(folder, String(process.pid)), { force: true });
  let others = false;
  for (const name of readdirSync(folder)) {
    if (isAlive(Number(name))) others = true;
    else rmSync(path.join(folder, name), { force: true });
  }
  return others;
}
