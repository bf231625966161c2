import type { Locator, Page } from '@playwright/test';

/**
 * The component library's select: the combobox carries the label, the options open in a list of their own at the end of
 * the page and stay there, hidden, after closing. Everything that knows this is here.
 */
export class SelectField {
  readonly box: Locator;

  constructor(
    private readonly page: Page,
    scope: Page | Locator,
    name: string | RegExp,
  ) {
    this.box = scope.getByRole('combobox', { name });
  }

  async choose(option: string | RegExp): Promise<void> {
    await this.box.click();
    await this.page.getByTitle(option).and(this.page.locator('[aria-selected]')).or(this.option(option)).last().click();
  }

  private option(option: string | RegExp): Locator {
    return this.page.getByRole('option', { name: option });
  }
}
