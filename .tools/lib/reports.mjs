// Reads the runners' JSON reports into { passed, failed, failures: [{ title, message }] }. Whatever did not run to a
// good end counts as failed: skipped and unfinished tests, files that could not be loaded, a missing or empty report.
import { existsSync, readFileSync } from 'node:fs';

const failure = (title, message) => ({ passed: 0, failed: 1, failures: [{ title, message }] });

function fromNodeTest({ passed, failed, failures }) {
  return { passed, failed, failures };
}

/** jest's shape, which vitest writes too. */
function fromJest(report) {
  const summary = { passed: 0, failed: 0, failures: [] };
  const fail = (title, message) => {
    summary.failed += 1;
    summary.failures.push({ title, message });
  };
  for (const file of report.testResults) {
    const tests = file.assertionResults ?? [];
    if (tests.length === 0) fail(file.name, file.message || 'the file holds no test');
    for (const test of tests) {
      if (test.status === 'passed') summary.passed += 1;
      else fail(`${file.name} › ${test.fullName}`, (test.failureMessages ?? []).join('\n') || test.status);
    }
  }
  return summary;
}

const playwrightSpecs = (suites, path = []) =>
  suites.flatMap((suite) => [
    ...(suite.specs ?? []).map((spec) => ({ spec, path: [...path, suite.title] })),
    ...playwrightSpecs(suite.suites ?? [], [...path, suite.title]),
  ]);

function fromPlaywright(report) {
  const summary = { passed: 0, failed: 0, failures: [] };
  const fail = (title, errors) => {
    summary.failed += 1;
    summary.failures.push({ title, message: errors.map((error) => error.message ?? String(error.value)).join('\n') });
  };
  for (const { spec, path } of playwrightSpecs(report.suites ?? [])) {
    for (const test of spec.tests) {
      if (test.status === 'expected') summary.passed += 1;
      else {
        const errors = test.results.flatMap((result) => result.errors ?? []);
        fail(
          [test.projectName, ...path, spec.title].join(' › '),
          errors.length > 0 ? errors : [{ message: test.status }],
        );
      }
    }
  }
  if ((report.errors ?? []).length > 0) fail('browser journeys', report.errors);
  return summary;
}

const readers = { node: fromNodeTest, jest: fromJest, vitest: fromJest, playwright: fromPlaywright };

export function readReport(kind, file, { name, code, output = '' }) {
  const tail = output.trimEnd().split('\n').slice(-40).join('\n');
  let summary;
  try {
    if (!existsSync(file)) return failure(name, `no report was written (exit code ${code})\n${tail}`);
    summary = readers[kind](JSON.parse(readFileSync(file, 'utf8')));
  } catch (error) {
    return failure(name, `the report cannot be read: ${error.message}\n${tail}`);
  }
  if (summary.passed + summary.failed === 0) return failure(name, `the report is empty (exit code ${code})\n${tail}`);
  if (code !== 0 && summary.failed === 0) {
    summary.failed += 1;
    summary.failures.push({ title: name, message: `all tests passed, yet it ended with exit code ${code}\n${tail}` });
  }
  return summary;
}
