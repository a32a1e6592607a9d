import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { isRoot } from './account.mjs';
import { LaunchFault } from './fault.mjs';
import { inProject } from './paths.mjs';
import { findProgram } from './programs.mjs';

/**
 * Debian's packages by the program that shows whether they are there. The core packages of MariaDB hold the
 * programs alone: the full one would also start a database of its own on every boot.
 *
 * @type {Record<'database' | 'browser', { program: string, packages: string[] }>}
 */
const needs = {
  database: { program: 'mariadbd', packages: ['mariadb-server-core', 'mariadb-client-core'] },
  browser: { program: 'chromium', packages: ['chromium'] },
};

/**
 * Installs what is missing on this machine, with apt and as root only.
 *
 * @param {('database' | 'browser')[]} wanted
 * @param {{ processes: import('./processes.mjs').Processes, say: (line: string) => void, root?: boolean,
 *   find?: (program: string) => string | null }} options
 * @returns {Promise<void>}
 * @throws {LaunchFault} with the one command to run where the launcher may not run it
 */
export async function requirePrograms(wanted, { processes, say, root = isRoot(), find = findProgram }) {
  const missing = wanted.filter((want) => find(needs[want].program) === null);
  if (missing.length === 0) return;
  const packages = missing.flatMap((want) => needs[want].packages);
  const apt = find('apt-get');
  const command = `apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (!root || apt === null) {
    const instead = missing.includes('database')
      ? ' To use a MariaDB that runs elsewhere, set DATABASE_URL instead.'
      : '';
    throw new LaunchFault(
      `Missing on this machine: ${missing.map((want) => needs[want].program).join(', ')}. A person with root must run\n  ${command}\nonce.${instead}`,
    );
  }
  say(`Installing ${packages.join(', ')}.`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  // A package half installed locks the machine's package list, so it gets its time even on Ctrl-C.
  const common = { name: 'apt-get', program: apt, env, graceMs: 300_000 };
  await processes.run({ ...common, args: ['update', '-qq'] });
  const install = ['install', '-y', '-qq', '--no-install-recommends', '-o', 'Dpkg::Use-Pty=0', ...packages];
  if ((await processes.run({ ...common, args: install })) !== 0) {
    throw new LaunchFault(
      `Could not install ${packages.join(', ')}. Its output above says why. The command was\n  ${command}`,
    );
  }
}

/**
 * Where an installation from the lock file says which one it was.
 *
 * @param {string} root
 */
const installedFrom = (root) => `${root}/node_modules/.installed-from`;

/** @param {string} root */
const lockDigest = (root) =>
  createHash('sha256')
    .update(readFileSync(`${root}/package-lock.json`))
    .digest('hex');

/**
 * Whether node_modules holds what package-lock.json names. Times say little after a clone or a copy, so it
 * counts what was installed from, and where a person installed by hand, the list that npm keeps.
 *
 * @param {string} [root] the project's folder
 * @returns {boolean}
 */
export function modulesMatchLock(root = inProject()) {
  const installedFile = `${root}/node_modules/.package-lock.json`;
  if (!existsSync(installedFile)) return false;
  const from = installedFrom(root);
  if (existsSync(from) && readFileSync(from, 'utf8') === lockDigest(root)) return true;
  const wanted = JSON.parse(readFileSync(`${root}/package-lock.json`, 'utf8')).packages;
  const installed = JSON.parse(readFileSync(installedFile, 'utf8')).packages;
  return Object.entries(wanted).every(([folder, { version, optional, devOptional }]) => {
    if (!folder.includes('node_modules/')) return true;
    // Optional packages for other systems are listed and not installed.
    if (installed[folder] === undefined) return optional === true || devOptional === true;
    return installed[folder].version === version;
  });
}

/**
 * Marks node_modules as installed from the lock file as it is now.
 *
 * @param {string} [root]
 */
export function markInstalled(root = inProject()) {
  writeFileSync(installedFrom(root), lockDigest(root));
}

/**
 * @param {{ processes: import('./processes.mjs').Processes, say: (line: string) => void }} options
 * @throws {LaunchFault}
 */
export async function requireModules({ processes, say }) {
  if (modulesMatchLock()) return;
  say('Installing the packages of package-lock.json (a minute or two).');
  const npm = findProgram('npm');
  if (npm === null) throw new LaunchFault('The program npm is missing. It comes with Node 20.');
  const code = await processes.run({ name: 'npm ci', program: npm, args: ['ci', '--no-audit', '--no-fund'] });
  if (code !== 0) throw new LaunchFault('npm ci failed. Its output above says why.');
  markInstalled();
}
