// The ESLint configuration as a function of the root folder, so that the specs can hold each rule against a small tree
// of their own.
import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';
import { importZones } from './import-zones.mjs';
import { localPlugin } from './local-rules.mjs';

const TYPESCRIPT = ['**/*.ts', '**/*.tsx'];
const SPECS = [
  '**/*.spec.ts',
  '**/*.spec.tsx',
  '**/*.test.ts',
  '**/*.test.tsx',
  '**/*.e2e-spec.ts',
  '**/*.spec.mjs',
  '**/*.test-support.ts',
];
const TEST_CODE = [...SPECS, 'backend/test/**', 'frontend/src/testing/**', 'e2e/**'];

const IGNORED = [
  '**/node_modules/**',
  '**/dist/**',
  'data/**',
  '**/coverage/**',
  '.cache/**',
  'e2e/test-results/**',
  'e2e/playwright-report/**',
  'frontend/src/api/schema.d.ts',
  'frontend/src/api/limits.ts',
];

const UNFINISHED_TESTS = [
  {
    selector:
      'MemberExpression[property.name=/^(only|skip|skipIf|todo|fixme|failing)$/]:matches([object.name=/^(describe|it|test|suite)$/], [object.property.name=/^(describe|each|it|test|concurrent|serial)$/])',
    message: 'No .only, .skip or .todo: a test runs or it is deleted.',
  },
  {
    selector: 'CallExpression[callee.name=/^(xit|xtest|xdescribe|fit|fdescribe)$/]',
    message: 'No disabled or focused tests.',
  },
];

const SLEEPS = [
  {
    selector: 'NewExpression[callee.name="Promise"] CallExpression[callee.name="setTimeout"]',
    message: 'No sleeps in tests: wait for what is to happen.',
  },
  { selector: 'CallExpression[callee.property.name="waitForTimeout"]', message: 'No sleeps in tests.' },
];

const CSS_LOCATORS = [
  {
    selector:
      'CallExpression[callee.property.name=/^(locator|\\$|\\$\\$|querySelector|querySelectorAll|waitForSelector)$/] > Literal[value=/(^|[\\s>+~,a-z*\\])])[.#][A-Za-z_]/]',
    message: 'Find things as a person does, by role and name; no CSS classes or ids.',
  },
];

const restrictedSyntax = (...lists) => ['error', ...lists.flat()];
const processEnv = { object: 'process', property: 'env', message: 'Only backend/src/config reads the environment.' };

const sizes = {
  'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
  'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true, IIFEs: true }],
  complexity: ['error', 10],
};

const imports = (root) => ({
  'import-x/no-restricted-paths': ['error', { basePath: root, zones: importZones(root) }],
  'import-x/no-cycle': ['error', { ignoreExternal: true }],
  'import-x/no-self-import': 'error',
  'import-x/no-duplicates': 'error',
});

const common = (root) => ({
  plugins: { 'import-x': importX, bandledger: localPlugin },
  settings: {
    'import-x/resolver-next': [
      createTypeScriptImportResolver({
        project: ['backend/tsconfig.json', 'frontend/tsconfig.json', 'e2e/tsconfig.json'].map(
          (file) => `${root}/${file}`,
        ),
        noWarnOnMultipleProjects: true,
      }),
    ],
    'import-x/extensions': ['.ts', '.tsx', '.mjs', '.js'],
    'import-x/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
    'import-x/external-module-folders': ['node_modules'],
  },
  linterOptions: { reportUnusedDisableDirectives: 'error' },
  rules: {
    ...imports(root),
    ...sizes,
    'bandledger/kebab-case-file-name': 'error',
    'no-restricted-syntax': restrictedSyntax(UNFINISHED_TESTS),
    eqeqeq: ['error', 'always', { null: 'ignore' }],
    'no-console': 'error',
  },
});

const typescript = (root) => ({
  files: TYPESCRIPT,
  extends: [tseslint.configs.recommended],
  languageOptions: { parserOptions: { tsconfigRootDir: root } },
  rules: {
    '@typescript-eslint/no-explicit-any': 'error',
    '@typescript-eslint/consistent-type-imports': [
      'error',
      { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false },
    ],
    '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
    'bandledger/no-barrel': 'error',
  },
});

