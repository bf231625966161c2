import type { Locator, Page } from '@playwright/test';

/** State of the draft, undo, redo and save. */
export class SaveBar {
  readonly state: Locator;
  readonly undo: Locator;
  readonly redo: Locator;
  readonly save: Locator;

  constructor(page: Page) {
    this.state = page.getByRole('status').filter({ hasText: /saved|unsaved changes|saving/ });
    this.undo = page.getByRole('button', { name: /^Undo/ });
    this.redo = page.getByRole('button', { name: /^Redo/ });
    this.save = page.getByRole('button', { name: 'Save', exact: true });
  }
}
