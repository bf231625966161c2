import type { Locator, Page } from '@playwright/test';

export class TopBar {
  readonly navigation: Locator;
  readonly person: Locator;

  constructor(private readonly page: Page) {
    this.navigation = page.getByRole('navigation', { name: 'Main' });
    this.person = page.getByRole('button', { name: /settings and sign out/ });
  }

  destination(name: string): Locator {
    return this.navigation.getByRole('link', { name });
  }

  async choose(appearance: 'Light' | 'Dark'): Promise<void> {
    await this.person.click();
    await this.page.getByRole('radio', { name: appearance }).check();
    await this.page.keyboard.press('Escape');
  }

  async signOut(): Promise<void> {
    await this.person.click();
    await this.page.getByRole('button', { name: 'Sign out', exact: true }).click();
  }
}
