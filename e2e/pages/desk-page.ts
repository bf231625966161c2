import type { Locator, Page } from '@playwright/test';
import { LedgerPage } from './ledger-page';

export class DeskPage {
  readonly heading: Locator;
  readonly over: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Desk' });
    this.over = page.getByRole('region', { name: 'Over a limit' }).getByRole('listitem');
  }

  async open(): Promise<this> {
    await this.page.goto('/');
    return this;
  }

  async openChain(name: string | RegExp): Promise<LedgerPage> {
    await this.page.getByRole('link', { name }).first().click();
    return new LedgerPage(this.page);
  }

  async follow(action: string): Promise<void> {
    await this.page.getByRole('link', { name: action }).click();
  }
}
