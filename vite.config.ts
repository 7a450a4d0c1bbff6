import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const setupFiles = ['tests/support/console-fails.ts'];
const globalSetup = ['tests/support/mariadb.ts'];
const MINUTE = 60_000;

export default defineConfig({
  plugins: [react(), tailwindcss()],
  build: {
    outDir: 'dist/client',
    emptyOutDir: true,
    // The only page is ours and it is served with its own headers; nothing is inlined into it.
    assetsInlineLimit: 0,
    reportCompressedSize: false,
  },
  test: {
    // Of two cores it would use one; the tests often wait for a database or a browser.
    maxWorkers: 2,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: ['tests/unit/**/*.test.{ts,tsx}'],
          setupFiles,
          testTimeout: MINUTE / 2,
        },
      },
      {
        extends: true,
        test: {
          name: 'published',
          include: ['tests/published/**/*.test.ts'],
          setupFiles,
          testTimeout: MINUTE,
        },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          setupFiles,
          globalSetup,
          testTimeout: MINUTE / 2,
          hookTimeout: MINUTE,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          setupFiles,
          globalSetup: [...globalSetup, 'tests/support/served-app.ts'],
          testTimeout: 2 * MINUTE,
          hookTimeout: 2 * MINUTE,
          // A scan may meet a page between two frames on a busy machine; a fault of ours fails twice.
          retry: 1,
        },
      },
    ],
  },
});
