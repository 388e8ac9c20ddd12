import { expect, test } from 'vitest'
import { countResults, summaryLine } from './test-summary.mjs'

const file = (status, ...tests) => ({ status, assertionResults: tests.map((one) => ({ status: one })) })
const report = (passed, failed, ...testResults) => ({
  numPassedTests: passed,
  numFailedTests: failed,
  testResults,
})

test.each([
  ['all pass', report(2, 0, file('passed', 'passed', 'passed')), 0, '2 passed, 0 failed'],
  ['one fails', report(1, 1, file('failed', 'passed', 'failed')), 1, '1 passed, 1 failed'],
  [
    'a file cannot be loaded',
    report(1, 0, file('passed', 'passed'), file('failed')),
    1,
    '1 passed, 1 failed',
  ],
  [
    'a test fails and another file cannot be loaded',
    report(0, 1, file('failed', 'failed'), file('failed')),
    1,
    '0 passed, 2 failed',
  ],
  [
    'a hook fails and its tests are passed over',
    report(0, 0, file('failed', 'skipped')),
    1,
    '0 passed, 1 failed',
  ],
  ['an error outside any test', report(2, 0, file('passed', 'passed', 'passed')), 1, '2 passed, 1 failed'],
  ['no report', null, 0, '0 passed, 1 failed'],
  ['no report after a crash', null, 139, '0 passed, 1 failed'],
  ['ended by a signal', null, null, '0 passed, 1 failed'],
])('%s', (_, results, exitCode, expected) => {
  expect(summaryLine(countResults(results, exitCode))).toBe(expected)
})
