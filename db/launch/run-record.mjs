import { readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';
import { LaunchFault } from './fault.mjs';
import { identify, isRunning } from './process-identity.mjs';

/**
 * What a launch writes down in DATA_DIR, so that the next one can tell a running product from the remains of
 * one that was killed. It holds the database's password and is readable by its owner only.
 *
 * @typedef {object} RunRecord
 * @property {import('./process-identity.mjs').ProcessIdentity} launcher
 * @property {{ name: string, pid: number, started: string | null }[]} processes in the order of starting
 * @property {Record<string, string>} services addresses, by the names of their variables
 */

/**
 * @param {string} file
 * @returns {RunRecord | null} null where there is none, or only a torn one
 */
export function readRecord(file) {
  try {
    const record = JSON.parse(readFileSync(file, 'utf8'));
    return Array.isArray(record?.processes) && typeof record.launcher?.pid === 'number' ? record : null;
  } catch {
    return null;
  }
}

/**
 * The record of a launch that is running now, or null.
 *
 * @param {string} file
 */
export function readRunning(file) {
  const record = readRecord(file);
  return record !== null && isRunning(record.launcher) ? record : null;
}

/** @param {string} file */
export function createRecord(file) {
  /** @type {RunRecord} */
  const record = { launcher: identify(process.pid), processes: [], services: {} };
  const write = () => {
    const draft = `${file}.${process.pid}`;
    writeFileSync(draft, JSON.stringify(record, null, 2), { mode: 0o600 });
    renameSync(draft, file);
  };
  write();
  return {
    /** @param {RunRecord['processes']} processes */
    setProcesses(processes) {
      record.processes = processes;
      write();
    },
    /** @param {RunRecord['services']} services */
    setServices(services) {
      record.services = services;
      write();
    },
    remove: () => rmSync(file, { force: true }),
  };
}

/**
 * Ends what a killed launch left behind, the last started first, so that its database and ports are free.
 *
 * @param {string} file
 * @throws {LaunchFault} when that launch is still alive
 */
export async function takeOver(file) {
  const record = readRecord(file);
  if (record === null) return;
  if (isRunning(record.launcher)) {
    throw new LaunchFault(
      `Weighhouse is running with this data already (process ${record.launcher.pid}). Stop it first, or set DATA_DIR and PORT for a second one.`,
    );
  }
  for (const left of [...record.processes].reverse()) {
    if (!isRunning(left)) continue;
    process.kill(left.pid, 'SIGTERM');
    const deadline = Date.now() + 20_000;
    while (isRunning(left)) {
      if (Date.now() > deadline) process.kill(left.pid, 'SIGKILL');
      await delay(50);
    }
  }
}
