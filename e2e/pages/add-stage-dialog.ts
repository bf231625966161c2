import type { Locator, Page } from '@playwright/test';

export class AddStageDialog {
  readonly dialog: Locator;

  constructor(page: Page) {
    this.dialog = page.getByRole('dialog', { name: 'Add a stage' });
  }

  async add(partNumber: string): Promise<void> {
    await this.dialog.getByLabel('Device').selectOption({ label: partNumber });
    await this.dialog.getByRole('button', { name: 'Add', exact: true }).click();
  }
}
