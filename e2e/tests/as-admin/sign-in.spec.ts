import { newBrowserContext } from '../../fixtures/api';
import { expect, test } from '../../fixtures/test';
import { SignInPage } from '../../pages/sign-in-page';
import { SetUpPage } from '../../pages/password-pages';
import { TopBar } from '../../pages/top-bar';
import { ADMINISTRATOR } from '../../testdata/people';

test.describe('on a first start without demo', () => {
  test.use({ role: null, expectedStatuses: [401, 404, 422] });

  test('the token makes one administrator, who then signs in by password', async ({ emptyServer, browser }) => {
    const context = await newBrowserContext(browser, emptyServer.url);
    const page = await context.newPage();
    const setUp = await new SetUpPage(page).open();
    await setUp.create({ ...ADMINISTRATOR, token: 'this-is-not-the-token' });
    await expect(setUp.alert).toBeVisible();
    const desk = await setUp.create(ADMINISTRATOR);
    await expect(desk.heading).toBeVisible();

    await new TopBar(page).signOut();
    const signIn = new SignInPage(page);
    await expect(signIn.heading).toBeVisible();
    await signIn.submit(ADMINISTRATOR.email, 'not the password at all');
    await expect(signIn.alert).toHaveText('E-mail address and password do not match an active account.');
    await signIn.submit('nobody@example.org', ADMINISTRATOR.password);
    await expect(signIn.alert).toHaveText('E-mail address and password do not match an active account.');
    await expect((await signIn.submit(ADMINISTRATOR.email, ADMINISTRATOR.password)).heading).toBeVisible();

    await new TopBar(page).signOut();
    await expect(signIn.heading).toBeVisible();
    await page.goto('/setup');
    await expect(signIn.heading).toBeVisible();
    await context.close();
  });
});
