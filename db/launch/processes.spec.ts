import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { isRunning } from './process-identity.mjs';
import { createProcesses, type Child } from './processes.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'processes-'));
});
afterEach(() => {
  rmSync(folder, { recursive: true });
});

type Processes = ReturnType<typeof createProcesses>;

/** A small program that says when it is up and what it hears. */
async function start(processes: Processes, name: string, script: string, graceMs = 5_000): Promise<Child> {
  const logFile = path.join(folder, `${name}.log`);
  const args = ['-e', `${script}; console.log('up'); setInterval(() => {}, 1000)`];
  const child = processes.start({ name, program: process.execPath, args, logFile, graceMs });
  while (!readFileSync(logFile, 'utf8').includes('up')) await delay(20);
  return child;
}

describe('the processes of a launch', () => {
  it('are stopped one after another, the last started first', async () => {
    const processes = createProcesses();
    const ended: string[] = [];
    const slow = "process.on('SIGTERM', () => setTimeout(() => process.exit(0), 300))";
    for (const [name, script] of [
      ['database', ''],
      ['server', slow],
    ] as const) {
      void (await start(processes, name, script)).ending.then(() => ended.push(name));
    }
    await processes.stopAll();
    expect(ended).toEqual(['server', 'database']);
  });

  it('get the signal once, however often the stop is asked for', async () => {
    const processes = createProcesses();
    const child = await start(
      processes,
      'server',
      "process.on('SIGTERM', () => { console.log('heard'); setTimeout(() => process.exit(0), 200) })",
    );
    await Promise.all([processes.stopAll(), child.stop(), processes.stopAll()]);
    expect(readFileSync(path.join(folder, 'server.log'), 'utf8')).toBe('up\nheard\n');
  });

  it('are killed when they do not stop in time', async () => {
    const processes = createProcesses();
    const child = await start(processes, 'deaf', "process.on('SIGTERM', () => {})", 200);
    await processes.stopAll();
    expect(await child.ending).toEqual({ code: null, signal: 'SIGKILL' });
  });

  it('cannot be joined once stopping has begun', async () => {
    const processes = createProcesses();
    await processes.stopAll();
    expect(() => processes.start({ name: 'late', program: process.execPath })).toThrow(
      'Stopped while starting',
    );
  });

  it('are told of as long as they run', async () => {
    let running: { name: string; pid: number; started: string | null }[] = [];
    const processes = createProcesses({ changed: (now) => (running = now) });
    await start(processes, 'one', '');
    const [one] = running;
    expect(one && isRunning(one)).toBe(true);
    expect(one && isRunning({ ...one, started: 'another boot/1' })).toBe(false);
    await processes.stopAll();
    expect(running).toEqual([]);
    expect(one && isRunning(one)).toBe(false);
  });

  it('are missed when one of them ends by itself, and not when all are stopped', async () => {
    const processes = createProcesses();
    await start(processes, 'database', '');
    const server = await start(processes, 'server', 'setTimeout(() => process.exit(1), 200)');
    expect(await processes.lost).toBe(server);
    const others = createProcesses();
    await start(others, 'database', '');
    await others.stopAll();
    expect(await Promise.race([others.lost, delay(100, 'nobody')])).toBe('nobody');
  });

  it('end with the launcher even when it is killed outright', async () => {
    const outer = createProcesses();
    const module = new URL('processes.mjs', import.meta.url).href;
    const launcher = await start(
      outer,
      'launcher',
      `import(${JSON.stringify(module)}).then(({ createProcesses }) => {
        const child = createProcesses().start({ name: 'child', program: 'sleep', args: ['600'] });
        console.log(JSON.stringify(child.identity));
      })`,
    );
    const written = (): string | undefined =>
      /\{.*\}/.exec(readFileSync(launcher.logFile ?? '', 'utf8'))?.[0];
    while (written() === undefined) await delay(20);
    const child = JSON.parse(written() ?? '') as Child['identity'];
    expect(isRunning(child)).toBe(true);
    // Time for the child to become "sleep": until then it has not asked to be ended with its parent.
    await delay(200);
    process.kill(launcher.identity.pid, 'SIGKILL');
    await launcher.ending;
    const deadline = Date.now() + 5_000;
    while (isRunning(child) && Date.now() < deadline) await delay(20);
    expect(isRunning(child)).toBe(false);
  });
});

describe('a command that runs to its end', () => {
  it('gives its exit code', async () => {
    const args = ['-e', 'process.exit(3)'];
    expect(await createProcesses().run({ name: 'three', program: process.execPath, args })).toBe(3);
  });

  it('gives 127 where there is no such program', async () => {
    const logFile = path.join(folder, 'missing.log');
    expect(await createProcesses().run({ name: 'missing', program: '/nowhere/at-all', logFile })).toBe(127);
  });
});
