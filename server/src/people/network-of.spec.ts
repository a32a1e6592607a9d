import { describe, expect, it } from 'vitest';
import { networkOf } from './network-of.js';

describe('networkOf', () => {
  it.each([
    ['192.0.2.7', '192.0.2.7'],
    ['::ffff:192.0.2.7', '192.0.2.7'],
    ['2001:db8:0:1::7', '2001:db8:0:1::/64'],
    ['2001:0DB8:0000:0001:ffff:ffff:ffff:ffff', '2001:db8:0:1::/64'],
    ['2001:db8::7', '2001:db8:0:0::/64'],
    ['::1', '0:0:0:0::/64'],
    ['fe80::1%eth0', 'fe80:0:0:0::/64'],
    ['64:ff9b::192.0.2.7', '64:ff9b:0:0::/64'],
    ['', ''],
  ])('of %j is %j', (address, network) => {
    expect(networkOf(address)).toBe(network);
  });

  it('does not tell addresses of one network apart, and two networks are two', () => {
    const one = Array.from({ length: 50 }, (_, k) => networkOf(`2001:db8:5:6:${k.toString(16)}::1`));
    expect(new Set(one).size).toBe(1);
    expect(networkOf('2001:db8:5:7::1')).not.toBe(one[0]);
  });
});
