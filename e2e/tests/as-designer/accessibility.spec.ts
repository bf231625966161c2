import { expectAccessible } from '../../fixtures/accessibility';
import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { SignInPage } from '../../pages/sign-in-page';
import { demoChain } from '../../testdata/receiver';

const PAGES = [
  { name: 'desk', path: '/', heading: 'Desk' },
  { name: 'projects', path: '/projects', heading: 'Projects' },
  { name: 'new project', path: '/projects/new', heading: 'New project' },
  { name: 'devices', path: '/devices', heading: 'Devices' },
  { name: 'new device', path: '/devices/new', heading: 'Enter a device' },
  { name: 'about', path: '/about', heading: 'About Bandledger' },
];

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(colorScheme, () => {
    test.use({ colorScheme });

    test('lists and forms are accessible', async ({ page }) => {
      for (const { name, path, heading } of PAGES) {
        await page.goto(path);
        await expect(page.getByRole('heading', { name: heading, level: 1 })).toBeVisible();
        await expect(page.getByRole('progressbar')).toHaveCount(0);
        await expectAccessible(page, `${name}, ${colorScheme}`);
      }
    });

    test('project, ledger with panel and working, and response are accessible', async ({ page, api }) => {
      const chain = await demoChain(api);
      await page.goto(`/projects/${chain.projectId}`);
      await expect(page.getByRole('table').first()).toBeVisible();
      await expectAccessible(page, `project, ${colorScheme}`);

      const ledger = await new LedgerPage(page).open(chain);
      await expect(ledger.rows).toHaveCount(4);
      await expectAccessible(page, `ledger, ${colorScheme}`);
      const { panel } = await ledger.select('S2');
      await expect(panel).toBeVisible();
      await expectAccessible(page, `set-up panel, ${colorScheme}`);
      const working = await ledger.openWorking('S2', 'headroom');
      await expect(working.panel).toContainText('0.974');
      await expectAccessible(page, `working, ${colorScheme}`);
      await working.close();
      await ledger.section('Response');
      await expect(page.getByRole('img', { name: /gain/i }).first()).toBeVisible();
      await expectAccessible(page, `response, ${colorScheme}`);
    });

    test.describe('signed out', () => {
      test.use({ role: null });
      test('sign-in is accessible', async ({ page }) => {
        const signIn = await new SignInPage(page).open();
        await expect(signIn.demoPerson('designer').first()).toBeVisible();
        await expectAccessible(page, `sign-in, ${colorScheme}`);
      });
    });
  });
}
