// For every rule of the configuration: a text that must be refused and one beside it that must pass.
const repeat = (count, line) => Array.from({ length: count }, (_, index) => line(index)).join('\n');
const importing = (from) => `import * as used from '${from}';\nexport const value = used;\n`;

const CONTROLLER = 'backend/src/chains/chains.controller.ts';
const SERVICE = 'backend/src/chains/chains.service.ts';
const POLICY = 'backend/src/chains/chains.policy.ts';
const PRESENTER = 'backend/src/chains/chain.presenter.ts';
const ENGINE = 'backend/src/calculator/engine/stage.ts';
const SPEC = 'backend/src/chains/chains.service.spec.ts';
const JOURNEY = 'e2e/tests/as-designer/ledger.spec.ts';

const path = (title, file, bad, good) => ({
  title,
  rule: 'import-x/no-restricted-paths',
  bad: [file, importing(bad)],
  good: [file, importing(good)],
});

const restricted = [
  path('the engine imports only itself', ENGINE, '../../common/clock', './units'),
  path('the engine does not know its Nest face', ENGINE, '../calculator.service', './units'),
  path('a service enters the engine by its door', SERVICE, '../calculator/engine/units', '../calculator/engine'),
  path('API specs too', 'backend/test/a.e2e-spec.ts', '../src/calculator/engine/units', '../src/calculator/engine'),
  path('a policy uses no service', POLICY, './chains.service', './models/chain'),
  path('a presenter uses no service', PRESENTER, './chains.service', './dto/chain.dto'),
  path('a controller uses no model', CONTROLLER, './models/chain', './chains.service'),
  path('a controller uses no engine', CONTROLLER, '../calculator/engine', './dto/chain.dto'),
  path('a controller uses no other service', CONTROLLER, '../projects/projects.service', './chains.service'),
  path(
    'controllers take the sign-in decorators',
    CONTROLLER,
    '../auth/auth.service',
    '../auth/decorators/public.decorator',
  ),
  path('a service leaves other models alone', SERVICE, '../projects/models/project', '../projects/projects.service'),
  path('a service leaves other DTOs alone', SERVICE, '../projects/dto/project.dto', './dto/chain.dto'),
  path(
    'features follow their order',
    'backend/src/projects/projects.service.ts',
    '../chains/chains.service',
    '../audit/audit.service',
  ),
  path('audit stands first', 'backend/src/audit/audit.service.ts', '../projects/projects.service', '../common/clock'),
  path(
    'the calculator has a place in the order',
    'backend/src/projects/projects.service.ts',
    '../calculator/calculator.service',
    '../calculator/engine',
  ),
  path(
    'common knows no feature',
    'backend/src/common/guard.ts',
    '../projects/projects.service',
    '../config/environment',
  ),
  path(
    'database knows no feature',
    'backend/src/database/runner.ts',
    '../chains/models/chain',
    '../config/environment',
  ),
  path('config stands below common', 'backend/src/config/schema.ts', '../common/clock', './environment'),
  path('components know no feature', 'frontend/src/components/bar.tsx', '../features/ledger/lanes', '../lib/units'),
  path('components fetch nothing', 'frontend/src/components/list.tsx', '../api/client', '../api/api-error'),
  path('lib stands lowest', 'frontend/src/lib/scale.ts', '../components/figure', './units'),
  path('lib fetches nothing', 'frontend/src/lib/scale.ts', '../api/client', '../api/types'),
  path('api stands below components', 'frontend/src/api/session.ts', '../components/figure', '../lib/units'),
  path('a feature imports no other feature', 'frontend/src/features/ledger/row.tsx', '../devices/queries', './lanes'),
  path(
    'a feature does not know the app',
    'frontend/src/features/ledger/row.tsx',
    '../../app/router',
    '../../components/figure',
  ),
  path('the frontend imports no backend', 'frontend/src/lib/a.ts', '../../../backend/src/calculator/engine', './units'),
  path('the backend imports no frontend', SERVICE, '../../../frontend/src/lib/units', '../common/clock'),
  path(
    'journeys import no product source',
    JOURNEY,
    '../../../backend/src/calculator/engine',
    '../../pages/ledger-page',
  ),
  path('page models know no tests', 'e2e/pages/desk-page.ts', '../tests/as-designer/one.spec', './ledger-page'),
];

