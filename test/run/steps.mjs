/**
 * @typedef {object} Step
 * @property {string} name
 * @property {string[]} command what node runs from the project's folder
 * @property {string} [cwd] a folder inside the project
 * @property {string} [project] vitest's project, whose tests are counted instead of the step itself
 * @property {string} [needs] a step that must have passed, or this one cannot run
 * @property {number} minutes after which it is ended and counted as failed
 */

const vitest = 'node_modules/vitest/vitest.mjs';

/** @param {string} project */
const tests = (project) => [vitest, 'run', '--project', project];

/** @type {Step[]} */
export const steps = [
  { name: 'lint', command: ['node_modules/eslint/bin/eslint.js', '.', '--max-warnings=0'], minutes: 5 },
  { name: 'format', command: ['node_modules/prettier/bin/prettier.cjs', '--check', '.'], minutes: 2 },
  { name: 'types', command: ['node_modules/typescript/bin/tsc', '-b'], minutes: 4 },
  { name: 'unit', command: tests('unit'), project: 'unit', minutes: 7 },
  { name: 'build', command: ['../node_modules/vite/bin/vite.js', 'build'], cwd: 'client', minutes: 2 },
  { name: 'integration', command: tests('integration'), project: 'integration', minutes: 20 },
  { name: 'browser', command: tests('browser'), project: 'browser', needs: 'build', minutes: 16 },
];
