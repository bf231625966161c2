// `npm run bench`: the speed limits, measured; medians unless said otherwise. The tests hold five times these figures.
import { mkdirSync, readFileSync } from 'node:fs';
import { ENTRY_LIMIT_KB, entryBundleKb } from './lib/bundle-size.mjs';
import { findChromium } from './lib/chromium.mjs';
import { launch, LaunchError } from './lib/launch-error.mjs';
import { fromRoot } from './lib/paths.mjs';
import { buildAll, checkFolders, checkNode, install } from './lib/prepare.mjs';
import { run } from './lib/process.mjs';

const say = (text) => console.log(`Bandledger: ${text} …`);

const line = ({ name, value, limit, unit }) =>
  console.log(`${value <= limit ? '✓' : '✗'} ${name}: ${value.toPrecision(3)} ${unit} (limit ${limit} ${unit})`);

async function serverFigures() {
  const { code, output } = await run(process.execPath, [fromRoot('backend/dist/bench.js')]);
  if (code !== 0) throw new LaunchError(`the server's measurements failed:\n${output}`);
  return JSON.parse(output.trimEnd().split('\n').at(-1));
}

const annotationsOf = (suites) =>
  suites.flatMap((suite) => [
    ...(suite.specs ?? []).flatMap((spec) =>
      spec.tests.flatMap((test) => test.results.flatMap((result) => result.annotations ?? [])),
    ),
    ...annotationsOf(suite.suites ?? []),
  ]);

/** The journey that opens the ledger on a slowed processor writes its median into an annotation. */
async function browserFigures() {
  const chromium = await findChromium(say);
  if (chromium.problem) throw new LaunchError(chromium.problem);
  mkdirSync(fromRoot('.cache'), { recursive: true });
  const report = fromRoot('.cache/bench.json');
  const env = { ...process.env, CHROMIUM_PATH: chromium.path, PLAYWRIGHT_JSON_OUTPUT_NAME: report };
  const cli = fromRoot('node_modules/@playwright/test/cli.js');
  const { output } = await run(process.execPath, [cli, 'test', '--grep', '@speed', '--reporter=json'], {
    cwd: fromRoot('e2e'),
    env,
  });
  const measured = annotationsOf(JSON.parse(readFileSync(report, 'utf8')).suites).filter(
    ({ type }) => type === 'measured',
  );
  if (measured.length === 0) throw new LaunchError(`the browser measurement failed:\n${output}`);
  return measured.map(({ description }) => JSON.parse(description));
}

await launch(async () => {
  checkNode();
  checkFolders();
  await install(say);
  await buildAll(say);
  const bundle = {
    name: 'entry bundle, compressed',
    value: entryBundleKb(fromRoot('frontend/dist')),
    limit: ENTRY_LIMIT_KB,
    unit: 'kB',
  };
  const figures = [...(await serverFigures()), bundle, ...(await browserFigures())];
  figures.forEach(line);
  return figures.every(({ value, limit }) => value <= limit) ? 0 : 1;
});
