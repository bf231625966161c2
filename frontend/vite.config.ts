import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const backendUrl = process.env['BACKEND_URL'] ?? 'http://127.0.0.1:4180';

export default defineConfig({
  plugins: [react()],
  server: { proxy: { '/api': backendUrl } },
  build: { target: 'es2022', chunkSizeWarningLimit: 1000 },
  test: {
    restoreMocks: true,
    css: { modules: { classNameStrategy: 'non-scoped' } },
    // Generous, because the machine that runs them may be busy with the rest of the checks.
    testTimeout: 60_000,
    projects: [
      // Pure helpers need no browser.
      { extends: true, test: { name: 'helpers', environment: 'node', include: ['src/**/*.spec.ts'] } },
      {
        extends: true,
        test: {
          name: 'screens',
          environment: 'jsdom',
          setupFiles: ['src/testing/setup.ts'],
          include: ['src/**/*.spec.tsx'],
        },
      },
    ],
  },
});
