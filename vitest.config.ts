import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** Room by room: what needs a database, a page or neither runs under its own project (`--project NAME`). */
export default defineConfig({
  test: {
    reporters: ['default'],
    projects: [
      {
        test: {
          name: 'shared',
          environment: 'node',
          include: ['tests/shared/**/*.test.ts', 'tests/golden/**/*.test.ts'],
        },
      },
      {
        test: {
          name: 'server',
          environment: 'node',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/support/postgres-setup.ts'],
          // Each file has a database of its own; the modules may be shared, which halves the time.
          isolate: false,
          testTimeout: 20_000,
          hookTimeout: 60_000,
        },
      },
      {
        plugins: [react()],
        test: {
          name: 'client',
          environment: 'jsdom',
          include: ['tests/src/**/*.test.{ts,tsx}'],
          setupFiles: ['tests/support/client-setup.ts'],
          testTimeout: 15_000,
        },
      },
      {
        test: {
          name: 'e2e',
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/postgres-setup.ts'],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 180_000,
        },
      },
      {
        test: {
          name: 'architecture',
          environment: 'node',
          include: ['tests/architecture/**/*.test.ts'],
          testTimeout: 30_000,
        },
      },
    ],
  },
});
