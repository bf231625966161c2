import { newBrowserContext } from '../../fixtures/api';
import { expect, test } from '../../fixtures/test';
import { AddStageDialog } from '../../pages/add-stage-dialog';
import { DeviceFormPage } from '../../pages/device-pages';
import { SetUpPage, WelcomePage } from '../../pages/password-pages';
import { PeoplePage } from '../../pages/people-page';
import { NewProjectPage } from '../../pages/project-pages';
import { SetUpPanel } from '../../pages/set-up-panel';
import { TopBar } from '../../pages/top-bar';
import { ADMINISTRATOR, DESIGNER } from '../../testdata/people';

test.use({ role: null });

test('from an empty library to a verdict of one’s own, by the screens alone', async ({ emptyServer, browser }) => {
  test.setTimeout(120_000);
  const context = await newBrowserContext(browser, emptyServer.url);
  const page = await context.newPage();
  await (await new SetUpPage(page).open()).create(ADMINISTRATOR);
  await new TopBar(page).destination('Administration').click();
  const link = await new PeoplePage(page).invite(DESIGNER.name, DESIGNER.email, ['designer']);
  await new TopBar(page).signOut();
  const desk = await (await new WelcomePage(page).open(link)).choose(DESIGNER.password);

  await desk.follow('Enter a device');
  const form = new DeviceFormPage(page);
  await form.fill({
    'Gain-bandwidth product, minimum': '75',
    'Gain-bandwidth product, typical': '100',
    'Gain-bandwidth product, datasheet page': '4',
  });
  await page.getByLabel('Part number').fill('OWNPART-100');
  const device = await form.save();
  await expect(device.heading).toHaveText('OWNPART-100');
  await device.openQuote();
  await device.fillBreak(1, '1', '0.62');
  await device.saveQuote();
  await expect(device.quote).toContainText('0.62');

  await desk.open();
  await desk.follow('New project');
  const project = await new NewProjectPage(page).create('OWN-1', 'First project');
  const chain = await project.newChain();
  await chain.field('Name of the chain').fill('Probe amplifier');
  await chain.field(/^Lower band edge/).fill('3');
  await chain.field(/^Operating frequency/).fill('5');
  await chain.field(/^Upper band edge/).fill('7 MHz');
  await chain.field('Largest level').fill('10');
  const ledger = await chain.submit();
  await expect(ledger.heading).toHaveText('Probe amplifier');

  await page.getByRole('button', { name: 'Add the first stage' }).click();
  await new AddStageDialog(page).add('OWNPART-100');
  const panel = new SetUpPanel(page);
  await expect(panel.panel).toBeVisible();
  await panel.topology.selectOption('inverting');
  await panel.wantedGain.fill('-10');
  await expect(panel.panel).toContainText('Resistors give −10');
  await panel.feedbackResistor.fill('10k');
  await panel.field('Gain resistor Rg').fill('950');
  await panel.field('Name of the stage').fill('Gain');

  // By hand: 10 kΩ against 950 Ω and the source's 50 Ω is a noise gain of 11; 75 MHz / (11 · 7 MHz) = 0.974.
  await expect(ledger.figure('S1', 'headroom')).toHaveText('×0.974');
  await expect(ledger.row('S1')).toHaveAccessibleName('S1 Gain, over');
  await expect(ledger.chainCost()).toHaveText('0.62');
  await ledger.draft.save.click();
  await expect(ledger.draft.state).toHaveText(/^saved/);
  await page.reload();
  await expect(ledger.row('S1')).toHaveAccessibleName(/^S1 Gain/);
  await context.close();
});
