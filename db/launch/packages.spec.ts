import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { markInstalled, modulesMatchLock, requirePrograms } from './packages.mjs';
import { createProcesses, type Command } from './processes.mjs';

function pretend({ installed, aptWorks = true }: { installed: string[]; aptWorks?: boolean }) {
  const ran: string[] = [];
  const processes = {
    ...createProcesses(),
    run: async ({ program, args = [] }: Command) => {
      ran.push([program, ...args].join(' '));
      return aptWorks ? 0 : 100;
    },
  };
  const find = (name: string): string | null => (installed.includes(name) ? `/usr/bin/${name}` : null);
  return { ran, options: { processes, find, say: () => undefined } };
}

describe('programs from Debian', () => {
  it('leaves the machine alone where nothing is missing', async () => {
    const { ran, options } = pretend({ installed: ['mariadbd', 'chromium', 'apt-get'] });
    await requirePrograms(['database', 'browser'], { ...options, root: true });
    expect(ran).toEqual([]);
  });

  it('installs what is missing and nothing else', async () => {
    const { ran, options } = pretend({ installed: ['mariadbd', 'apt-get'] });
    await requirePrograms(['database', 'browser'], { ...options, root: true });
    expect(ran).toHaveLength(2);
    expect(ran[1]).toMatch(/ install .* chromium$/);
    expect(ran[1]).not.toContain('mariadb');
  });

  it('tells a person without root the one command, and the way around it', async () => {
    const { ran, options } = pretend({ installed: ['apt-get'] });
    await expect(requirePrograms(['database'], { ...options, root: false })).rejects.toThrow(
      /A person with root must run\n {2}apt-get install -y --no-install-recommends mariadb-server-core mariadb-client-core\nonce\. .*DATABASE_URL/,
    );
    expect(ran).toEqual([]);
  });

  it('says the same to root on a machine without apt', async () => {
    const { options } = pretend({ installed: [] });
    await expect(requirePrograms(['browser'], { ...options, root: true })).rejects.toThrow(
      /Missing on this machine: chromium\./,
    );
  });

  it('stops when apt fails', async () => {
    const { options } = pretend({ installed: ['apt-get'], aptWorks: false });
    await expect(requirePrograms(['browser'], { ...options, root: true })).rejects.toThrow(
      /^Could not install chromium/,
    );
  });
});

describe('the packages in node_modules', () => {
  let root: string;
  beforeEach(() => {
    root = mkdtempSync(path.join(tmpdir(), 'modules-'));
    mkdirSync(path.join(root, 'node_modules'));
  });
  afterEach(() => {
    rmSync(root, { recursive: true });
  });

  const write = (file: string, packages: object): void => {
    writeFileSync(path.join(root, file), JSON.stringify({ packages }));
  };
  const wanted = {
    '': { name: 'weighhouse' },
    server: { version: '0.1.0' },
    'node_modules/a': { version: '1.0.0' },
    'node_modules/only-on-windows': { version: '1.0.0', optional: true },
  };

  it('are missing before the first installation', () => {
    write('package-lock.json', wanted);
    expect(modulesMatchLock(root)).toBe(false);
  });

  it('match when every package has its version, optional ones for other systems aside', () => {
    write('package-lock.json', wanted);
    write('node_modules/.package-lock.json', { 'node_modules/a': { version: '1.0.0' } });
    expect(modulesMatchLock(root)).toBe(true);
  });

  it('match what was installed from the lock file, also when npm left an unneeded entry of it out', () => {
    write('package-lock.json', wanted);
    write('node_modules/.package-lock.json', {});
    markInstalled(root);
    expect(modulesMatchLock(root)).toBe(true);
    write('package-lock.json', { ...wanted, 'node_modules/b': { version: '2.0.0' } });
    expect(modulesMatchLock(root)).toBe(false);
  });

  it.each([
    ['another version', { 'node_modules/a': { version: '1.0.1' } }],
    ['a package less', {}],
  ])('do not match with %s', (_name, installed) => {
    write('package-lock.json', wanted);
    write('node_modules/.package-lock.json', installed);
    expect(modulesMatchLock(root)).toBe(false);
  });
});
