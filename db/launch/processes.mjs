import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, renameSync, statSync } from 'node:fs';
import path from 'node:path';
import { LaunchFault, Stopped } from './fault.mjs';
import { projectRoot } from './paths.mjs';
import { identify } from './process-identity.mjs';
import { findProgram } from './programs.mjs';

/**
 * @typedef {object} Command
 * @property {string} name what people call it
 * @property {string} program
 * @property {string[]} [args]
 * @property {NodeJS.ProcessEnv} [env] the launcher's own where left out
 * @property {string} [cwd] the project's folder where left out
 * @property {string} [logFile] where its output goes; left out, it goes to the terminal
 * @property {{ uid: number, gid: number, name: string }} [account] run as this user (as root only)
 * @property {number} [graceMs] how long it may take to stop by itself
 *
 * @typedef {object} Ending
 * @property {number | null} code
 * @property {NodeJS.Signals | null} signal
 *
 * @typedef {object} Child
 * @property {string} name
 * @property {import('./process-identity.mjs').ProcessIdentity} identity
 * @property {string | undefined} logFile
 * @property {Promise<Ending>} ending settles when it has ended, however that came about
 * @property {() => boolean} ended
 * @property {() => Promise<void>} stop
 *
 * @typedef {ReturnType<typeof createProcesses>} Processes
 */

const largestLog = 5_000_000;

/** @param {string} file a log that grew large becomes "….before", so that logs take a bounded space */
function openLog(file) {
  mkdirSync(path.dirname(file), { recursive: true });
  try {
    if (statSync(file).size > largestLog) renameSync(file, `${file}.before`);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ENOENT') throw error;
  }
  return openSync(file, 'a', 0o600);
}

/**
 * setpriv asks the kernel to end the child when the launcher is gone, even if it was killed outright.
 *
 * @param {Command} command
 * @returns {[string, string[]]}
 */
function withParentDeath({ program, args = [], account }) {
  const setpriv = findProgram('setpriv');
  if (setpriv === null) {
    if (account !== undefined) {
      throw new LaunchFault(
        `The program setpriv (Debian package util-linux) is needed to start as ${account.name}.`,
      );
    }
    return [program, args];
  }
  const user = account ? [`--reuid=${account.uid}`, `--regid=${account.gid}`, '--clear-groups'] : [];
  return [setpriv, [...user, '--pdeathsig', 'TERM', '--', program, ...args]];
}

/**
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 */
function send(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') throw error;
  }
}

/**
 * The child processes of one launch: started one after another, stopped in the opposite order. Each has a
 * session of its own, so that Ctrl-C in the terminal reaches the launcher alone and the order is kept.
 *
 * @param {{ changed?: (running: { name: string, pid: number, started: string | null }[]) => void }} [options]
 *   `changed` hears of every start and end
 */
export function createProcesses({ changed = () => undefined } = {}) {
  /** @type {Child[]} */
  const running = [];
  let closing = false;
  /** @type {(child: Child) => void} */
  let tellLost = () => undefined;
  /** @type {Promise<Child>} */
  const lost = new Promise((resolve) => {
    tellLost = resolve;
  });

  const tell = () => changed(running.map(({ name, identity }) => ({ name, ...identity })));

  /**
   * @param {Command} command
   * @param {{ wholeGroup: boolean }} how whether stopping also signals what the child itself started
   * @returns {Child}
   */
  function launch(command, { wholeGroup }) {
    if (closing) throw new Stopped();
    const log = command.logFile === undefined ? null : openLog(command.logFile);
    const [program, args] = withParentDeath(command);
    const child = spawn(program, args, {
      cwd: command.cwd ?? projectRoot,
      // Colours are for a terminal; in a log they are in the way.
      env: { ...(command.env ?? process.env), ...(log === null ? {} : { NO_COLOR: '1' }) },
      detached: true,
      stdio: ['ignore', log ?? 'inherit', log ?? 'inherit'],
    });
    if (log !== null) closeSync(log);
    let over = child.pid === undefined;
    /** @type {Promise<Ending>} */
    const ending = new Promise((resolve) => {
      child.once('error', () => resolve({ code: 127, signal: null }));
      child.once('exit', (code, signal) => resolve({ code, signal }));
    });
    const pid = child.pid ?? 0;
    const end = async () => {
      if (over) return;
      send(wholeGroup ? -pid : pid, 'SIGTERM');
      const timer = setTimeout(() => send(-pid, 'SIGKILL'), command.graceMs ?? 10_000);
      await ending;
      clearTimeout(timer);
    };
    /** @type {Promise<void> | null} */
    let stopping = null;
    // Asked twice, a program must not get the signal twice: many take the second for an order to drop all.
    const stop = () => (stopping ??= end());
    /** @type {Child} */
    const entry = {
      name: command.name,
      identity: identify(pid),
      logFile: command.logFile,
      ending,
      ended: () => over,
      stop,
    };
    running.push(entry);
    tell();
    void ending.then(() => {
      over = true;
      running.splice(running.indexOf(entry), 1);
      tell();
      if (!wholeGroup && !closing) tellLost(entry);
    });
    return entry;
  }

  return {
    /** Settles with the first of those that should keep running and did not. */
    lost,

    /**
     * Starts something that keeps running.
     *
     * @param {Command} command
     */
    start: (command) => launch(command, { wholeGroup: false }),

    /**
     * Runs something to its end.
     *
     * @param {Command} command
     * @returns {Promise<number>} its exit code, 128 where a signal ended it
     */
    async run(command) {
      const { code } = await launch(command, { wholeGroup: true }).ending;
      if (closing) throw new Stopped();
      return code ?? 128;
    },

    /** Stops all, the last started first. Starting anything afterwards throws `Stopped`. */
    async stopAll() {
      closing = true;
      for (const child of [...running].reverse()) await child.stop();
    },
  };
}
