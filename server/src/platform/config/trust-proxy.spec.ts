import { describe, expect, it } from 'vitest';
import { trustedProxies } from './trust-proxy.js';

describe('trustedProxies', () => {
  it.each([
    ['1', 1],
    ['0', 0],
    ['loopback', ['loopback']],
    ['10.0.0.7, 192.168.0.0/16', ['10.0.0.7', '192.168.0.0/16']],
    ['::1,fd00::/8', ['::1', 'fd00::/8']],
  ])('takes %s', (text, proxies) => {
    expect(trustedProxies(text)).toEqual(proxies);
  });

  it.each([
    'true',
    'false',
    '*',
    '',
    '11',
    '-1',
    '1.5',
    'proxy.example',
    '10.0.0.0/0',
    '10.0.0.0/33',
    '::/129',
    '10.0.0.1/8/8',
  ])('refuses %j, which would trust everybody or nobody', (text) => {
    expect(trustedProxies(text)).toBeNull();
  });
});
