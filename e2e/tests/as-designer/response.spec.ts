import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { demoChain } from '../../testdata/receiver';

test('the response shows chart and table', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await demoChain(api));
  await ledger.section('Response');
  await expect(page).toHaveURL(/response/);
  await expect(page.getByRole('img', { name: /gain/i }).first()).toBeVisible();
  await page.getByRole('button', { name: /as table/i }).click();
  await expect(page.getByRole('table').first()).toBeVisible();
});
