// The steps of `npm test`. A step answers { passed, failed, failures }.
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { findChromium } from './chromium.mjs';
import { fromRoot } from './paths.mjs';
import { build } from './prepare.mjs';
import { run } from './process.mjs';
import { readReport } from './reports.mjs';

const MINUTE_MS = 60_000;
export const reportFolder = fromRoot('.cache/reports');

/** npm puts a package into a workspace's own folder where another version stands at the root. */
const bin = (name) =>
  ['frontend', 'backend', 'e2e'].map((workspace) => fromRoot(workspace, 'node_modules', name)).find(existsSync) ??
  fromRoot('node_modules', name);

export function emptyReports() {
  rmSync(reportFolder, { recursive: true, force: true });
  mkdirSync(reportFolder, { recursive: true });
}

const verdict = (title, { code, output, timedOut }) =>
  code === 0
    ? { passed: 1, failed: 0, failures: [] }
    : { passed: 0, failed: 1, failures: [{ title, message: timedOut ? `timed out\n${output}` : output }] };

const command = (title, file, args) => ({
  title,
  action: async () => verdict(title, await run(process.execPath, [bin(file), ...args], { timeoutMs: 10 * MINUTE_MS })),
});

const lint = command('lint', 'eslint/bin/eslint.js', [
  '.',
  '--max-warnings',
  '0',
  '--cache',
  '--cache-location',
  '.cache/eslint/',
  '--cache-strategy',
  'content',
]);

const format = command('format', 'prettier/bin/prettier.cjs', [
  '--check',
  '--log-level',
  'warn',
  '.',
  '--cache',
  '--cache-location',
  '.cache/prettier',
  '--cache-strategy',
  'content',
]);

const types = (workspace) =>
  command(`types of ${workspace}`, 'typescript/bin/tsc', ['-p', `${workspace}/tsconfig.json`, '--noEmit']);

const built = (workspace) => ({
  title: `build of ${workspace}`,
  action: async () => verdict(`build of ${workspace}`, (await build(workspace, () => {})) ?? { code: 0, output: '' }),
});

const same = (title, committed, generated) => {
  const read = (file) => (existsSync(file) ? readFileSync(file, 'utf8') : null);
  const equal = read(committed) !== null && read(committed) === read(generated);
  const hint = `${committed} is not what the code gives; run npm run generate:api and commit the result`;
  return verdict(title, { code: equal ? 0 : 1, output: hint });
};

/** Generates the API description and what is made from it into the cache and compares with what is committed. */
async function drift() {
  const file = (name) => join(reportFolder, name);
  const openapi = await run(process.execPath, [fromRoot('backend/dist/openapi.js'), file('openapi.json')], {
    timeoutMs: MINUTE_MS,
  });
  if (openapi.code !== 0) return verdict('API description', openapi);
  const schema = await run(
    process.execPath,
    [bin('openapi-typescript/bin/cli.js'), file('openapi.json'), '--immutable', '-o', file('schema.d.ts')],
    { timeoutMs: MINUTE_MS },
  );
  const limits = await run(process.execPath, [
    fromRoot('.tools/generate-limits.mjs'),
    file('openapi.json'),
    file('limits.ts'),
  ]);
  if (schema.code !== 0 || limits.code !== 0)
    return verdict('types from the API description', { code: 1, output: schema.output + limits.output });
  return merge([
    same('API description', fromRoot('backend/openapi.json'), file('openapi.json')),
    same('types from the API description', fromRoot('frontend/src/api/schema.d.ts'), file('schema.d.ts')),
    same('limits from the API description', fromRoot('frontend/src/api/limits.ts'), file('limits.ts')),
  ]);
}

export const merge = (summaries) => ({
  passed: summaries.reduce((sum, { passed }) => sum + passed, 0),
  failed: summaries.reduce((sum, { failed }) => sum + failed, 0),
  failures: summaries.flatMap(({ failures }) => failures),
});

const suite = (title, kind, minutes, toArguments, options = {}) => ({
  title,
  action: async () => {
    const file = join(reportFolder, `${title.replaceAll(' ', '-')}.json`);
    const result = await run(process.execPath, toArguments(file), { timeoutMs: minutes * MINUTE_MS, ...options(file) });
    return readReport(kind, file, { name: title, ...result });
  },
});

const plain = () => ({});

const nodeSpecs = (title, folder) =>
  suite(
    title,
    'node',
    5,
    (file) => [
      '--test',
      '--test-reporter',
      fromRoot('.tools/lib/node-test-report.mjs'),
      '--test-reporter-destination',
      file,
      ...readdirSync(fromRoot(folder))
        .filter((name) => name.endsWith('.spec.mjs'))
        .map((name) => fromRoot(folder, name)),
    ],
    plain,
  );

const jest = (title, ...options) =>
  suite(
    title,
    'jest',
    25,
    (file) => [bin('jest/bin/jest.js'), '--json', '--outputFile', file, '--silent', ...options],
    () => ({ cwd: fromRoot('backend') }),
  );

/** What is measured in time runs alone: two suites at once would measure each other. */
const SPEED_SPECS = '(bench|performance-shape)\\.spec\\.ts$';
const backendSpecs = jest('backend specs', '--testPathIgnorePatterns', SPEED_SPECS);
const backendSpeed = jest('speed of the backend', '--runInBand', '--testPathPatterns', SPEED_SPECS);

const frontendSpecs = suite(
  'frontend specs',
  'vitest',
  15,
  (file) => [bin('vitest/vitest.mjs'), 'run', '--reporter=json', '--outputFile', file],
  () => ({
    cwd: fromRoot('frontend'),
  }),
);

const playwright = (title, ...options) => ({
  title,
  action: async (say) => {
    const chromium = await findChromium(say);
    if (chromium.problem) return { passed: 0, failed: 1, failures: [{ title, message: chromium.problem }] };
    const step = suite(
      title,
      'playwright',
      30,
      () => [bin('@playwright/test/cli.js'), 'test', '--reporter=json', ...options],
      (file) => ({
        cwd: fromRoot('e2e'),
        env: { ...process.env, CHROMIUM_PATH: chromium.path, PLAYWRIGHT_JSON_OUTPUT_NAME: file },
      }),
    );
    return step.action();
  },
});

const journeys = playwright('browser journeys', '--grep-invert', '@speed');
const browserSpeed = playwright('speed in the browser', '--grep', '@speed', '--workers=1');

/** Groups run one after the other, the steps of a group beside each other. */
export const groups = [
  [built('backend'), built('frontend'), lint, format, types('backend'), types('frontend'), types('e2e')],
  [
    { title: 'API drift', action: drift },
    nodeSpecs('lint rules', '.tools/lint'),
    nodeSpecs('launcher', '.tools/specs'),
  ],
  [backendSpecs],
  [backendSpeed],
  [frontendSpecs],
  [journeys],
  [browserSpeed],
];
