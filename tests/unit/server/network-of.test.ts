import { describe, expect, it } from 'vitest';
import { networkOf } from '../../../server/services/network-of';

describe('the network that tries are counted by', () => {
  it.each([
    ['203.0.113.7', '203.0.113.7'],
    ['::ffff:203.0.113.7', '203.0.113.7'],
    ['2001:db8:1:2:3:4:5:6', '2001:db8:1:2'],
    ['2001:0DB8:0001:0002::9', '2001:db8:1:2'],
    ['2001:db8::1', '2001:db8:0:0'],
    ['fe80::1%eth0', 'fe80:0:0:0'],
    ['::1', '0:0:0:0'],
    ['', ''],
  ])('of %s is %s', (address, network) => {
    expect(networkOf(address)).toBe(network);
  });
});
