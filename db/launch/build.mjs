import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { LaunchFault } from './fault.mjs';
import { fingerprint } from './fingerprint.mjs';
import { dataPaths, inProject, projectRoot } from './paths.mjs';
import { logTail } from './waiting.mjs';

/**
 * @typedef {object} Part
 * @property {string} name
 * @property {string[]} sources
 * @property {string[]} results files that the build makes; the first one's time is kept in the stamp
 * @property {string} stamp
 * @property {string[]} command what node runs, from `cwd`
 * @property {string} cwd
 */

const settingsFiles = ['package.json', 'package-lock.json', 'tsconfig.base.json'];

/** @type {Part} */
export const code = {
  name: 'the server',
  sources: [
    ...settingsFiles,
    ...['shared', 'server', 'db'].flatMap((name) => [
      `${name}/src`,
      `${name}/package.json`,
      `${name}/tsconfig.json`,
    ]),
  ],
  results: ['server/dist/.tsbuildinfo', 'db/dist/.tsbuildinfo', 'server/dist/main.js', 'db/dist/migrate.js'],
  stamp: 'server/dist/.stamp',
  command: [inProject('node_modules/typescript/bin/tsc'), '-b', 'shared', 'server', 'db'],
  cwd: projectRoot,
};

const clientFiles = [
  'src',
  'public',
  'build',
  'index.html',
  'package.json',
  'tsconfig.json',
  'vite.config.ts',
];

/** Vite's own command, which the watched pages of `npm run dev` use as well. */
export const vite = { program: inProject('node_modules/vite/bin/vite.js'), cwd: inProject('client') };

/** @type {Part} */
export const client = {
  name: 'the pages',
  sources: [...settingsFiles, 'shared/src', ...clientFiles.map((name) => `client/${name}`)],
  results: ['client/dist/app/index.html'],
  stamp: 'client/dist/.stamp',
  command: [vite.program, 'build', '--logLevel', 'warn'],
  cwd: vite.cwd,
};

/**
 * What a finished build looks like: the sources it was made from and when. The time tells a build made by
 * hand from other sources meanwhile.
 *
 * @param {Part} part
 * @param {string} root
 * @returns {string | null} null where a result is missing
 */
function stampOf(part, root) {
  const results = part.results.map((file) => path.join(root, file));
  const [first] = results;
  if (first === undefined || !results.every((file) => existsSync(file))) return null;
  return `${fingerprint(root, part.sources)} ${statSync(first).mtimeMs}\n`;
}

/**
 * @param {Part} part
 * @param {string} [root]
 */
export function isBuilt(part, root = projectRoot) {
  const stamp = path.join(root, part.stamp);
  return existsSync(stamp) && readFileSync(stamp, 'utf8') === stampOf(part, root);
}

/**
 * Writes down that the part was built from the sources as they are now.
 *
 * @param {Part} part
 * @param {string} [root]
 * @returns {boolean} false where a result is missing
 */
export function markBuilt(part, root = projectRoot) {
  const stamp = stampOf(part, root);
  if (stamp !== null) writeFileSync(path.join(root, part.stamp), stamp);
  return stamp !== null;
}

/**
 * Builds the parts whose sources changed since their last build, all at once.
 *
 * @param {Part[]} parts
 * @param {{ processes: import('./processes.mjs').Processes, say: (line: string) => void, dataDirectory: string }} options
 * @throws {LaunchFault} with the compiler's words
 */
export async function requireBuilt(parts, { processes, say, dataDirectory }) {
  const stale = parts.filter((part) => !isBuilt(part));
  if (stale.length > 0) say(`Building ${stale.map((part) => part.name).join(' and ')}.`);
  const logs = dataPaths(dataDirectory).logs;
  await Promise.all(
    stale.map(async (part) => {
      const logFile = path.join(logs, `build-${path.dirname(path.dirname(part.stamp))}.log`);
      writeFileSync(logFile, '', { mode: 0o600 });
      const exit = await processes.run({
        name: part.name,
        program: process.execPath,
        args: part.command,
        cwd: part.cwd,
        logFile,
      });
      if (exit !== 0) throw new LaunchFault(`Could not build ${part.name}.${logTail(logFile, 60)}`);
      if (!markBuilt(part))
        throw new LaunchFault(`The build of ${part.name} made none of ${part.results.join(', ')}.`);
    }),
  );
}
