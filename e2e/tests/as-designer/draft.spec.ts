import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { seedReceiver } from '../../testdata/receiver';

test('every edit can be undone and done again', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  await expect(ledger.rows).toHaveCount(4);
  await expect(ledger.draft.undo).toBeDisabled();
  await ledger.row('S2').press('Delete');
  await expect(ledger.rows).toHaveCount(3);
  await ledger.row('S1').press('Alt+ArrowDown');
  await expect(ledger.row('S1')).not.toHaveAccessibleName(/Preamplifier/);

  await page.keyboard.press('Control+z');
  await expect(ledger.row('S1')).toHaveAccessibleName(/Preamplifier/);
  await page.keyboard.press('Control+z');
  await expect(ledger.rows).toHaveCount(4);
  await expect(ledger.draft.state).toHaveText(/^saved/);
  await page.keyboard.press('Control+Shift+z');
  await expect(ledger.rows).toHaveCount(3);
  await expect(ledger.draft.state).toHaveText('unsaved changes');
});

test('a draft survives a reload and can be given up', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  await ledger.row('S2').press('Delete');
  await expect(ledger.rows).toHaveCount(3);
  page.on('dialog', (dialog) => void dialog.accept());
  await page.reload();
  await expect(ledger.rows).toHaveCount(3);
  await expect(page.getByText(/unsaved changes of .* are back/i)).toBeVisible();
  await page.getByRole('button', { name: 'Discard' }).click();
  await expect(ledger.rows).toHaveCount(4);
  await expect(ledger.draft.state).toHaveText(/^saved/);
});

test('leaving with unsaved changes is asked about', async ({ page, api }) => {
  const chain = await seedReceiver(api);
  const ledger = await new LedgerPage(page).open(chain);
  await ledger.row('S4').press('Delete');
  await expect(ledger.rows).toHaveCount(3);
  await page.getByRole('link', { name: 'Devices' }).click();
  const question = page.getByRole('dialog', { name: 'Leave with unsaved changes?' });
  await question.getByRole('button', { name: 'Stay' }).click();
  await expect(ledger.rows).toHaveCount(3);
  await page.getByRole('link', { name: 'Devices' }).click();
  await question.getByRole('button', { name: 'Save and leave' }).click();
  await expect(page.getByRole('heading', { name: 'Devices', level: 1 })).toBeVisible();
  expect((await api.option(chain.optionId)).stages).toHaveLength(3);
});
