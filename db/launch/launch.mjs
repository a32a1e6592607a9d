import { chmodSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { LaunchFault } from './fault.mjs';
import { dataPaths, inProject } from './paths.mjs';
import { createProcesses } from './processes.mjs';
import { createRecord, takeOver } from './run-record.mjs';
import { logTail } from './waiting.mjs';

/**
 * A launch: the data folder is ours, what an earlier one left running is ended, and everything started from
 * here is written down.
 *
 * @param {import('./environment.mjs').Settings} settings
 * @throws {LaunchFault} when another launch runs with this data
 */
export async function beginLaunch({ dataDirectory }) {
  const paths = dataPaths(dataDirectory);
  mkdirSync(paths.root, { recursive: true });
  // Others may pass through to reach the database's folder, and list or read nothing.
  chmodSync(paths.root, 0o711);
  for (const folder of [paths.logs, paths.storage, paths.mail])
    mkdirSync(folder, { recursive: true, mode: 0o700 });
  await takeOver(paths.record);
  const record = createRecord(paths.record);
  const processes = createProcesses({ changed: record.setProcesses });
  return {
    processes,
    record,
    /** Stops everything, the last started first, and clears the record. */
    async end() {
      await processes.stopAll();
      record.remove();
    },
  };
}

/**
 * Runs one of the built commands to its end.
 *
 * @param {{ what: string, file: string, processes: import('./processes.mjs').Processes,
 *   env: NodeJS.ProcessEnv, dataDirectory: string }} options
 * @throws {LaunchFault} with the command's last words
 */
export async function runBuilt({ what, file, processes, env, dataDirectory }) {
  const logFile = path.join(dataPaths(dataDirectory).logs, `${path.basename(file, '.js')}.log`);
  const code = await processes.run({
    name: what,
    program: process.execPath,
    args: [inProject(file)],
    env,
    logFile,
  });
  if (code !== 0) throw new LaunchFault(`${what} failed.${logTail(logFile, 40)}`);
}
