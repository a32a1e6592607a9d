import { readFileSync } from 'node:fs';

/**
 * A process as it is written down: a number alone may belong to another process later, so the moment it
 * started is kept beside it.
 *
 * @typedef {{ pid: number, started: string | null }} ProcessIdentity
 */

/**
 * When a process started, as boot and clock ticks since then; null where there is no such process, where it
 * is only waiting to be collected, or where the system has no /proc.
 *
 * @param {number} pid
 * @returns {string | null}
 */
export function startOf(pid) {
  try {
    const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The program's name stands in brackets and may hold spaces, so fields are counted from behind it.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    const [state, ticks] = [fields[0], fields[19]];
    return state === 'Z' || ticks === undefined ? null : `${boot}/${ticks}`;
  } catch {
    return null;
  }
}

/**
 * @param {number} pid
 * @returns {ProcessIdentity}
 */
export function identify(pid) {
  return { pid, started: startOf(pid) };
}

/**
 * Whether the very process that was written down is still running.
 *
 * @param {ProcessIdentity} identity
 */
export function isRunning({ pid, started }) {
  return started !== null && startOf(pid) === started;
}
