import type { Locator, Page } from '@playwright/test';

/** The set-up of the selected stage, with the devices tried in its place. */
export class SetUpPanel {
  readonly panel: Locator;
  readonly topology: Locator;
  readonly wantedGain: Locator;
  readonly feedbackResistor: Locator;
  readonly needs: Locator;
  readonly devices: Locator;

  constructor(private readonly page: Page) {
    this.panel = page.getByRole('region', { name: /^Set-up of / });
    this.topology = this.panel.getByLabel('Topology');
    this.wantedGain = this.panel.getByLabel('Wanted gain');
    this.feedbackResistor = this.panel.getByLabel('Feedback resistor Rf');
    this.needs = this.panel.getByRole('region', { name: 'What passes here' });
    this.devices = this.panel.getByRole('region', { name: 'Devices tried in this place' });
  }

  field(label: string): Locator {
    return this.panel.getByLabel(label, { exact: true });
  }

  action(name: string): Locator {
    return this.panel.getByRole('button', { name, exact: true });
  }

  /** The message under a field. */
  message(text: string | RegExp): Locator {
    return this.panel.getByRole('alert').filter({ hasText: text });
  }

  device(partNumber: string): Locator {
    return this.devices
      .getByRole('row')
      .filter({ has: this.page.getByRole('button', { name: partNumber, exact: true }) });
  }

  deviceName(partNumber: string): Locator {
    return this.devices.getByRole('button', { name: partNumber, exact: true });
  }
}
