import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { browserResults, tally, unitResults } from '../lib/reports.mjs';

let folder;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'steelyard-reports-'));
});
afterAll(() => rmSync(folder, { recursive: true }));

function tallied(report, read, code) {
  const file = join(folder, 'report.json');
  writeFileSync(file, typeof report === 'string' ? report : JSON.stringify(report));
  return tally(file, read, { code, output: 'what the runner printed' });
}

const unitReport = (...tests) => ({
  testResults: [{ name: 'a.test.ts', status: 'passed', message: '', assertionResults: tests }],
});
const passing = { fullName: 'adds', status: 'passed', failureMessages: [] };

describe('the tally of a unit runner', () => {
  test('counts what passed', () => {
    expect(tallied(unitReport(passing, passing), unitResults, 0)).toEqual({ passed: 2, failures: [] });
  });

  test('keeps the title and the message of what failed', () => {
    const failing = {
      fullName: 'divides',
      status: 'failed',
      failureMessages: ['\u001b[31mexpected 2\u001b[39m'],
    };
    expect(tallied(unitReport(passing, failing), unitResults, 1)).toEqual({
      passed: 1,
      failures: [{ title: 'divides', message: 'expected 2' }],
    });
  });

  test.each(['skipped', 'pending', 'todo'])('counts a test that is %s as failed', (status) => {
    const { failures } = tallied(unitReport(passing, { fullName: 'later', status }), unitResults, 0);
    expect(failures).toEqual([{ title: 'later', message: `This test was not run (${status}).` }]);
  });

  test('counts a file that does not load as failed', () => {
    const report = {
      testResults: [{ name: 'b.test.ts', status: 'failed', message: 'no such module', assertionResults: [] }],
    };
    expect(tallied(report, unitResults, 1).failures).toEqual([
      { title: 'b.test.ts', message: 'no such module' },
    ]);
  });

  test('counts a runner that fails with every test passed as failed', () => {
    const { passed, failures } = tallied(unitReport(passing), unitResults, 1);
    expect(passed).toBe(1);
    expect(failures).toEqual([{ title: 'The runner ended in error', message: 'what the runner printed' }]);
  });

  test('counts a runner that ran nothing as failed', () => {
    expect(tallied({ testResults: [] }, unitResults, 0).failures).toHaveLength(1);
  });

  test('counts a missing report as failed', () => {
    const { failures } = tally(join(folder, 'none.json'), unitResults, { code: 0, output: 'died' });
    expect(failures).toEqual([{ title: 'The runner reported no tests', message: 'died' }]);
  });

  test('counts a report cut short as failed', () => {
    expect(tallied('{"testResults": [', unitResults, 0).failures).toHaveLength(1);
  });
});

describe('the tally of the browser runner', () => {
  const spec = (title, status, messages = []) => ({
    title,
    tests: [{ status, results: [{ errors: messages.map((message) => ({ message })) }] }],
  });
  const report = (...specs) => ({
    errors: [],
    suites: [{ title: 'a.spec.ts', specs: [], suites: [{ title: 'a newcomer', specs }] }],
  });

  test('counts nested suites and names failures by their path', () => {
    expect(
      tallied(report(spec('signs in', 'expected'), spec('leaves', 'unexpected', ['no'])), browserResults, 1),
    ).toEqual({
      passed: 1,
      failures: [{ title: 'a.spec.ts › a newcomer › leaves', message: 'no' }],
    });
  });

  test.each(['flaky', 'skipped'])('counts a %s journey as failed', (status) => {
    expect(tallied(report(spec('wavers', status)), browserResults, 0).failures).toHaveLength(1);
  });

  test('counts an error outside every journey as failed', () => {
    const broken = { errors: [{ message: 'no such file' }], suites: [] };
    expect(tallied(broken, browserResults, 1).failures).toEqual([
      { title: 'Playwright', message: 'no such file' },
    ]);
  });
});
