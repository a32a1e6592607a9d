import { describe, expect, it } from 'vitest';
import { closingLine, countTests } from './report.mjs';

const file = (status: string, ...results: string[]) => ({
  status,
  assertionResults: results.map((result) => ({ status: result })),
});

describe('counting a run', () => {
  it('takes the tests as they are reported', () => {
    const testResults = [file('passed', 'passed', 'passed'), file('failed', 'passed', 'failed')];
    expect(countTests({ numPassedTests: 3, numFailedTests: 1, testResults }, 1)).toEqual({
      passed: 3,
      failed: 1,
    });
  });

  it('counts a file that could not be loaded as a failure', () => {
    const testResults = [file('passed', 'passed'), file('failed'), file('failed', 'skipped')];
    expect(countTests({ numPassedTests: 1, numFailedTests: 0, testResults }, 1)).toEqual({
      passed: 1,
      failed: 2,
    });
  });

  it.each([
    ['an error outside every test', { numPassedTests: 5, numFailedTests: 0, testResults: [] }, 1, 5, 1],
    ['no tests at all', { numPassedTests: 0, numFailedTests: 0, testResults: [] }, 1, 0, 1],
    ['a run that broke off without a report', null, 137, 0, 1],
    ['a missing report after a run that claims success', null, 0, 0, 1],
  ])('counts %s as a failure', (_name, report, exitCode, passed, failed) => {
    expect(countTests(report, exitCode)).toEqual({ passed, failed });
  });
});

it('adds up in the closing line', () => {
  expect(closingLine([])).toBe('0 passed, 0 failed');
  expect(
    closingLine([
      { passed: 1, failed: 0 },
      { passed: 40, failed: 2 },
    ]),
  ).toBe('41 passed, 2 failed');
});
