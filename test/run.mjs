import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describeError } from '../db/launch/fault.mjs';
import { requireModules, requirePrograms } from '../db/launch/packages.mjs';
import { inProject, projectRoot } from '../db/launch/paths.mjs';
import { createProcesses } from '../db/launch/processes.mjs';
import { onStopRequest } from '../db/launch/stopping.mjs';
import { closingLine, countTests, readReport } from './run/report.mjs';
import { steps } from './run/steps.mjs';

/** @typedef {import('./run/steps.mjs').Step} Step */
/** @typedef {import('./run/report.mjs').Count} Count */

const processes = createProcesses();
const reports = mkdtempSync(path.join(tmpdir(), 'weighhouse-reports-'));

/** @param {string} line */
const say = (line) => console.log(line);

/**
 * @param {Step} step
 * @returns {Promise<Count>}
 */
async function runStep(step) {
  say(`\n── ${step.name} ──`);
  const report = path.join(reports, `${step.name}.json`);
  const counted =
    step.project === undefined
      ? []
      : ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const child = processes.start({
    name: step.name,
    program: process.execPath,
    args: [...step.command, ...counted],
    cwd: step.cwd === undefined ? projectRoot : inProject(step.cwd),
    graceMs: 30_000,
  });
  const timer = setTimeout(() => {
    say(`${step.name} took longer than ${step.minutes} minutes and is ended.`);
    void child.stop();
  }, step.minutes * 60_000);
  const { code } = await child.ending;
  clearTimeout(timer);
  if (step.project !== undefined) return countTests(readReport(report), code ?? 128);
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** @returns {Promise<Count[]>} */
async function runAll() {
  await requirePrograms(['database', 'browser'], { processes, say });
  await requireModules({ processes, say });
  /** @type {Map<string, Count>} */
  const counts = new Map();
  for (const step of steps) {
    const blocked = step.needs !== undefined && counts.get(step.needs)?.failed !== 0;
    if (blocked) say(`\n── ${step.name} cannot run, since ${step.needs} failed ──`);
    const started = Date.now();
    const count = blocked ? { passed: 0, failed: 1 } : await runStep(step);
    counts.set(step.name, count);
    say(`${step.name}: ${closingLine([count])} in ${Math.round((Date.now() - started) / 1000)} s`);
  }
  return [...counts.values()];
}

let stopping = false;
onStopRequest(() => {
  stopping = true;
  void processes.stopAll();
});

const counts = await runAll().catch((/** @type {unknown} */ error) => {
  if (!stopping) console.error(describeError(error));
  return [{ passed: 0, failed: 1 }];
});
await processes.stopAll();
rmSync(reports, { recursive: true, force: true });
if (counts.some(({ failed }) => failed > 0)) process.exitCode = 1;
say(`\n${closingLine(counts)}`);
