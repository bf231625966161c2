import { expect, test } from '../../fixtures/test';
import { Api, newBrowserContext, newRequest } from '../../fixtures/api';
import { DevicesPage } from '../../pages/device-pages';
import { LedgerPage } from '../../pages/ledger-page';
import { demoChain } from '../../testdata/receiver';

test('a quote that the buyer enters is what the ledger counts', async ({ browser, ownDemo }) => {
  const request = await newRequest(ownDemo.url);
  const api = new Api(request);
  await api.signInToDemo('buyer');
  const chain = await demoChain(api);
  const context = await newBrowserContext(browser, ownDemo.url, await request.storageState());
  const page = await context.newPage();

  const ledger = await new LedgerPage(page).open(chain);
  await expect(ledger.chainCost()).toHaveText('8.12');
  await expect(ledger.draft.save).toHaveCount(0);

  const device = await (await new DevicesPage(page).open()).openDevice('MRWG-V300');
  await expect(device.edit, 'a buyer does not edit electrical values').toHaveCount(0);
  await device.openQuote();
  const line = await device.lineOf('250');
  await device.price(line).fill('1.8O');
  await device.saveQuote();
  await expect(page.getByRole('alert').first()).toBeVisible();
  await device.price(line).fill('1.80');
  await device.saveQuote();
  await expect(device.quote).toContainText('1.80');

  // By hand: 4.10 + 0.62 + 1.80 + 1.95 = 8.47.
  await new LedgerPage(page).open(chain);
  await expect(ledger.chainCost()).toHaveText('8.47');
  await context.close();
  await request.dispose();
});
