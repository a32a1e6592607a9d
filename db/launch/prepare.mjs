import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { code } from './build.mjs';
import { runBuilt } from './launch.mjs';
import { dataPaths, inProject } from './paths.mjs';

/**
 * What the database of the data folder was last prepared by: this build of the migrations and the demo.
 *
 * @param {import('./environment.mjs').Settings} settings
 */
const preparation = ({ demo }) =>
  `${readFileSync(inProject(code.stamp), 'utf8').trim()} demo=${String(demo)}\n`;

/**
 * Migrates the database and, where asked for, seeds the demo. Both change nothing when they did their work
 * before, but loading them takes seconds, so a database of the data folder that the same build has prepared
 * is left alone.
 *
 * @param {import('./environment.mjs').Settings} settings
 * @param {{ processes: import('./processes.mjs').Processes, env: NodeJS.ProcessEnv,
 *   say: (line: string) => void }} options
 * @throws {import('./fault.mjs').LaunchFault} with the command's last words
 */
export async function prepareDatabase(settings, { processes, env, say }) {
  const { dataDirectory } = settings;
  const mark = path.join(dataPaths(dataDirectory).database, 'prepared');
  const wanted = preparation(settings);
  if (settings.ownDatabase && existsSync(mark) && readFileSync(mark, 'utf8') === wanted) return;
  say(settings.demo ? 'Preparing the database and the demo.' : 'Preparing the database.');
  const commands = { processes, env, dataDirectory };
  await runBuilt({ what: 'Migrating the database', file: 'db/dist/migrate.js', ...commands });
  if (settings.demo) await runBuilt({ what: 'Seeding the demo', file: 'db/dist/seed-demo.js', ...commands });
  if (settings.ownDatabase) writeFileSync(mark, wanted);
}
