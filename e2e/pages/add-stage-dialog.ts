import type { Locator, Page } from '@playwright/test';
import { SelectBox } from '../components/select-box';

export class AddStageDialog {
  readonly dialog: Locator;
  private readonly device: SelectBox;

  constructor(page: Page) {
    this.dialog = page.getByRole('dialog', { name: 'Add a stage' });
    this.device = new SelectBox(page, this.dialog, 'Device');
  }

  async add(partNumber: string): Promise<void> {
    await this.device.choose(partNumber);
    await this.dialog.getByRole('button', { name: 'Add', exact: true }).click();
  }
}
