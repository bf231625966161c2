import { request } from '@playwright/test';
import { Api, newBrowserContext } from '../../fixtures/api';
import { expect, test } from '../../fixtures/test';
import { SignInPage } from '../../pages/sign-in-page';
import { demoChain } from '../../testdata/receiver';

test.use({ role: null });

test('from sign-in to the stage that is over, why, what clears it and what that costs', async ({
  ownDemo,
  browser,
}) => {
  const context = await newBrowserContext(browser, ownDemo.url);
  const page = await context.newPage();
  const desk = await (await new SignInPage(page).open()).signInAsDemo('designer');
  const ledger = await desk.openChain(/^PW-5/);

  // By hand: 75 MHz / (11 · 7 MHz) = 0.974; 4.10 + 0.62 + 1.45 + 1.95 = 8.12.
  await expect(ledger.row('S2')).toHaveAccessibleName(/over$/);
  await expect(ledger.figure('S2', 'headroom')).toHaveText('×0.974');
  await expect(ledger.figure('S2', 'Noise gain')).toHaveText('11');
  await expect(ledger.verdict).toContainText('S2');
  await expect(ledger.verdict).toContainText('7');
  await expect(ledger.chainCost()).toHaveText('8.12');

  const working = await ledger.openWorking('S2', 'headroom');
  await expect(working.panel).toContainText('0.974');
  await expect(working.panel).toContainText('MRWG-G072');
  await expect(working.panel).toContainText('Source');
  await working.close();

  const panel = await ledger.select('S2');
  await expect(panel.needs).toContainText('231 MHz');
  await expect(panel.device('MRWG-G072')).toContainText('over');
  await panel.deviceName('MRWG-V300').click();

  // 260 MHz / (11 · 7 MHz) = 3.377; 8.12 − 0.62 + 1.45 = 8.95.
  await expect(ledger.figure('S2', 'headroom')).toHaveText(/^×3\.3[78]/);
  await expect(ledger.row('S2')).toHaveAccessibleName(/clear$/);
  await expect(ledger.chainCost()).toHaveText('8.95');
  await ledger.draft.save.click();
  await expect(ledger.draft.state).toHaveText(/^saved/);

  const reader = await request.newContext({
    baseURL: ownDemo.url,
    storageState: await context.storageState(),
  });
  const api = new Api(reader);
  const { optionId } = await demoChain(api);
  expect((await api.option(optionId)).version).toBeGreaterThan(1);
  await reader.dispose();
  await context.close();
});
