import { connect, createServer } from 'node:net';
import type { Server, Socket } from 'node:net';
import { once } from 'node:events';

export interface Relay {
  port: number;
  /** ends what runs through it and takes no more */
  cut(): Promise<void>;
  /** takes connections again at the same port */
  mend(): Promise<void>;
}

/** A way to a port of this machine that a test can cut and mend: a database that goes away and comes back. */
export async function aRelay(target: number): Promise<Relay> {
  const open = new Set<Socket>();
  let server: Server;
  const listen = async (port: number): Promise<number> => {
    server = createServer((here) => {
      const there = connect(target, '127.0.0.1');
      for (const socket of [here, there]) {
        open.add(socket);
        socket.on('error', () => socket.destroy());
        socket.on('close', () => open.delete(socket));
      }
      here.pipe(there).pipe(here);
      here.on('close', () => there.destroy());
      there.on('close', () => here.destroy());
    });
    server.listen(port, '127.0.0.1');
    await once(server, 'listening');
    const address = server.address();
    return typeof address === 'object' && address !== null ? address.port : 0;
  };
  const port = await listen(0);
  return {
    port,
    cut: async () => {
      const closed = once(server, 'close');
      server.close();
      for (const socket of open) socket.destroy();
      await closed;
    },
    mend: async () => void (await listen(port)),
  };
}
