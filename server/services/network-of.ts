import { isIPv6 } from 'node:net';

/**
 * Whose tries an address on the network counts with: an IPv4 address stands for itself; of an IPv6 address the first
 * half, since one household or one machine is given all that the second half can name.
 */
export function networkOf(address: string): string {
  const plain = address.replace(/%.*$/, '').toLowerCase();
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/.exec(plain);
  if (mapped?.[1]) return mapped[1];
  if (!isIPv6(plain)) return plain;
  const [before = '', after] = plain.split('::');
  const groups = before === '' ? [] : before.split(':');
  const missing = after === undefined ? 0 : 8 - groups.length - (after === '' ? 0 : after.split(':').length);
  const filled = [...groups, ...Array<string>(missing).fill('0'), ...(after ? after.split(':') : [])];
  return filled
    .slice(0, 4)
    .map((group) => group.replace(/^0+(?=.)/, ''))
    .join(':');
}
