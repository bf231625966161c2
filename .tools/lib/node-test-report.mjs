// Reporter for node:test that writes counts and failures as JSON.
const isUnfinished = (data) => data.skip !== undefined || data.todo !== undefined;

function messageOf(data) {
  if (isUnfinished(data)) return 'skipped';
  const error = data.details?.error;
  return String(error?.cause?.stack ?? error?.message ?? 'failed');
}

const isTest = ({ type, data }) => ['test:pass', 'test:fail'].includes(type) && data.details?.type !== 'suite';

export default async function* report(source) {
  const summary = { passed: 0, failed: 0, failures: [] };
  const path = [];
  for await (const event of source) {
    const { type, data } = event;
    if (type === 'test:start') path.splice(data.nesting, path.length, data.name);
    if (!isTest(event)) continue;
    if (type === 'test:pass' && !isUnfinished(data)) {
      summary.passed += 1;
    } else {
      summary.failed += 1;
      summary.failures.push({
        title: [...path.slice(0, data.nesting), data.name].join(' › '),
        message: messageOf(data),
      });
    }
  }
  yield JSON.stringify(summary);
}
