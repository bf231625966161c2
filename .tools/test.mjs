// `npm test`: everything from installation to the browser journeys; the last line is `N passed, N failed`.
import { launch, LaunchError } from './lib/launch-error.mjs';
import { checkFolders, checkNode, install } from './lib/prepare.mjs';
import { killAll } from './lib/process.mjs';

const MESSAGE_LINES = 30;
/** Frames of a stack that lie in other people's code. */
const FOREIGN_FRAME = /^\s+at .*(node_modules|node:internal)/;
/** Colours that a runner put into its messages. */
// eslint-disable-next-line no-control-regex -- the escape character is what is looked for
const COLOURS = /\u001b\[[0-9;]*m/g;
const AT_ONCE = 2;
const say = (text) => console.log(`Bandledger: ${text} …`);
const startedAt = Date.now();
const elapsed = () => `${((Date.now() - startedAt) / 1000).toFixed(0).padStart(4)} s`;

function show({ title, message }) {
  const lines = message
    .replace(COLOURS, '')
    .trimEnd()
    .split('\n')
    .filter((text) => !FOREIGN_FRAME.test(text));
  const rest = lines.length - MESSAGE_LINES;
  console.log(`\n  ✗ ${title}`);
  for (const line of lines.slice(0, MESSAGE_LINES)) console.log(`    ${line}`);
  if (rest > 0) console.log(`    … ${rest} more lines`);
}

async function runStep({ title, action }) {
  let summary;
  try {
    summary = await action(say);
  } catch (error) {
    summary = { passed: 0, failed: 1, failures: [{ title, message: error.stack ?? String(error) }] };
  }
  console.log(`${elapsed()}  ${title}: ${summary.passed} passed, ${summary.failed} failed`);
  summary.failures.forEach(show);
  return summary;
}

async function runGroup(steps) {
  const waiting = [...steps];
  const summaries = [];
  const worker = async () => {
    for (let step = waiting.shift(); step; step = waiting.shift()) summaries.push(await runStep(step));
  };
  await Promise.all(Array.from({ length: AT_ONCE }, worker));
  return summaries;
}

function finish(summaries) {
  const total = (key) => summaries.reduce((sum, summary) => sum + summary[key], 0);
  console.log(`\n${total('passed')} passed, ${total('failed')} failed`);
  return total('failed') > 0 || total('passed') === 0 ? 1 : 0;
}

async function prepare() {
  checkNode();
  checkFolders();
  await install(say);
}

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.on(signal, () => {
    killAll('SIGTERM');
    process.exit(130);
  });
}

await launch(async () => {
  try {
    await prepare();
  } catch (error) {
    if (!(error instanceof LaunchError)) throw error;
    console.error(`Bandledger: ${error.message}`);
    return finish([{ passed: 0, failed: 1 }]);
  }
  const { emptyReports, groups } = await import('./lib/test-steps.mjs');
  emptyReports();
  const summaries = [];
  for (const group of groups) summaries.push(...(await runGroup(group)));
  return finish(summaries);
});
