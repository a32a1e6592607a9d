import { describe, expect, it } from 'vitest';
import { isOurs } from './foreign-requests.js';

const publicUrl = 'https://weighhouse.example';

describe('isOurs', () => {
  it.each([
    [{ 'sec-fetch-site': 'same-origin' }, true],
    [{ 'sec-fetch-site': 'none' }, true],
    [{ 'sec-fetch-site': 'cross-site' }, false],
    [{ 'sec-fetch-site': 'same-site' }, false],
    // What the browser says of the site counts more than an origin.
    [{ 'sec-fetch-site': 'cross-site', origin: publicUrl }, false],
    [{ 'sec-fetch-site': ['same-origin', 'cross-site'] }, false],
    [{}, true],
    [{ origin: 'https://weighhouse.example' }, true],
    [{ origin: 'http://10.0.0.5:4180', host: '10.0.0.5:4180' }, true],
    [{ origin: 'https://weighhouse.example.evil.test', host: 'weighhouse.example' }, false],
    [{ origin: 'http://weighhouse.example', host: 'localhost:4180' }, false],
    [{ origin: 'null', host: 'localhost:4180' }, false],
    [{ origin: '', host: 'localhost:4180' }, false],
  ])('answers for %j: %s', (headers, expected) => {
    expect(isOurs(publicUrl, headers)).toBe(expected);
  });
});
