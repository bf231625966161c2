import type { Locator, Page } from '@playwright/test';
import { SaveBar } from './save-bar';
import type { SeededChain } from '../testdata/receiver';
import { SetUpPanel } from './set-up-panel';
import { WorkingDrawer } from './working-drawer';

export class LedgerPage {
  readonly heading: Locator;
  readonly table: Locator;
  readonly verdict: Locator;
  readonly rows: Locator;
  readonly chainRow: Locator;
  readonly cards: Locator;
  readonly draft: SaveBar;
  readonly options: Locator;

  constructor(readonly page: Page) {
    this.heading = page.getByRole('heading', { level: 1 });
    this.table = page.getByRole('table', { name: 'Ledger' });
    this.verdict = page.getByRole('region', { name: /^Verdict: / });
    this.rows = this.table.getByRole('row', { name: /^S\d+ / });
    this.chainRow = this.table.getByRole('row').filter({ has: page.getByRole('rowheader', { name: /^Chain/ }) });
    this.cards = page.getByRole('list', { name: 'Ledger' }).getByRole('listitem');
    this.draft = new SaveBar(page);
    this.options = page.getByRole('navigation', { name: 'Options' });
  }

  async open({ projectId, chainId }: SeededChain, section = ''): Promise<this> {
    await this.page.goto(`/projects/${projectId}/chains/${chainId}${section}`);
    return this;
  }

  row(label: string): Locator {
    return this.table.getByRole('row', { name: new RegExp(`^${label} `) });
  }

  /** A figure's button: its name says what it is, its text is the figure. */
  figure(stage: string, title: string): Locator {
    return this.row(stage).getByRole('button', { name: new RegExp(`^${stage} ${title} `) });
  }

  /** One of the six figures over the ledger, with its requirement. */
  headline(label: string | RegExp): Locator {
    return this.page.getByRole('button', { name: label }).first();
  }

  chainCost(): Locator {
    return this.table.getByRole('button', { name: /^Cost of the chain/ });
  }

  async select(label: string): Promise<SetUpPanel> {
    await this.row(label).getByRole('rowheader').click();
    return new SetUpPanel(this.page);
  }

  async openWorking(stage: string, title: string): Promise<WorkingDrawer> {
    await this.figure(stage, title).click();
    return new WorkingDrawer(this.page);
  }

  /** The remedies that the sentence offers, as buttons. */
  remedy(name: string | RegExp): Locator {
    return this.verdict.getByRole('button', { name });
  }

  async section(name: 'Ledger' | 'Response'): Promise<void> {
    await this.page.getByRole('navigation', { name: 'Sections' }).getByRole('link', { name }).click();
  }

  async gbwCase(name: 'typical' | 'minimum' | 'minimum, hot'): Promise<void> {
    await this.page.getByText(name, { exact: true }).click();
  }
}
