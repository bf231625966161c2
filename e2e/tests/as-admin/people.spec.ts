import { newBrowserContext } from '../../fixtures/api';
import { randomUUID } from 'node:crypto';
import { expect, test } from '../../fixtures/test';
import { PeoplePage } from '../../pages/people-page';
import { WelcomePage } from '../../pages/password-pages';
import { SignInPage } from '../../pages/sign-in-page';
import { TopBar } from '../../pages/top-bar';

const PASSWORD = 'as long as it must be';

test.describe('people', () => {
  test.use({ expectedStatuses: [401, 404] });

  test('a person is invited, chooses a password, works, and is out the moment the account is deactivated', async ({
    page,
    browser,
    baseURL,
  }) => {
    const email = `${randomUUID()}@example.org`;
    const people = await new PeoplePage(page).open();
    const link = await people.invite('Nela Fenn', email, ['designer', 'buyer']);
    await expect(people.person('Nela Fenn')).toContainText('invited');

    const theirs = await newBrowserContext(browser, baseURL ?? '');
    const screen = await theirs.newPage();
    const desk = await (await new WelcomePage(screen).open(link)).choose(PASSWORD);
    await expect(desk.heading).toBeVisible();
    await expect(new TopBar(screen).destination('Administration')).toHaveCount(0);

    const late = await newBrowserContext(browser, baseURL ?? '');
    const again = await new WelcomePage(await late.newPage()).open(link);
    await expect(again.alert).toContainText('used already or has expired');
    await late.close();

    await people.deactivate('Nela Fenn');
    await expect(people.person('Nela Fenn')).toContainText('deactivated');
    await new TopBar(screen).destination('Projects').click();
    await expect(screen.getByText(/your session has ended|sign in/i).first()).toBeVisible();
    const signIn = await new SignInPage(screen).open();
    await signIn.submit(email, PASSWORD);
    await expect(signIn.alert).toBeVisible();
    await theirs.close();
  });
});
