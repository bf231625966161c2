import { expect, test } from '../../fixtures/test';
import { type DevicePage, DevicesPage } from '../../pages/device-pages';
import { seedReceiver } from '../../testdata/receiver';

test.use({ expectedStatuses: [409] });

test('the library is searched, and a device in use is not deleted but says where it is', async ({ page, api }) => {
  const { code } = await seedReceiver(api);
  const devices = await new DevicesPage(page).open();
  await page.getByLabel('Part number or maker').fill('g072');
  await expect(devices.table.getByRole('rowheader')).toHaveCount(1);
  await expect(page).toHaveURL(/search=g072/);

  const device: DevicePage = await devices.openDevice('MRWG-G072');
  await expect(device.uses).toContainText(code);
  await page.getByRole('button', { name: 'Delete', exact: true }).click();
  await page.getByRole('dialog').getByRole('button', { name: 'Delete' }).click();
  const refusal = page.getByRole('dialog', { name: 'MRWG-G072 was not deleted' });
  await expect(refusal).toContainText(code);
  await expect(refusal).toContainText('Gain');
});
