import type { Locator, Page } from '@playwright/test';

export class PeoplePage {
  readonly heading: Locator;
  readonly table: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'People', level: 1 });
    this.table = page.getByRole('table', { name: 'People' });
  }

  async open(): Promise<this> {
    await this.page.goto('/administration');
    return this;
  }

  person(name: string): Locator {
    return this.table.getByRole('row').filter({ has: this.page.getByRole('rowheader', { name }) });
  }

  /** Creates a person and answers the one-time link as it is shown. */
  async invite(name: string, email: string, roles: readonly string[]): Promise<string> {
    await this.page.getByRole('button', { name: 'Invite a person' }).click();
    const form = this.page.getByRole('form', { name: 'New person' });
    await form.getByLabel('Name').fill(name);
    await form.getByLabel('E-mail address').fill(email);
    for (const role of ['designer', 'buyer', 'lead', 'admin']) {
      await form.getByRole('checkbox', { name: new RegExp(`^${role}`) }).setChecked(roles.includes(role));
    }
    await form.getByRole('button', { name: 'Create and show the one-time link' }).click();
    const dialog = this.page.getByRole('dialog', { name: /^One-time link/ });
    const address = await dialog.getByLabel('One-time link').inputValue();
    await dialog.getByRole('button', { name: 'Done' }).click();
    return address;
  }

  async deactivate(name: string): Promise<void> {
    await this.page.getByRole('button', { name: `Deactivate ${name}` }).click();
    await this.page.getByRole('dialog').getByRole('button', { name: 'Deactivate' }).click();
  }
}
