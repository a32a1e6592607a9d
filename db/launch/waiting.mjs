import { readFileSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { LaunchFault } from './fault.mjs';

/**
 * The last lines of a log, indented, for a message; empty where there is none.
 *
 * @param {string | undefined} file
 * @param {number} [lines]
 */
export function logTail(file, lines = 20) {
  if (file === undefined) return '';
  try {
    const text = readFileSync(file, 'utf8').trimEnd();
    return text === '' ? '' : `\n${text.split('\n').slice(-lines).join('\n  ').replace(/^/, '  ')}`;
  } catch {
    return '';
  }
}

/**
 * Asks again and again until the check says yes.
 *
 * @param {() => Promise<boolean>} check
 * @param {{ what: string, child: import('./processes.mjs').Child, timeoutMs?: number }} options
 * @returns {Promise<void>}
 * @throws {LaunchFault} when the process behind it ends first, or the time is up
 */
export async function waitUntil(check, { what, child, timeoutMs = 60_000 }) {
  const deadline = Date.now() + timeoutMs;
  for (;;) {
    if (child.ended()) throw new LaunchFault(`${what} stopped while starting.${logTail(child.logFile)}`);
    if (await check()) return;
    if (Date.now() > deadline) {
      throw new LaunchFault(
        `${what} did not answer within ${timeoutMs / 1000} seconds.${logTail(child.logFile)}`,
      );
    }
    await delay(50);
  }
}
