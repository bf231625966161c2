import type { Locator, Page } from '@playwright/test';

export class ProjectPage {
  readonly chains: Locator;

  constructor(readonly page: Page) {
    this.chains = page.getByRole('table', { name: 'Chains and their options' });
  }

  async open(projectId: string): Promise<this> {
    await this.page.goto(`/projects/${projectId}`);
    return this;
  }

  option(name: string): Locator {
    return this.chains.getByRole('row', { name: new RegExp(`^${name}`) });
  }
}
