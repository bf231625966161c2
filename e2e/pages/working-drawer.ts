import type { Locator, Page } from '@playwright/test';

export class WorkingDrawer {
  readonly panel: Locator;

  constructor(page: Page) {
    this.panel = page.getByRole('dialog');
  }

  async close(): Promise<void> {
    await this.panel.getByRole('button', { name: 'Close' }).click();
  }
}
