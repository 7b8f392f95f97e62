/**
 * Waits for Ctrl-C, a polite kill, the terminal's closing, or for one of the processes to end by itself.
 * @param {Promise<number>[]} processes
 * @returns {Promise<number>} exit code: 0 when somebody stopped it
 */
export function untilStopped(...processes) {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve(0));
    for (const each of processes) each.then((code) => resolve(code === 0 ? 0 : 1));
  });
}
