import { existsSync, readFileSync } from 'node:fs';
import { stripVTControlCharacters } from 'node:util';

/**
 * What a runner's JSON report says: how many passed, and the title and message of each that did not.
 * A skipped test counts as failed, a file that did not load as one failure, and so does a runner that left no
 * report, ran nothing, or ended in error with every test passed.
 */
export function tally(file, read, { code, output }) {
  const found = existsSync(file) ? readReport(file, read) : { passed: 0, failures: [] };
  if (found.failures.length > 0 || (code === 0 && found.passed > 0)) return found;
  const title = found.passed === 0 ? 'The runner reported no tests' : 'The runner ended in error';
  return { ...found, failures: [{ title, message: stripVTControlCharacters(output) }] };
}

function readReport(file, read) {
  try {
    return gather(read(JSON.parse(readFileSync(file, 'utf8'))));
  } catch (error) {
    return { passed: 0, failures: [{ title: `${file} cannot be read`, message: error.message }] };
  }
}

function gather(results) {
  return {
    passed: results.filter(({ status }) => status === 'passed').length,
    failures: results
      .filter(({ status }) => status !== 'passed')
      .map(({ title, status, message }) => ({
        title,
        message:
          status === 'failed' ? stripVTControlCharacters(message) : `This test was not run (${status}).`,
      })),
  };
}

/** Results in the form that vitest and jest share. */
export function unitResults(report) {
  return report.testResults.flatMap((suite) => {
    const tests = suite.assertionResults.map(({ fullName, status, failureMessages }) => ({
      title: fullName,
      status,
      message: (failureMessages ?? []).join('\n'),
    }));
    const broken = suite.status === 'failed' && tests.every(({ status }) => status !== 'failed');
    return broken ? [...tests, { title: suite.name, status: 'failed', message: suite.message }] : tests;
  });
}

/** Results of Playwright's JSON report; a test that passed only when tried again has failed. */
export function browserResults(report) {
  const errors = report.errors.map(({ message }) => ({ title: 'Playwright', status: 'failed', message }));
  return [...errors, ...report.suites.flatMap((suite) => resultsIn(suite, []))];
}

function resultsIn(suite, path) {
  const here = [...path, suite.title];
  const own = suite.specs.flatMap((spec) =>
    spec.tests.map((test) => ({
      title: [...here, spec.title].join(' › '),
      status: { expected: 'passed', skipped: 'skipped' }[test.status] ?? 'failed',
      message: test.results.flatMap(({ errors }) => errors.map(({ message }) => message)).join('\n'),
    })),
  );
  return [...own, ...(suite.suites ?? []).flatMap((inner) => resultsIn(inner, here))];
}
