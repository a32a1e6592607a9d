import path from 'node:path';
import { client, code, requireBuilt } from './build.mjs';
import { startDevelopment } from './development.mjs';
import { readSettings, serverEnvironment } from './environment.mjs';
import { describeError, LaunchFault } from './fault.mjs';
import { beginLaunch } from './launch.mjs';
import { requireModules, requirePrograms } from './packages.mjs';
import { dataPaths, inProject } from './paths.mjs';
import { requireFreePort } from './ports.mjs';
import { prepareDatabase } from './prepare.mjs';
import { isReady } from './readiness.mjs';
import { serverSecrets } from './secrets.mjs';
import { startServices } from './services.mjs';
import { onStopRequest } from './stopping.mjs';
import { logTail, waitUntil } from './waiting.mjs';
import { welcome } from './welcome.mjs';

/** @param {string} line */
const say = (line) => console.log(line);

/**
 * @param {import('./environment.mjs').Settings} settings
 * @param {Awaited<ReturnType<typeof beginLaunch>>} launch
 */
async function bringUp(settings, { processes, record }) {
  const { dataDirectory } = settings;
  await requirePrograms(settings.ownDatabase ? ['database'] : [], { processes, say });
  await requireModules({ processes, say });
  const secrets = serverSecrets(dataPaths(dataDirectory).secrets, { demo: settings.demo, env: process.env });
  const parts = settings.dev ? [code] : [code, client];
  const [services] = await Promise.all([
    startServices({ settings, processes }),
    requireBuilt(parts, { processes, say, dataDirectory }),
  ]);
  record.setServices(services);
  const env = serverEnvironment(settings, { env: process.env, secrets, services });
  await prepareDatabase(settings, { processes, env, say });
  if (settings.dev) {
    await startDevelopment({ settings, processes, env });
    return;
  }
  const server = processes.start({
    name: 'The server',
    program: process.execPath,
    args: [inProject('server/dist/main.js')],
    env,
    logFile: path.join(dataPaths(dataDirectory).logs, 'server.log'),
    graceMs: 20_000,
  });
  await waitUntil(() => isReady(settings), { what: 'The server', child: server });
}

async function main() {
  const settings = readSettings(process.env, process.argv.slice(2));
  const launch = await beginLaunch(settings);
  let stopping = false;
  /** @type {Promise<void>} */
  const stopped = new Promise((resolve, reject) => {
    onStopRequest(() => {
      stopping = true;
      launch.end().then(resolve, reject);
    });
  });
  try {
    await requireFreePort(settings);
    await bringUp(settings, launch);
    say(welcome(settings));
    const lost = await Promise.race([stopped, launch.processes.lost]);
    if (lost && !stopping)
      throw new LaunchFault(`${lost.name} stopped unexpectedly.${logTail(lost.logFile)}`);
    await stopped;
  } catch (error) {
    // Whatever fails because of being asked to stop is no news.
    if (stopping) return stopped;
    console.error(describeError(error));
    process.exitCode = 1;
    await launch.end();
  }
}

main().catch((/** @type {unknown} */ error) => {
  console.error(describeError(error));
  process.exitCode = 1;
});
