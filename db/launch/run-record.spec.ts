import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { identify, isRunning } from './process-identity.mjs';
import { createRecord, readRunning, takeOver } from './run-record.mjs';

let file: string;
beforeEach(() => {
  file = path.join(mkdtempSync(path.join(tmpdir(), 'record-')), 'launch.json');
});
afterEach(() => {
  rmSync(path.dirname(file), { recursive: true });
});

const gone = { pid: 4_194_304, started: 'another boot/1' };

const write = (record: object): void => {
  writeFileSync(file, JSON.stringify({ services: {}, processes: [], ...record }));
};

it('is read back while its launch runs, and by its owner only', () => {
  const record = createRecord(file);
  record.setServices({ DATABASE_URL: 'mysql://x' });
  expect(readRunning(file)?.services).toEqual({ DATABASE_URL: 'mysql://x' });
  expect(statSync(file).mode & 0o777).toBe(0o600);
  record.remove();
  expect(readRunning(file)).toBeNull();
});

it('stands in the way of a second launch while the first one runs', async () => {
  createRecord(file);
  await expect(takeOver(file)).rejects.toThrow(`running with this data already (process ${process.pid})`);
});

it('lets the next launch end what a killed one left behind', async () => {
  const left = spawn('sleep', ['600']);
  const identity = identify(left.pid ?? 0);
  write({ launcher: gone, processes: [{ name: 'MariaDB', ...identity }] });
  await takeOver(file);
  expect(isRunning(identity)).toBe(false);
});

it('leaves a stranger alone who got the number of an ended process', async () => {
  const stranger = spawn('sleep', ['600']);
  const identity = identify(stranger.pid ?? 0);
  write({
    launcher: { ...identity, started: 'x/1' },
    processes: [{ name: 'MariaDB', pid: identity.pid, started: 'x/1' }],
  });
  await takeOver(file);
  expect(isRunning(identity)).toBe(true);
  stranger.kill();
});

it.each(['', '{', 'null', '[]', '{"launcher":{}}', '{"launcher":{"pid":"1"},"processes":[]}'])(
  'does not block a start when the file holds %j',
  async (text) => {
    writeFileSync(file, text);
    expect(readRunning(file)).toBeNull();
    await takeOver(file);
  },
);
