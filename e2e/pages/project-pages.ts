import type { Locator, Page } from '@playwright/test';
import { LedgerPage } from './ledger-page';

export class ProjectsPage {
  readonly heading: Locator;
  readonly table: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Projects', level: 1 });
    this.table = page.getByRole('table', { name: 'Projects' });
  }

  async open(): Promise<this> {
    await this.page.goto('/projects');
    return this;
  }

  async openProject(name: string | RegExp): Promise<ProjectPage> {
    await this.table.getByRole('link', { name }).click();
    return new ProjectPage(this.page);
  }
}

export class NewProjectPage {
  constructor(private readonly page: Page) {}

  async create(code: string, name: string): Promise<ProjectPage> {
    await this.page.getByLabel('Code').fill(code);
    await this.page.getByLabel('Name').fill(name);
    await this.page.getByRole('button', { name: 'Create the project' }).click();
    return new ProjectPage(this.page);
  }
}

export class ProjectPage {
  readonly heading: Locator;
  readonly chains: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { level: 1 });
    this.chains = page.getByRole('table', { name: 'Chains and their options' });
  }

  async open(projectId: string): Promise<this> {
    await this.page.goto(`/projects/${projectId}`);
    return this;
  }

  option(name: string): Locator {
    return this.chains.getByRole('row').filter({ has: this.page.getByRole('link', { name, exact: true }) });
  }

  async newChain(): Promise<NewChainPage> {
    await this.page.getByRole('link', { name: 'New chain' }).click();
    return new NewChainPage(this.page);
  }
}

export class NewChainPage {
  constructor(private readonly page: Page) {}

  field(label: string | RegExp): Locator {
    return this.page.getByLabel(label);
  }

  async submit(): Promise<LedgerPage> {
    await this.page.getByRole('button', { name: 'Create the chain' }).click();
    return new LedgerPage(this.page);
  }
}
