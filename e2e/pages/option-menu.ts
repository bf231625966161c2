import type { Locator, Page } from '@playwright/test';

/** Options of a chain: the bar of links and what can be done with them. */
export class OptionMenu {
  readonly links: Locator;
  private readonly dialog: Locator;

  constructor(private readonly page: Page) {
    this.links = page.getByRole('navigation', { name: 'Options' }).getByRole('link');
    this.dialog = page.getByRole('dialog');
  }

  link(name: string): Locator {
    return this.links.filter({ hasText: new RegExp(`^${name}`) });
  }

  private async open(item: string | RegExp): Promise<void> {
    await this.page.getByRole('button', { name: /^Options: / }).click();
    await this.page.getByRole('menuitem', { name: item }).click();
  }

  async duplicate(name: string): Promise<void> {
    await this.open('Duplicate this option…');
    await this.dialog.getByLabel('Name of the option').fill(name);
    await this.dialog.getByRole('button', { name: 'Create' }).click();
  }

  async remove(): Promise<void> {
    await this.open('Delete this option…');
    await this.dialog.getByRole('button', { name: /^Delete/ }).click();
  }
}
