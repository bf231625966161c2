import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const backendUrl = process.env['BACKEND_URL'] ?? 'http://127.0.0.1:4180';

export default defineConfig({
  plugins: [react()],
  server: { proxy: { '/api': backendUrl } },
  build: { target: 'es2022', chunkSizeWarningLimit: 1000 },
  test: {
    environment: 'jsdom',
    setupFiles: ['src/testing/setup.ts'],
    include: ['src/**/*.spec.{ts,tsx}'],
    css: { modules: { classNameStrategy: 'non-scoped' } },
    restoreMocks: true,
  },
});
