import type { Locator, Page } from '@playwright/test';

export class SetUpPanel {
  readonly panel: Locator;

  constructor(page: Page) {
    this.panel = page.getByRole('region', { name: /set-up/ });
  }

  field(label: string | RegExp): Locator {
    return this.panel.getByLabel(label);
  }
}
