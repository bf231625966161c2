import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { seedReceiver } from '../../testdata/receiver';

test.use({ expectedStatuses: [409] });

test('two people save the same option: the second chooses, nothing is lost', async ({
  page,
  api,
  browser,
  baseURL,
  storageState,
}) => {
  const chain = await seedReceiver(api);
  const mine = await new LedgerPage(page).open(chain);
  await expect(mine.rows).toHaveCount(4);

  const elsewhere = await browser.newContext({ baseURL, storageState });
  const theirs = await new LedgerPage(await elsewhere.newPage()).open(chain);
  await expect(theirs.rows).toHaveCount(4);
  await theirs.row('S4').press('Delete');
  await theirs.draft.save.click();
  await expect(theirs.draft.state).toHaveText(/^saved/);
  await elsewhere.close();

  await mine.row('S1').press('Delete');
  await expect(mine.rows).toHaveCount(3);
  await mine.draft.save.click();
  const choice = page.getByRole('dialog', { name: /was changed meanwhile/ });
  await expect(choice).toBeVisible();
  await choice.getByRole('button', { name: 'Save mine over it' }).click();
  await expect(choice).toBeHidden();
  await expect(mine.draft.state).toHaveText(/^saved/);
  const { stages } = await api.option(chain.optionId);
  expect(stages).toHaveLength(3);
  expect(stages[0]?.name).not.toMatch(/preamplifier/i);
});

test('or takes what the other saved, and can still have their own back', async ({ page, api }) => {
  const chain = await seedReceiver(api);
  const ledger = await new LedgerPage(page).open(chain);
  await expect(ledger.rows).toHaveCount(4);
  const { version, name, stages } = await api.option(chain.optionId);
  await api.send('PUT', `/options/${chain.optionId}`, { version, name, stages: stages.slice(0, 2) });

  await ledger.row('S1').press('Delete');
  await ledger.draft.save.click();
  await page.getByRole('button', { name: 'Show theirs, drop mine' }).click();
  await expect(ledger.rows).toHaveCount(2);
  await ledger.draft.undo.click();
  await expect(ledger.rows).toHaveCount(3);
});
