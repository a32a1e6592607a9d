/**
 * Imports a module of the built shared workspace, building that first when it
 * is missing or older than its source. Plain JavaScript, so that it runs from a
 * fresh clone; nothing goes to standard output.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';

const workspace = new URL('../', import.meta.url);
const stamp = new URL('dist/.tsbuildinfo', workspace);

function newestSource() {
  const folder = new URL('src/', workspace);
  const sources = readdirSync(folder, { recursive: true }).filter((name) => name.endsWith('.ts'));
  return Math.max(...sources.map((name) => statSync(new URL(name, folder)).mtimeMs));
}

/** @param {string} path below dist, such as `reasoning/command.js` */
export async function importBuilt(path) {
  const built = new URL(`dist/${path}`, workspace);
  if (!existsSync(built) || !existsSync(stamp) || statSync(stamp).mtimeMs < newestSource()) {
    const compiler = createRequire(import.meta.url).resolve('typescript/bin/tsc');
    const build = spawnSync(process.execPath, [compiler, '-b', fileURLToPath(workspace)], {
      encoding: 'utf8',
    });
    if (build.status !== 0) process.stderr.write(build.stdout + build.stderr);
  }
  return import(built.href);
}
