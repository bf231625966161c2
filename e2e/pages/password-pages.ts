import type { Locator, Page } from '@playwright/test';
import { DeskPage } from './desk-page';

export interface FirstAdministrator {
  readonly token: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

async function choosePassword(page: Page, password: string, submit: string): Promise<DeskPage> {
  await page.getByLabel('New password').fill(password);
  await page.getByLabel('Once more').fill(password);
  await page.getByRole('button', { name: submit }).click();
  return new DeskPage(page);
}

/** The one-time page that makes the first administrator. */
export class SetUpPage {
  readonly heading: Locator;
  readonly alert: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Set up' });
    this.alert = page.getByRole('alert');
  }

  async open(): Promise<this> {
    await this.page.goto('/setup');
    return this;
  }

  async create({ token, name, email, password }: FirstAdministrator): Promise<DeskPage> {
    await this.page.getByLabel('Setup token').fill(token);
    await this.page.getByLabel('Your name').fill(name);
    await this.page.getByLabel('E-mail address').fill(email);
    return choosePassword(this.page, password, 'Create the first administrator');
  }
}

/** Where a one-time link leads. */
export class WelcomePage {
  readonly heading: Locator;
  readonly alert: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Choose a password' });
    this.alert = page.getByRole('alert');
  }

  async open(address: string): Promise<this> {
    await this.page.goto(address);
    return this;
  }

  choose(password: string): Promise<DeskPage> {
    return choosePassword(this.page, password, 'Set the password and sign in');
  }
}
