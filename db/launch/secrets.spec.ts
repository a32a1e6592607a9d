import { chmodSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { keptSecret, serverSecrets } from './secrets.mjs';

let folder: string;
beforeEach(() => {
  folder = path.join(mkdtempSync(path.join(tmpdir(), 'secrets-')), 'secrets');
});
afterEach(() => {
  rmSync(path.dirname(folder), { recursive: true });
});

const mode = (file: string): string => (statSync(file).mode & 0o777).toString(8);

describe('a kept secret', () => {
  it('is made once and then stays', () => {
    const first = keptSecret(folder, 'key', () => 'first');
    expect([first, keptSecret(folder, 'key', () => 'second')]).toEqual(['first', 'first']);
    expect(readdirSync(folder)).toEqual(['key']);
  });

  it('is readable by its owner only, also when somebody opened it up', () => {
    keptSecret(folder, 'key', () => 'x');
    chmodSync(path.join(folder, 'key'), 0o644);
    chmodSync(folder, 0o755);
    keptSecret(folder, 'key', () => 'x');
    expect([mode(folder), mode(path.join(folder, 'key'))]).toEqual(['700', '600']);
  });

  it('is not made anew over an empty file', () => {
    keptSecret(folder, 'key', () => 'x');
    writeFileSync(path.join(folder, 'key'), '\n');
    expect(() => keptSecret(folder, 'key', () => 'y')).toThrow(/is empty/);
  });
});

describe('the secrets of the server', () => {
  it('are made for the demo, long enough, and the same next time', () => {
    const secrets = serverSecrets(folder, { demo: true, env: {} });
    expect(secrets.IDENTITY_KEY).toMatch(/^[0-9a-f]{64}$/);
    expect(Buffer.from(secrets.SESSION_SECRET, 'base64url')).toHaveLength(32);
    expect(secrets.IDENTITY_KEY).not.toBe(secrets.SESSION_SECRET);
    expect(serverSecrets(folder, { demo: true, env: {} })).toEqual(secrets);
  });

  it('come from the environment where it has them, and then no file is written', () => {
    const env = { SESSION_SECRET: 'mine', IDENTITY_KEY: 'mine too' };
    expect(serverSecrets(folder, { demo: true, env })).toEqual(env);
    expect(() => readdirSync(folder)).toThrow(/ENOENT/);
  });

  it.each([
    [{}, 'SESSION_SECRET and IDENTITY_KEY'],
    [{ SESSION_SECRET: 'mine' }, 'set IDENTITY_KEY'],
    [{ IDENTITY_KEY: 'mine', SESSION_SECRET: '' }, 'set SESSION_SECRET'],
  ])('are demanded outside the demo: %j', (env, named) => {
    expect(() => serverSecrets(folder, { demo: false, env })).toThrow(named);
  });
});
