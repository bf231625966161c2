import { expectAccessible } from '../../fixtures/accessibility';
import { expect, test } from '../../fixtures/test';
import { PeoplePage } from '../../pages/people-page';

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(colorScheme, () => {
    test.use({ colorScheme });
    test('people are accessible', async ({ page }) => {
      const people = await new PeoplePage(page).open();
      await expect(people.table).toBeVisible();
      await page.getByRole('button', { name: 'Invite a person' }).click();
      await expect(page.getByRole('form', { name: 'New person' })).toBeVisible();
      await expectAccessible(page, `people, ${colorScheme}`);
    });
  });
}
