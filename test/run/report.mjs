import { existsSync, readFileSync } from 'node:fs';

/**
 * @typedef {{ passed: number, failed: number }} Count
 *
 * @typedef {object} Report the part of vitest's JSON report that is read here
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {{ status: string, assertionResults: { status: string }[] }[]} testResults
 */

/**
 * Counts the tests of one run. A file that could not be loaded holds no failed test and yet failed, and a run
 * can fail without any failed test (an error behind the tests' back, no tests at all): each counts as one, so
 * that nothing red is counted as green.
 *
 * @param {Report | null} report null where the run wrote none
 * @param {number} exitCode
 * @returns {Count}
 */
export function countTests(report, exitCode) {
  if (report === null) return { passed: 0, failed: 1 };
  const unloaded = report.testResults.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((result) => result.status === 'failed'),
  ).length;
  const failed = report.numFailedTests + unloaded;
  return {
    passed: report.numPassedTests,
    failed: failed === 0 && exitCode !== 0 ? 1 : failed,
  };
}

/**
 * @param {string} file
 * @returns {Report | null}
 */
export function readReport(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
}

/**
 * The last line of everything.
 *
 * @param {Count[]} counts
 */
export function closingLine(counts) {
  const passed = counts.reduce((sum, count) => sum + count.passed, 0);
  const failed = counts.reduce((sum, count) => sum + count.failed, 0);
  return `${passed} passed, ${failed} failed`;
}
