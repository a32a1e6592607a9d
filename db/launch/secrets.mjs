import { randomBytes } from 'node:crypto';
import { chmodSync, linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { LaunchFault } from './fault.mjs';

/**
 * A secret kept in a file that only its owner may read, made of random bytes when it is first asked for.
 * An empty file is refused rather than filled: identity cards sealed with a lost key would stay shut.
 *
 * @param {string} folder
 * @param {string} name
 * @param {() => string} make
 * @returns {string}
 * @throws {LaunchFault}
 */
export function keptSecret(folder, name, make) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  chmodSync(folder, 0o700);
  const file = path.join(folder, name);
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, `${make()}\n`, { mode: 0o600 });
  try {
    // A link never replaces an existing file, and a reader never sees half a secret.
    linkSync(draft, file);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
  } finally {
    rmSync(draft);
  }
  chmodSync(file, 0o600);
  const secret = readFileSync(file, 'utf8').trim();
  if (secret === '') {
    throw new LaunchFault(
      `The secret in ${file} is empty. Put back a copy of it, or remove the whole data folder.`,
    );
  }
  return secret;
}

/** 256 random bits in letters, digits, - and _, which need no quoting in SQL or a URL. */
export const randomText = () => randomBytes(32).toString('base64url');

/** A key of 256 bits in hexadecimal digits. */
const randomKey = () => randomBytes(32).toString('hex');

/**
 * The server's secrets: from the environment, or made once for the demo. A real installation must bring its
 * own, since whoever copies the data folder would otherwise copy the key with it.
 *
 * @param {string} folder
 * @param {{ demo: boolean, env: NodeJS.ProcessEnv }} options
 * @returns {{ SESSION_SECRET: string, IDENTITY_KEY: string }}
 * @throws {LaunchFault} naming every variable that is missing
 */
export function serverSecrets(folder, { demo, env }) {
  const { SESSION_SECRET, IDENTITY_KEY } = env;
  const missing = Object.entries({ SESSION_SECRET, IDENTITY_KEY })
    .filter(([, value]) => !value)
    .map(([name]) => name);
  if (!demo && missing.length > 0) {
    throw new LaunchFault(
      `Outside the demo (DEMO=0), set ${missing.join(' and ')} to a random value that you keep, for instance made by\n  openssl rand -hex 32`,
    );
  }
  return {
    SESSION_SECRET: SESSION_SECRET || keptSecret(folder, 'session-secret', randomText),
    IDENTITY_KEY: IDENTITY_KEY || keptSecret(folder, 'identity-key', randomKey),
  };
}
