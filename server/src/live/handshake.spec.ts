import { describe, expect, it } from 'vitest';
import { isOwnOrigin } from './handshake.js';

const own = 'https://weigh.example';

describe('the origin of a page that connects', () => {
  it.each([
    ['a program without one', undefined, 'weigh.example', true],
    ['our public address', own, '10.0.0.1:4180', true],
    ['the host that was asked', 'http://localhost:5173', 'localhost:5173', true],
    ['another site', 'https://elsewhere.example', 'weigh.example', false],
    ['another port of the same machine', 'http://localhost:9999', 'localhost:5173', false],
    ['an opaque page', 'null', 'weigh.example', false],
    ['a file', 'file://weigh.example', 'weigh.example', false],
    ['a name that begins like ours', 'https://weigh.example.elsewhere.example', 'weigh.example', false],
    ['no host', 'https://elsewhere.example', undefined, false],
  ])('%s', (_, origin, host, ours) => {
    expect(isOwnOrigin(origin, host, own)).toBe(ours);
  });
});
