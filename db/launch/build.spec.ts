import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { isBuilt, markBuilt } from './build.mjs';

const part = {
  name: 'a part',
  sources: ['src', 'settings.json', 'not-there'],
  results: ['dist/main.js'],
  stamp: 'dist/.stamp',
  command: [],
  cwd: '.',
};

let root: string;
const write = (file: string, text: string): void => {
  mkdirSync(path.dirname(path.join(root, file)), { recursive: true });
  writeFileSync(path.join(root, file), text);
};
beforeEach(() => {
  root = mkdtempSync(path.join(tmpdir(), 'build-'));
  write('src/a.ts', 'a');
  write('src/inner/b.ts', 'b');
  write('settings.json', '{}');
  write('dist/main.js', 'built');
  markBuilt(part, root);
});
afterEach(() => {
  rmSync(root, { recursive: true });
});

it('is built right after a build', () => {
  expect(isBuilt(part, root)).toBe(true);
});

it('stays built when a checkout gives the same sources a new time', () => {
  utimesSync(path.join(root, 'src/a.ts'), new Date(), new Date(Date.now() + 60_000));
  expect(isBuilt(part, root)).toBe(true);
});

it.each<[string, () => void]>([
  ['a changed source', () => write('src/inner/b.ts', 'c')],
  ['a new source', () => write('src/c.ts', '')],
  ['a removed source', () => rmSync(path.join(root, 'src/a.ts'))],
  [
    'text moved from one file to another',
    () => {
      write('src/a.ts', '');
      write('src/inner/b.ts', 'ab');
    },
  ],
  ['changed settings', () => write('settings.json', '{"strict":true}')],
  ['a removed result', () => rmSync(path.join(root, 'dist/main.js'))],
  ['a result that was made by hand meanwhile', () => utimesSync(path.join(root, 'dist/main.js'), 1, 1)],
  ['a removed stamp', () => rmSync(path.join(root, 'dist/.stamp'))],
])('is not built after %s', (_name, change) => {
  change();
  expect(isBuilt(part, root)).toBe(false);
});

it('is not marked as built when the build made nothing', () => {
  rmSync(path.join(root, 'dist/main.js'));
  expect(markBuilt(part, root)).toBe(false);
});
