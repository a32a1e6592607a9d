import path from 'node:path';
import { dataPaths, inProject } from './paths.mjs';
import { answers, freePort } from './ports.mjs';
import { keptSecret, randomText } from './secrets.mjs';
import { startMariaDb } from './mariadb.mjs';
import { waitUntil } from './waiting.mjs';

/**
 * @typedef {object} Context
 * @property {import('./environment.mjs').Settings} settings
 * @property {import('./processes.mjs').Processes} processes
 *
 * @typedef {Record<string, string>} Addresses by the names of the server's variables
 */

/**
 * @param {{ name: string, file: string, args: string[], log: string, env?: Record<string, string> }} command
 * @param {Context} context
 * @returns {Promise<number>} the port it listens on
 */
async function startFake({ name, file, args, log, env = {} }, { settings, processes }) {
  const port = await freePort();
  const child = processes.start({
    name,
    program: process.execPath,
    args: [inProject(file), '--port', String(port), ...args],
    env: { ...process.env, ...env },
    logFile: path.join(dataPaths(settings.dataDirectory).logs, log),
  });
  await waitUntil(() => answers(port), { what: name, child });
  return port;
}

/**
 * @param {Context} context
 * @returns {Promise<Addresses>}
 */
async function database({ settings, processes }) {
  if (!settings.ownDatabase) return {};
  const paths = dataPaths(settings.dataDirectory);
  const { url } = await startMariaDb({
    directory: paths.database,
    password: keptSecret(paths.secrets, 'database-password', randomText),
    processes,
    logFile: path.join(paths.logs, 'mariadb.log'),
  });
  return { DATABASE_URL: url };
}

/**
 * @param {Context} context
 * @returns {Promise<Addresses>}
 */
async function storage(context) {
  if (!context.settings.ownStorage) return {};
  const paths = dataPaths(context.settings.dataDirectory);
  const bucket = 'weighhouse';
  const accessKey = keptSecret(paths.secrets, 'storage-access-key', randomText);
  const secretKey = keptSecret(paths.secrets, 'storage-secret-key', randomText);
  const port = await startFake(
    {
      name: 'The storage',
      file: 'storage-fake/src/command.mjs',
      args: ['--directory', paths.storage, '--bucket', bucket],
      // Not among the arguments, which every user of the machine can list.
      env: { STORAGE_ACCESS_KEY: accessKey, STORAGE_SECRET_KEY: secretKey },
      log: 'storage.log',
    },
    context,
  );
  return {
    S3_ENDPOINT: `http://127.0.0.1:${port}`,
    S3_BUCKET: bucket,
    S3_REGION: 'eu-central-1',
    S3_ACCESS_KEY: accessKey,
    S3_SECRET_KEY: secretKey,
  };
}

/**
 * @param {Context} context
 * @returns {Promise<Addresses>}
 */
async function mail(context) {
  if (!context.settings.ownMail) return {};
  const args = ['--directory', dataPaths(context.settings.dataDirectory).mail];
  const file = 'test/fakes/mail-command.mjs';
  const port = await startFake({ name: 'The mail server', file, args, log: 'mail.log' }, context);
  return { SMTP_URL: `smtp://127.0.0.1:${port}` };
}

/**
 * Starts the database, the storage and the mail server, each unless a variable names another one.
 *
 * @param {Context} context
 * @returns {Promise<Addresses>}
 */
export async function startServices(context) {
  const started = await Promise.all([database(context), storage(context), mail(context)]);
  return Object.assign({}, ...started);
}
