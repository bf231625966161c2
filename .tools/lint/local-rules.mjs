// Small rules of this repository that no plugin offers.
import { basename } from 'node:path';

const KEBAB_CASE = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*$/;
const PERMITTED_BARREL = /calculator[\\/]engine[\\/]index\.ts$/;

/** File names: words joined by hyphens, then suffixes such as .service.ts. */
const kebabCaseFileName = {
  meta: { type: 'problem', schema: [], messages: { name: 'File names are kebab-case: {{name}}' } },
  create: (context) => ({
    Program(node) {
      const name = basename(context.filename).replace(/^[._]/, '');
      if (!KEBAB_CASE.test(name)) context.report({ node, messageId: 'name', data: { name } });
    },
  }),
};

/** A barrel hides who uses what and invites cycles; the engine has one door on purpose. */
const noBarrel = {
  meta: { type: 'problem', schema: [], messages: { barrel: 'No barrels: import from the file that declares it.' } },
  create: (context) => {
    if (PERMITTED_BARREL.test(context.filename)) return {};
    const report = (node) => context.report({ node, messageId: 'barrel' });
    return {
      ExportAllDeclaration: report,
      'ExportNamedDeclaration[source]': report,
    };
  },
};

export const localPlugin = { rules: { 'kebab-case-file-name': kebabCaseFileName, 'no-barrel': noBarrel } };
