import { defineConfig, devices } from '@playwright/test';
import type { JourneyOptions } from './fixtures/test';

const desktop = {
  ...devices['Desktop Chrome'],
  viewport: { width: 1440, height: 900 },
  launchOptions: { executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium' },
};

/** One project a role; each journey finds a built server of its own worker and is signed in as that role. */
export default defineConfig<JourneyOptions>({
  testDir: './tests',
  outputDir: './test-results',
  fullyParallel: false,
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: [['list']],
  use: { trace: 'retain-on-failure', video: 'off', locale: 'en-GB', timezoneId: 'UTC', actionTimeout: 15_000 },
  projects: (['designer', 'buyer', 'lead', 'admin'] as const).map((role) => ({
    name: role,
    testDir: `./tests/as-${role}`,
    use: { ...desktop, role },
  })),
});