const bareImports = [
  {
    title: 'the engine takes no package',
    bad: [ENGINE, importing('@nestjs/common')],
    good: [ENGINE, importing('./units')],
  },
  {
    title: 'the engine takes no Node.js module',
    bad: [ENGINE, importing('node:fs')],
    good: [ENGINE, importing('./units')],
  },
  {
    title: 'policies are free of Nest',
    bad: [POLICY, importing('@nestjs/common')],
    good: [POLICY, importing('./models/chain')],
  },
  {
    title: 'presenters are free of Sequelize',
    bad: [PRESENTER, importing('sequelize')],
    good: [PRESENTER, importing('./models/chain')],
  },
  {
    title: 'no forwardRef',
    bad: [SERVICE, "import { forwardRef } from '@nestjs/common';\nexport const reference = forwardRef;\n"],
    good: [SERVICE, "import { Injectable } from '@nestjs/common';\nexport const decorator = Injectable;\n"],
  },
  {
    title: 'journeys name no product package',
    bad: [JOURNEY, importing('@bandledger/backend')],
    good: [JOURNEY, importing('@playwright/test')],
  },
  {
    title: 'the launcher uses Node.js alone',
    bad: ['.tools/lib/a.mjs', importing('concurrently')],
    good: ['.tools/lib/a.mjs', importing('node:fs')],
  },
].map((entry) => ({ rule: 'no-restricted-imports', ...entry }));

const readsEnvironment = 'export const port = process.env.PORT;\n';
const environment = [
  {
    title: 'only config reads the environment',
    rule: 'no-restricted-properties',
    bad: [SERVICE, readsEnvironment],
    good: ['backend/src/config/environment.ts', readsEnvironment],
  },
  {
    title: 'the engine has no process',
    rule: 'no-restricted-globals',
    bad: [ENGINE, 'export const pid = process.pid;\n'],
    good: [ENGINE, 'export const largest = Math.max(1, 2);\n'],
  },
];

const branches = (count) =>
  `export function pick(a: number): number {\n${repeat(count, (n) => `  if (a === ${n}) return ${n};`)}\n  return a;\n}\n`;
const longFunction = (count) => `export function longOne(): void {\n${repeat(count, () => '  Math.random();')}\n}\n`;

