import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { seedReceiver } from '../../testdata/receiver';

test('a remedy of the sentence can be taken and taken back', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  await expect(ledger.row('S2')).toHaveAccessibleName(/over$/);
  await ledger.remedy(/.+/).first().click();
  await expect(ledger.row('S2')).not.toHaveAccessibleName(/over$/);
  await ledger.draft.undo.click();
  await expect(ledger.row('S2')).toHaveAccessibleName(/over$/);
});

test('every device is tried in this place, the cheapest that pass first', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  const panel = await ledger.select('S2');
  await expect(panel.device('MRWG-G072')).toHaveAttribute('aria-current', 'true');
  const rows = panel.devices.getByRole('row');
  const verdicts = (await rows.allInnerTexts()).map((text) => /(clear|tight|unknown|over)\s*$/.exec(text.trim())?.[1]);
  const order = verdicts.filter((verdict) => verdict !== undefined);
  expect(order[0]).toBe('clear');
  expect(order.lastIndexOf('clear')).toBeLessThan(order.indexOf('over'));
  await panel.devices.getByLabel('Filter the devices').fill('V300');
  await expect(panel.deviceName('MRWG-V300')).toBeVisible();
  await expect(rows).toHaveCount(3);
});

test('figures follow what is typed, in engineering notation', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  const panel = await ledger.select('S2');
  await panel.topology.selectOption('non-inverting');
  await panel.wantedGain.fill('20 dB');
  // Non-inverting ×10: noise gain 10, 75 MHz / (10 · 7 MHz) = 1.07.
  await expect(ledger.figure('S2', 'headroom')).toHaveText(/^×1\.07/);
  await expect(ledger.row('S2')).toHaveAccessibleName(/tight$/);
  await panel.feedbackResistor.fill('4k7');
  await expect(panel.panel).toContainText('= 4.7 kΩ');
});
