/**
 * Calls back once when the person, the system or the vanished terminal asks for the end. Later requests
 * change nothing: npm and the terminal both pass on the same Ctrl-C.
 *
 * @param {(reason: string) => void} stop
 */
export function onStopRequest(stop) {
  let asked = false;
  /** @param {string} reason */
  const once = (reason) => {
    if (asked) return;
    asked = true;
    stop(reason);
  };
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => once(signal));
  }
  // Writing to a terminal that is gone fails; that must not end the launcher before what it started.
  for (const stream of [process.stdout, process.stderr])
    stream.on('error', () => once('the terminal is gone'));
  // npm that was killed outright passes nothing on, but its child is then handed to another parent.
  if (process.env['npm_lifecycle_event'] !== undefined) {
    const parent = process.ppid;
    setInterval(() => {
      if (process.ppid !== parent) once('npm is gone');
    }, 500).unref();
  }
}
