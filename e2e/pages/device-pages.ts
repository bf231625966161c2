import type { Locator, Page } from '@playwright/test';

export class DevicesPage {
  readonly heading: Locator;
  readonly table: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Devices', level: 1 });
    this.table = page.getByRole('table', { name: 'Devices' });
  }

  async open(): Promise<this> {
    await this.page.goto('/devices');
    return this;
  }

  async openDevice(partNumber: string): Promise<DevicePage> {
    await this.table.getByRole('link', { name: partNumber, exact: true }).click();
    return new DevicePage(this.page);
  }
}

export interface DatasheetEntry {
  readonly [label: string]: string;
}

export class DeviceFormPage {
  readonly heading: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { name: 'Enter a device' });
  }

  field(name: string): Locator {
    return this.page.getByRole('textbox', { name, exact: true });
  }

  row(label: string | RegExp): Locator {
    return this.page.getByRole('group', { name: label });
  }

  async fill(entries: DatasheetEntry): Promise<void> {
    for (const [label, text] of Object.entries(entries)) await this.field(label).fill(text);
  }

  async save(): Promise<DevicePage> {
    await this.page.getByRole('button', { name: 'Save the device' }).click();
    return new DevicePage(this.page);
  }
}

export class DevicePage {
  readonly heading: Locator;
  readonly quote: Locator;
  readonly edit: Locator;
  readonly uses: Locator;

  constructor(private readonly page: Page) {
    this.heading = page.getByRole('heading', { level: 1 });
    this.quote = page.getByRole('region', { name: 'Quote' });
    this.edit = page.getByRole('link', { name: 'Edit', exact: true });
    this.uses = page.getByRole('region', { name: /used/i });
  }

  async openQuote(): Promise<void> {
    await this.quote.getByRole('button', { name: /^(Enter a|Edit the) quote$/ }).click();
  }

  price(line: number): Locator {
    return this.page.getByLabel(`Line ${line}, price of one`);
  }

  async fillBreak(line: number, pieces: string, price: string): Promise<void> {
    await this.page.getByLabel(`Line ${line}, from pieces`).fill(pieces);
    await this.price(line).fill(price);
  }

  /** Which line of the quote's form stands for this quantity. */
  async lineOf(pieces: string): Promise<number> {
    const fields = this.page.getByLabel(/^Line \d+, from pieces$/);
    for (let line = 1; line <= (await fields.count()); line += 1) {
      if ((await fields.nth(line - 1).inputValue()) === pieces) return line;
    }
    throw new Error(`no line for ${pieces} pieces`);
  }

  async saveQuote(): Promise<void> {
    await this.page.getByRole('button', { name: 'Save the quote' }).click();
  }
}
