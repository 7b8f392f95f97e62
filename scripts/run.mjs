import { spawn } from 'node:child_process';
import { projectRoot } from './paths.mjs';

/**
 * Runs a program to its end with its output on this terminal.
 * @param {string} program
 * @param {string[]} args
 * @param {{ env?: Record<string, string> }} [options] added to the environment of this process
 * @returns {Promise<number>} its exit code; a program that a signal ended counts as 1
 */
export function run(program, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd: projectRoot,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: { ...process.env, ...options.env },
    });
    child.on('error', reject);
    child.on('close', (code) => resolve(code ?? 1));
  });
}

/** Runs a script of this project, or of an installed package, with the Node that runs this one. */
export const runNode = (args, options) => run(process.execPath, args, options);