const sizes = [
  {
    title: 'a file has at most 300 lines',
    rule: 'max-lines',
    bad: [ENGINE, `${repeat(301, (n) => `export const value${n} = ${n};`)}\n`],
    good: [ENGINE, `${repeat(300, (n) => `export const value${n} = ${n}; // why\n`)}\n`],
  },
  {
    title: 'a function has at most 60 lines',
    rule: 'max-lines-per-function',
    bad: [ENGINE, longFunction(59)],
    good: [ENGINE, longFunction(58)],
  },
  {
    title: 'a describe block may be longer',
    rule: 'max-lines-per-function',
    bad: [ENGINE, longFunction(80)],
    good: [SPEC, longFunction(80)],
  },
  { title: 'complexity is at most 10', rule: 'complexity', bad: [ENGINE, branches(10)], good: [ENGINE, branches(9)] },
];

const cycle = (name) => `import { b } from './${name}';\nexport const a = b;\n`;
const style = [
  {
    title: 'no import cycles',
    rule: 'import-x/no-cycle',
    bad: ['backend/src/calculator/engine/cycle-a.ts', cycle('cycle-b')],
    good: ['backend/src/calculator/engine/cycle-a.ts', "import { units } from './units';\nexport const a = units;\n"],
  },
  {
    title: 'no any',
    rule: '@typescript-eslint/no-explicit-any',
    bad: [ENGINE, 'export const parse = (text: any): string => String(text);\n'],
    good: [ENGINE, 'export const parse = (text: unknown): string => String(text);\n'],
  },
  {
    title: 'no barrels',
    rule: 'bandledger/no-barrel',
    bad: ['backend/src/chains/index.ts', "export * from './chains.service';\n"],
    good: ['backend/src/calculator/engine/index.ts', "export * from './units';\n"],
  },
  {
    title: 'file names are kebab-case',
    rule: 'bandledger/kebab-case-file-name',
    bad: ['frontend/src/components/FigureCell.tsx', 'export const figureCell = 1;\n'],
    good: ['frontend/src/components/figure-cell.tsx', 'export const figureCell = 1;\n'],
  },
  {
    title: 'promises are awaited',
    rule: '@typescript-eslint/no-floating-promises',
    bad: [SERVICE, 'export function save(): void {\n  Promise.resolve(1);\n}\n'],
    good: [SERVICE, 'export async function save(): Promise<void> {\n  await Promise.resolve(1);\n}\n'],
  },
  {
    title: 'hooks are called unconditionally',
    rule: 'react-hooks/rules-of-hooks',
    bad: [
      'frontend/src/lib/use-a.ts',
      "import { useState } from 'react';\nexport function useA(on: boolean) {\n  return on ? useState(1) : null;\n}\n",
    ],
    good: [
      'frontend/src/lib/use-a.ts',
      "import { useState } from 'react';\nexport function useA() {\n  return useState(1);\n}\n",
    ],
  },
  {
    title: 'nothing is printed from the product',
    rule: 'no-console',
    bad: [SERVICE, "console.log('here');\n"],
    good: ['.tools/lib/a.mjs', "console.log('here');\n"],
  },
];

const runs = "it('runs', () => {});\n";
const declared =
  'declare const it: { only: typeof it; skip: typeof it } & ((name: string, body: () => void) => void);\n';
const syntax = [
  { title: 'no .only', bad: [SPEC, `${declared}it.only('runs', () => {});\n`], good: [SPEC, declared + runs] },
  { title: 'no .skip', bad: [SPEC, `${declared}it.skip('runs', () => {});\n`], good: [SPEC, declared + runs] },
  {
    title: 'no .skip in a journey',
    bad: [JOURNEY, `${declared}it.skip('runs', () => {});\n`],
    good: [JOURNEY, declared + runs],
  },
  {
    title: 'no disabled tests by another name',
    bad: [SPEC, "declare const xit: (name: string) => void;\nxit('runs');\n"],
    good: [SPEC, declared + runs],
  },
  {
    title: 'no sleeps in specs',
    bad: [SPEC, 'export const pause = () => new Promise((resolve) => setTimeout(resolve, 50));\n'],
    good: [SPEC, 'export const pause = () => new Promise((resolve) => resolve(1));\n'],
  },
  {
    title: 'no sleeps in journeys',
    bad: [JOURNEY, 'export const wait = (page: { waitForTimeout(ms: number): void }) => page.waitForTimeout(50);\n'],
    good: [JOURNEY, 'export const wait = (page: { waitForURL(url: string): void }) => page.waitForURL("/");\n'],
  },
  {
    title: 'no CSS classes in page models',
    bad: [
      'e2e/pages/desk-page.ts',
      "export const row = (page: { locator(css: string): void }) => page.locator('div.row');\n",
    ],
    good: [
      'e2e/pages/desk-page.ts',
      "export const row = (page: { getByRole(role: string): void }) => page.getByRole('row');\n",
    ],
  },
].map((entry) => ({ rule: 'no-restricted-syntax', ...entry }));

export const cases = [...restricted, ...bareImports, ...environment, ...sizes, ...style, ...syntax];
