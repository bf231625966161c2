import { expect, test } from '../../fixtures/test';
import { DeviceFormPage } from '../../pages/device-pages';
import { LedgerPage } from '../../pages/ledger-page';
import { seedReceiver } from '../../testdata/receiver';

test.use({ expectedStatuses: [422] });

test('wrong values are told at their field, and nothing typed is lost', async ({ page, api }) => {
  const ledger = await new LedgerPage(page).open(await seedReceiver(api));
  const panel = await ledger.select('S2');
  for (const wrong of ['-5', '1e400', 'NaN', '12 MHz', '<b>5</b>', '=1+1']) {
    await panel.feedbackResistor.fill(wrong);
    await expect(panel.feedbackResistor, wrong).toHaveAttribute('aria-invalid', 'true');
    await expect(panel.feedbackResistor).toHaveValue(wrong);
    await expect(panel.panel.getByRole('alert').first()).toBeVisible();
    await expect(ledger.rows, 'the ledger stays').toHaveCount(4);
  }
  await panel.feedbackResistor.fill('2k');
  await expect(panel.feedbackResistor).not.toHaveAttribute('aria-invalid', 'true');
});

test('a device with contradictory values is refused in words', async ({ page }) => {
  await page.goto('/devices/new');
  const form = new DeviceFormPage(page);
  await form.fill({
    'Gain-bandwidth product, minimum': '120',
    'Gain-bandwidth product, typical': '100',
    'Phase margin': '120',
  });
  await form.save();
  await expect(form.heading).toBeVisible();
  await expect(page.getByRole('alert').first()).toBeVisible();
  await expect(form.field('Gain-bandwidth product, minimum')).toHaveValue('120');

  const name = '<script>alert(1)</script> عنصر 🙂';
  await page.getByLabel('Part number').fill(name);
  await form.fill({ 'Gain-bandwidth product, minimum': '80', 'Phase margin': '60' });
  const device = await form.save();
  await expect(device.heading).toHaveText(name);
});
