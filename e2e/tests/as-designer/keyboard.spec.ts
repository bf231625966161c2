import type { Locator, Page } from '@playwright/test';
import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { SetUpPanel } from '../../pages/set-up-panel';
import { seedReceiver } from '../../testdata/receiver';

const TAB_STOPS = 60;

async function tabTo(page: Page, target: Locator): Promise<void> {
  for (let stop = 0; stop < TAB_STOPS; stop += 1) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  await expect(target).toBeFocused();
}

test('the ledger is worked with the keyboard alone', async ({ page, api }) => {
  const chain = await seedReceiver(api);
  const ledger = await new LedgerPage(page).open(chain);
  await expect(ledger.rows).toHaveCount(4);
  await tabTo(page, ledger.row('S1'));

  await page.keyboard.press('ArrowDown');
  await expect(ledger.row('S2')).toBeFocused();
  await page.keyboard.press('Enter');
  await expect(new SetUpPanel(page).panel).toBeVisible();
  await expect(ledger.row('S2')).toHaveAttribute('aria-current', 'true');
  await page.keyboard.press('Escape');
  await expect(new SetUpPanel(page).panel).toBeHidden();

  await ledger.row('S2').press('Alt+ArrowUp');
  await expect(ledger.row('S1')).toHaveAccessibleName(/^S1 Gain/);
  await page.keyboard.press('Control+s');
  await expect(ledger.draft.state).toHaveText(/^saved/);
  expect((await api.option(chain.optionId)).stages[0]?.name).toMatch(/Gain/);

  await page.keyboard.press('?');
  await expect(page.getByRole('dialog', { name: /shortcuts/i })).toBeVisible();
});
