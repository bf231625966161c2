import type { Locator, Page } from '@playwright/test';
import { SetUpPanel } from './set-up-panel';
import { WorkingDrawer } from './working-drawer';

export class LedgerPage {
  readonly heading: Locator;
  readonly table: Locator;
  readonly verdict: Locator;
  readonly rows: Locator;
  readonly chainRow: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { level: 1 });
    this.table = page.getByRole('table', { name: 'Ledger' });
    this.verdict = page.getByRole('region', { name: /^Verdict: / });
    this.rows = this.table.getByRole('row', { name: /^S\d+ / });
    this.chainRow = this.table.getByRole('row').filter({ has: page.getByRole('rowheader', { name: /^Chain/ }) });
  }

  async open(projectId: string, chainId: string, search = ''): Promise<this> {
    await this.page.goto(`/projects/${projectId}/chains/${chainId}${search}`);
    return this;
  }

  row(label: string): Locator {
    return this.table.getByRole('row', { name: new RegExp(`^${label} `) });
  }

  /** A figure's button: its name says what it is, its text is the figure. */
  figure(stage: string, title: string): Locator {
    return this.row(stage).getByRole('button', { name: new RegExp(`^${stage} ${title} `) });
  }

  async select(label: string): Promise<SetUpPanel> {
    await this.row(label).getByRole('rowheader').click();
    return new SetUpPanel(this.page);
  }

  async openWorking(stage: string, title: string): Promise<WorkingDrawer> {
    await this.figure(stage, title).click();
    return new WorkingDrawer(this.page);
  }
}
