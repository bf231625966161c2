import type { Locator, Page } from '@playwright/test';

/**
 * The component library's select. Its options open in a layer at the end of the page; the nodes with the role `option`
 * stay hidden, what is seen carries the text as its title. Whoever changes the library changes it here.
 */
export class SelectBox {
  readonly box: Locator;

  constructor(
    private readonly page: Page,
    scope: Page | Locator,
    label: string,
  ) {
    this.box = scope.getByRole('combobox', { name: label });
  }

  async choose(option: string): Promise<void> {
    await this.box.click();
    await this.page.getByTitle(option, { exact: true }).last().click();
  }
}