/** A forgotten await is a lost write on the server and a flaky journey in the browser: worth the typed lint. */
const awaited = (root) => ({
  files: ['backend/**/*.ts', 'e2e/**/*.ts'],
  languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: root } },
  rules: {
    '@typescript-eslint/no-floating-promises': 'error',
    '@typescript-eslint/await-thenable': 'error',
  },
});

const engine = {
  files: ['backend/src/calculator/engine/**/*.ts'],
  ignores: SPECS,
  rules: {
    'no-restricted-imports': [
      'error',
      { patterns: [{ regex: '^[^.]', message: 'The engine imports nothing outside itself.' }] },
    ],
    'no-restricted-globals': [
      'error',
      'process',
      'require',
      'fetch',
      'setTimeout',
      'setInterval',
      'Buffer',
      'performance',
    ],
  },
};

const backend = [
  {
    files: ['backend/**/*.ts'],
    languageOptions: { globals: globals.node },
    rules: {
      // Nest reads parameter types at run time: a type-only import would erase what it injects.
      '@typescript-eslint/consistent-type-imports': 'off',
      'no-restricted-imports': [
        'error',
        { paths: [{ name: '@nestjs/common', importNames: ['forwardRef'], message: 'Break the cycle instead.' }] },
      ],
    },
  },
  {
    files: ['backend/src/**/*.ts'],
    ignores: ['backend/src/config/**', ...SPECS],
    rules: { 'no-restricted-properties': ['error', processEnv] },
  },
  {
    files: ['backend/src/**/*.policy.ts', 'backend/src/**/*.presenter.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: '^(@nestjs/|sequelize)', message: 'Policies and presenters are pure functions.' }] },
      ],
    },
  },
  {
    files: ['backend/src/bench.ts', 'backend/src/**/reset.ts', 'backend/src/openapi.ts'],
    rules: { 'no-console': 'off' },
  },
  engine,
];

const frontend = {
  files: ['frontend/src/**/*.ts', 'frontend/src/**/*.tsx'],
  extends: [reactHooks.configs.flat.recommended],
  languageOptions: { globals: globals.browser },
};

const endToEnd = {
  files: ['e2e/**/*.ts'],
  languageOptions: { globals: globals.node },
  rules: {
    'no-restricted-syntax': restrictedSyntax(UNFINISHED_TESTS, SLEEPS, CSS_LOCATORS),
    'no-restricted-imports': [
      'error',
      { patterns: [{ regex: '^@bandledger/(backend|frontend)', message: 'Browser tests import no product source.' }] },
    ],
    'no-empty-pattern': 'off',
  },
};

const tools = [
  {
    files: ['**/*.mjs', '**/*.js'],
    languageOptions: { globals: globals.node },
    rules: { 'no-console': 'off' },
  },
  { files: ['**/*.js'], languageOptions: { sourceType: 'commonjs' } },
  {
    // The launcher must run before anything is installed.
    files: ['.tools/*.mjs', '.tools/lib/**/*.mjs'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: '^(?!node:|\\.)', message: 'The launcher uses Node.js modules only.' }] },
      ],
    },
  },
];

const tests = [
  { files: ['backend/**/*.ts', 'frontend/**/*.ts', 'frontend/**/*.tsx'].flatMap(asSpecs), rules: sleepless() },
  { files: TEST_CODE, rules: { 'max-lines-per-function': 'off' } },
];

function asSpecs(pattern) {
  const folder = pattern.split('/')[0];
  return SPECS.map((spec) => `${folder}/${spec}`);
}

function sleepless() {
  return { 'no-restricted-syntax': restrictedSyntax(UNFINISHED_TESTS, SLEEPS) };
}

export function createConfig(root) {
  return tseslint.config(
    { ignores: IGNORED },
    js.configs.recommended,
    common(root),
    typescript(root),
    awaited(root),
    ...backend,
    frontend,
    ...tools,
    endToEnd,
    ...tests,
    prettier,
  );
}
