import { Api, newBrowserContext, newRequest } from '../../fixtures/api';
import { expect, test } from '../../fixtures/test';
import { LedgerPage } from '../../pages/ledger-page';
import { ProjectPage, ProjectsPage } from '../../pages/project-pages';
import { seedReceiver } from '../../testdata/receiver';

test('the lead sees the weakest option first and sets the margins that verdicts keep', async ({ page, api }) => {
  const chain = await seedReceiver(api);
  const project = await new ProjectPage(page).open(chain.projectId);
  await expect(project.option('Baseline')).toContainText('over');
  await expect(project.option('Baseline')).toContainText('0.974');

  await page.getByRole('link', { name: 'Edit project' }).click();
  await page.getByRole('textbox', { name: 'GBW headroom' }).fill('8');
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await expect(project.chains).toBeVisible();

  // S3 has 260 MHz and spends 5 · 7 MHz: 7.43, clear at 3 and tight at 8.
  const ledger = await new LedgerPage(page).open(chain);
  await expect(ledger.row('S3')).toHaveAccessibleName(/tight$/);
});

test('a closed project does not exist for others', async ({ page, api, browser, server }) => {
  const request = await newRequest(server.url);
  const designer = new Api(request);
  await designer.signInToDemo('designer');
  const { id } = await designer.send<{ id: string }>('POST', '/projects', {
    code: 'HIDDEN',
    name: 'Seen by its members only',
    open: false,
    currency: 'USD',
    buildQuantity: 10,
  });
  const projects = await new ProjectsPage(page).open();
  await expect(projects.table).toBeVisible();
  await expect(projects.table).not.toContainText('HIDDEN');
  expect((await api.get<{ id: string }[]>('/projects')).map((project) => project.id)).not.toContain(id);

  const context = await newBrowserContext(browser, server.url, await request.storageState());
  const own = await new ProjectsPage(await context.newPage()).open();
  await expect(own.table).toContainText('HIDDEN');
  await context.close();
  await request.dispose();
});
