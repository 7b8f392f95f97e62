import { Unmet } from './fail.mjs';
import { firstFreePort, portIsFree } from './free-port.mjs';

/** The port of the server: PORT when it is set, which must then be free; otherwise 4180 or the next one that is. */
export async function choosePort(host) {
  const wanted = process.env.PORT;
  if (wanted) {
    if (await portIsFree(Number(wanted), host)) return Number(wanted);
    throw new Unmet(`Port ${wanted} is taken by another program. Set PORT to a free one, or leave it out.`);
  }
  const port = await firstFreePort(4180, host);
  if (port !== 4180) console.log(`Port 4180 is taken by another program; this one takes ${port}.`);
  return port;
}

const loopback = ['127.0.0.1', '::1', 'localhost'];

/** Host and mode: on loopback the demo is on unless DEMO says otherwise, elsewhere there is none. */
export function hostAndMode() {
  const host = process.env.HOST || '127.0.0.1';
  const openly = !loopback.includes(host) || Boolean(process.env.PUBLIC_ORIGIN);
  return { host, demo: process.env.DEMO ?? (openly ? '0' : '1') };
}
