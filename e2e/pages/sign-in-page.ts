import type { Locator, Page } from '@playwright/test';
import { DeskPage } from './desk-page';

export class SignInPage {
  readonly heading: Locator;
  readonly email: Locator;
  readonly password: Locator;
  readonly alert: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Sign in' });
    this.email = page.getByLabel('E-mail address');
    this.password = page.getByLabel('Password', { exact: true });
    this.alert = page.getByRole('alert');
  }

  async open(): Promise<this> {
    await this.page.goto('/sign-in');
    return this;
  }

  demoPerson(role: string): Locator {
    return this.page.getByRole('listitem').filter({ hasText: role }).getByRole('button');
  }

  async signInAsDemo(role: string): Promise<DeskPage> {
    await this.demoPerson(role).first().click();
    return new DeskPage(this.page);
  }

  async submit(email: string, password: string): Promise<DeskPage> {
    await this.email.fill(email);
    await this.password.fill(password);
    await this.page.getByRole('button', { name: 'Sign in' }).click();
    return new DeskPage(this.page);
  }
}
