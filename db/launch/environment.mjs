import path from 'node:path';
import { LaunchFault } from './fault.mjs';
import { projectRoot } from './paths.mjs';

/**
 * @typedef {object} Settings
 * @property {boolean} dev
 * @property {string} host
 * @property {number} port
 * @property {string} publicUrl
 * @property {string} dataDirectory absolute
 * @property {boolean} demo
 * @property {boolean} ownDatabase whether the launcher starts MariaDB
 * @property {boolean} ownStorage whether the launcher starts the storage fake
 * @property {boolean} ownMail whether the launcher starts the mail fake
 */

/**
 * @param {NodeJS.ProcessEnv} env
 * @param {string[]} faults
 */
function readPort(env, faults) {
  const text = env['PORT'] || '4180';
  const port = Number(text);
  if (!/^\d+$/.test(text) || port < 1 || port > 65_535) {
    faults.push(`PORT is ${text}: it must be a whole number from 1 to 65535.`);
  }
  return port;
}

/**
 * What the launcher itself needs from the environment; the server checks the rest. An empty variable counts
 * as one that is not set.
 *
 * @param {NodeJS.ProcessEnv} env
 * @param {string[]} [args] what was typed behind the command
 * @returns {Settings}
 * @throws {LaunchFault} listing everything that is wrong
 */
export function readSettings(env, args = []) {
  /** @type {string[]} */
  const faults = [];
  const port = readPort(env, faults);
  const demo = env['DEMO'] || '1';
  if (demo !== '0' && demo !== '1') faults.push(`DEMO is ${demo}: it must be 0 or 1.`);
  const databaseUrl = env['DATABASE_URL'];
  if (databaseUrl && !/^(mysql|mariadb):\/\//.test(databaseUrl)) {
    // The value is not repeated: it may hold a password.
    faults.push('DATABASE_URL must begin with mysql:// and name a MariaDB database.');
  }
  const unknown = args.filter((argument) => argument !== '--dev');
  if (unknown.length > 0) faults.push(`Unknown: ${unknown.join(' ')}. The only option is --dev.`);
  if (faults.length > 0) throw new LaunchFault(faults.join('\n'));
  return {
    dev: args.includes('--dev'),
    host: env['HOST'] || '127.0.0.1',
    port,
    publicUrl: (env['PUBLIC_URL'] || `http://localhost:${port}`).replace(/\/+$/, ''),
    dataDirectory: path.resolve(projectRoot, env['DATA_DIR'] || '.data'),
    demo: demo === '1',
    ownDatabase: !databaseUrl,
    ownStorage: !env['S3_ENDPOINT'],
    ownMail: !env['SMTP_URL'],
  };
}

/**
 * The environment that the server and its commands run in: everything set by the caller, completed by the
 * launcher's defaults, its secrets and the addresses of what it started.
 *
 * @param {Settings} settings
 * @param {{ env: NodeJS.ProcessEnv, secrets: Record<string, string>, services: Record<string, string> }} parts
 * @returns {NodeJS.ProcessEnv}
 */
export function serverEnvironment(settings, { env, secrets, services }) {
  return {
    ...env,
    NODE_ENV: settings.dev ? 'development' : 'production',
    HOST: settings.host,
    PORT: String(settings.port),
    PUBLIC_URL: settings.publicUrl,
    DATA_DIR: settings.dataDirectory,
    DEMO: settings.demo ? '1' : '0',
    ...secrets,
    ...services,
  };
}
