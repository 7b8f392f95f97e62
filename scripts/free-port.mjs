import { createServer } from 'node:net';

/** Whether a port can be listened on. */
export function portIsFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** A port that nobody listens on now, chosen by the system. */
export function anyFreePort(host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen({ port: 0, host }, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}

/** The first free port from `first` on, within the next twenty. */
export async function firstFreePort(first, host = '127.0.0.1') {
  for (let port = first; port < first + 20; port += 1) if (await portIsFree(port, host)) return port;
  return anyFreePort(host);
}
