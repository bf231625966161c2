// A small tree in the temporary folder with the product's layout, for the lint specs: no bad file lies in the product.
import { mkdirSync, mkdtempSync, realpathSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { ESLint } from 'eslint';
import { createConfig } from './config.mjs';

const TSCONFIG = JSON.stringify({
  compilerOptions: {
    module: 'esnext',
    moduleResolution: 'bundler',
    target: 'es2022',
    strict: true,
    experimentalDecorators: true,
    jsx: 'preserve',
    types: [],
  },
  include: ['.'],
});

const value = (name) => `export const ${name} = 1;\n`;

const FILES = {
  'backend/tsconfig.json': TSCONFIG,
  'frontend/tsconfig.json': TSCONFIG,
  'e2e/tsconfig.json': TSCONFIG,
  'backend/src/config/environment.ts': value('environment'),
  'backend/src/common/clock.ts': value('clock'),
  'backend/src/database/connection.ts': value('connection'),
  'backend/src/audit/audit.service.ts': value('auditService'),
  'backend/src/auth/auth.service.ts': value('authService'),
  'backend/src/auth/decorators/public.decorator.ts': value('isPublic'),
  'backend/src/projects/projects.service.ts': value('projectsService'),
  'backend/src/projects/models/project.ts': value('project'),
  'backend/src/projects/dto/project.dto.ts': value('projectDto'),
  'backend/src/chains/chains.service.ts': value('chainsService'),
  'backend/src/chains/models/chain.ts': value('chain'),
  'backend/src/chains/dto/chain.dto.ts': value('chainDto'),
  'backend/src/calculator/calculator.service.ts': value('calculatorService'),
  'backend/src/calculator/engine/index.ts': value('analyse'),
  'backend/src/calculator/engine/units.ts': value('units'),
  'backend/src/calculator/engine/cycle-b.ts': "import { a } from './cycle-a';\nexport const b = a;\n",
  'backend/src/calculator/engine/cycle-a.ts': value('a'),
  'frontend/src/app/router.ts': value('router'),
  'frontend/src/api/client.ts': value('client'),
  'frontend/src/api/types.ts': value('types'),
  'frontend/src/api/api-error.ts': value('apiError'),
  'frontend/src/lib/units.ts': value('units'),
  'frontend/src/components/figure.ts': value('figure'),
  'frontend/src/features/ledger/lanes.ts': value('lanes'),
  'frontend/src/features/devices/queries.ts': value('queries'),
  'e2e/tests/as-designer/one.spec.ts': value('one'),
  'e2e/pages/ledger-page.ts': value('ledgerPage'),
};

const write = (root, path, text) => {
  mkdirSync(dirname(join(root, path)), { recursive: true });
  writeFileSync(join(root, path), text);
};

/** Gives `lint(path, code)`, which answers with the rules that fired, and `remove()`. */
export function createFixtureTree(productRoot) {
  const root = realpathSync(mkdtempSync(join(tmpdir(), 'bandledger-lint-')));
  for (const [path, text] of Object.entries(FILES)) write(root, path, text);
  symlinkSync(join(productRoot, 'node_modules'), join(root, 'node_modules'), 'dir');
  const eslint = new ESLint({ cwd: root, overrideConfigFile: true, overrideConfig: createConfig(root) });
  const lint = async (path, code) => {
    // The typed rules read files from the disk, so the text goes there as well.
    write(root, path, code);
    const [result] = await eslint.lintText(code, { filePath: join(root, path) });
    return result.messages;
  };
  return { root, lint, remove: () => rmSync(root, { recursive: true, force: true }) };
}
