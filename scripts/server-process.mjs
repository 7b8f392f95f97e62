import { spawn } from 'node:child_process';
import { projectRoot } from './paths.mjs';

/**
 * Starts the server in a process group of its own: Ctrl-C reaches the command that started it, which then ends the
 * server and after it the database, in this order. Should the command be killed, the server sees the channel close and ends.
 * @param {string[]} args for Node
 * @param {Record<string, string>} env added to the environment
 */
export function startServerProcess(args, env) {
  const child = spawn(process.execPath, args, {
    cwd: projectRoot,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    detached: true,
  });
  const ended = new Promise((resolve) => child.once('exit', (code) => resolve(code ?? 1)));
  const listening = new Promise((resolve) => child.once('message', () => resolve(true)));
  return {
    /** resolves to true when it listens, to false when it ended before */
    ready: Promise.race([listening, ended.then(() => false)]),
    ended,
    async stop() {
      if (child.exitCode === null && child.signalCode === null) child.kill('SIGTERM');
      await ended;
    },
  };
}
