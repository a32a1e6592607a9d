import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, statSync } from 'node:fs';
import { LaunchFault } from './fault.mjs';
import { findProgram } from './programs.mjs';

/** @typedef {{ name: string, uid: number, gid: number }} Account */

/** Whether this process may install packages and start programs as another user. */
export function isRoot() {
  return process.getuid?.() === 0;
}

/**
 * @param {string} name
 * @param {string} [passwd] text in the form of /etc/passwd
 * @returns {Account | null}
 */
export function findAccount(name, passwd = readFileSync('/etc/passwd', 'utf8')) {
  const line = passwd.split('\n').find((candidate) => candidate.startsWith(`${name}:`));
  const [, , uid, gid] = line?.split(':') ?? [];
  return uid === undefined || gid === undefined ? null : { name, uid: Number(uid), gid: Number(gid) };
}

/**
 * @param {Account} account
 * @param {string} folder
 */
function mayEnter({ uid, gid }, folder) {
  return spawnSync('test', ['-x', folder], { uid, gid, cwd: '/' }).status === 0;
}

/**
 * The user that the database runs as: never root where that can be avoided. Debian's server package makes
 * the user mysql, the smaller package that the launcher installs does not, so it is made here. Data that are
 * there already keep their owner.
 *
 * @param {string} folder
 * @param {string} data the folder inside it that will hold the data, or does already
 * @returns {Account | null} null: as whoever started the launcher. Root gets that only when the folder lies
 *   in a place that nobody else may enter, such as /root
 */
export function databaseAccount(folder, data) {
  if (!isRoot()) return null;
  if (existsSync(data)) {
    const { uid, gid } = statSync(data);
    return uid === 0 ? null : { name: `user ${uid}`, uid, gid };
  }
  let account = findAccount('mysql');
  if (account === null) {
    const useradd = findProgram('useradd');
    if (useradd !== null) {
      const home = ['--no-create-home', '--home-dir', '/nonexistent', '--shell', '/usr/sbin/nologin'];
      spawnSync(useradd, ['--system', '--user-group', ...home, 'mysql'], { stdio: 'ignore' });
    }
    account = findAccount('mysql');
    if (account === null) {
      throw new LaunchFault(
        'MariaDB needs a system user to run as. Make one with\n  useradd --system --user-group --no-create-home mysql',
      );
    }
  }
  return mayEnter(account, folder) ? account : null;
}
