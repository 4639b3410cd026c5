import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;
const quiet = { globals: false, restoreMocks: true };

export default defineConfig({
  test: {
    root,
    reporters: [`${root}/support/closing-line.ts`],
    projects: [
      {
        test: {
          ...quiet,
          name: 'core',
          root,
          environment: 'node',
          include: [
            'core/**/*.test.ts',
            'cases/**/*.test.ts',
            'properties/**/*.test.ts',
            'mutants/**/*.test.ts',
            'architecture.test.ts',
          ],
          testTimeout: 30_000,
        },
      },
      {
        plugins: [react()],
        test: { ...quiet, name: 'web', root, environment: 'jsdom', css: false, include: ['web/**/*.test.{ts,tsx}'] },
      },
      {
        test: {
          ...quiet,
          name: 'server',
          root,
          environment: 'node',
          include: ['db/**/*.test.ts', 'api/**/*.test.ts'],
          globalSetup: `${root}/support/template-database.ts`,
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        test: {
          ...quiet,
          name: 'journey',
          root,
          environment: 'node',
          include: ['journey/**/*.test.ts'],
          globalSetup: `${root}/support/running-product.ts`,
          testTimeout: 240_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
