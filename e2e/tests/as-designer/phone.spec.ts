import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { demoChain } from '../../testdata/receiver';

test.use({ viewport: { width: 390, height: 844 }, hasTouch: true });

test('the ledger is read on a phone', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await demoChain(api));
  await expect(ledger.verdict).toContainText('S2');
  await expect(ledger.cards).toHaveCount(5);
  await expect(ledger.cards.nth(1)).toContainText('0.974');
  await expect(ledger.cards.nth(1)).toContainText('over');
  const width = await page.evaluate(() => document.documentElement.scrollWidth);
  expect(width, 'nothing sticks out sideways').toBeLessThanOrEqual(390);
  await page.getByRole('button', { name: 'Menu' }).click();
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Projects' }).click();
  await expect(page.getByRole('heading', { name: 'Projects', level: 1 })).toBeVisible();
});

for (const [path, table] of [
  ['/projects', 'Projects'],
  ['/devices', 'Devices'],
]) {
  test(`${path} scrolls its table sideways on a phone, not the page`, async ({ page }) => {
    await page.goto(path ?? '');
    await expect(page.getByRole('table', { name: table })).toBeVisible();
    const width = await page.evaluate(() => document.documentElement.scrollWidth);
    expect(width).toBeLessThanOrEqual(390);
  });
}
