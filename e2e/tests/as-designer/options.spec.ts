import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { OptionMenu } from '../../pages/option-menu';
import { seedReceiver } from '../../testdata/receiver';

test('an option is duplicated, changed beside the first and deleted', async ({ page, api }) => {
  const chain = await seedReceiver(api);
  const ledger = await new LedgerPage(page).open(chain);
  const options = new OptionMenu(page);
  await expect(ledger.rows).toHaveCount(4);
  await options.duplicate('With three stages');
  await expect(options.link('With three stages')).toHaveAttribute('aria-current', 'page');
  await ledger.row('S4').press('Delete');
  await ledger.draft.save.click();
  await expect(ledger.draft.state).toHaveText(/^saved/);

  await options.link('Baseline').click();
  await expect(ledger.rows).toHaveCount(4);
  await options.link('With three stages').click();
  await expect(ledger.rows).toHaveCount(3);
  await options.remove();
  await expect(options.links).toHaveCount(1);
  await expect(ledger.rows).toHaveCount(4);
  expect((await api.chain(chain.chainId)).options.map(({ name }) => name)).toEqual(['Baseline']);
});

test('the GBW case changes figures, never the verdict', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  await expect(ledger.figure('S2', 'headroom')).toHaveText('×0.974');
  await ledger.gbwCase('typical');
  // By hand: 100 MHz / (11 · 7 MHz) = 1.299.
  await expect(ledger.figure('S2', 'headroom')).toHaveText(/^×1\.30/);
  await expect(ledger.row('S2')).toHaveAccessibleName(/over$/);
  await expect(page.getByText(/verdicts stay on minimum/)).toBeVisible();
  await expect(page).toHaveURL(/case=typical/);
  await page.reload();
  await expect(ledger.figure('S2', 'headroom')).toHaveText(/^×1\.30/);
});
