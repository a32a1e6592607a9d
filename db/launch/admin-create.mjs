import { code, requireBuilt } from './build.mjs';
import { readSettings, serverEnvironment } from './environment.mjs';
import { describeError } from './fault.mjs';
import { beginLaunch, runBuilt } from './launch.mjs';
import { requireModules, requirePrograms } from './packages.mjs';
import { dataPaths, inProject } from './paths.mjs';
import { createProcesses } from './processes.mjs';
import { readRunning } from './run-record.mjs';
import { serverSecrets } from './secrets.mjs';
import { startServices } from './services.mjs';
import { onStopRequest } from './stopping.mjs';

/**
 * Progress goes to the error output, so that the link alone can be piped on.
 *
 * @param {string} line
 */
const say = (line) => console.error(line);

/**
 * @param {import('./environment.mjs').Settings} settings
 * @param {import('./processes.mjs').Processes} processes
 * @param {() => Promise<Record<string, string>>} findServices
 * @returns {Promise<number>} the command's exit code
 */
async function createAdministrator(settings, processes, findServices) {
  const { dataDirectory } = settings;
  await requirePrograms(settings.ownDatabase ? ['database'] : [], { processes, say });
  await requireModules({ processes, say });
  const secrets = serverSecrets(dataPaths(dataDirectory).secrets, { demo: settings.demo, env: process.env });
  await requireBuilt([code], { processes, say, dataDirectory });
  const services = await findServices();
  const env = serverEnvironment(settings, { env: process.env, secrets, services });
  await runBuilt({
    what: 'Migrating the database',
    file: 'db/dist/migrate.js',
    processes,
    env,
    dataDirectory,
  });
  const args = [inProject('server/dist/admin-create.js'), ...process.argv.slice(2)];
  return processes.run({ name: 'admin-create', program: process.execPath, args, env });
}

async function main() {
  const settings = readSettings(process.env);
  const running = readRunning(dataPaths(settings.dataDirectory).record);
  const launch = running === null ? await beginLaunch(settings) : null;
  const processes = launch?.processes ?? createProcesses();
  const end = launch?.end ?? processes.stopAll;
  let stopping = false;
  onStopRequest(() => {
    stopping = true;
    void end();
  });
  const findServices = async () => running?.services ?? startServices({ settings, processes });
  try {
    process.exitCode = await createAdministrator(settings, processes, findServices);
  } catch (error) {
    if (!stopping) console.error(describeError(error));
    process.exitCode = 1;
  }
  await end();
}

main().catch((/** @type {unknown} */ error) => {
  console.error(describeError(error));
  process.exitCode = 1;
});
