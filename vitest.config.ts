import { defineConfig } from 'vitest/config';

/**
 * Workspaces import each other's sources, so that tests need no build and never see an old one. The rest is
 * what Node itself would load: with Vite's usual "module" some packages lead to files that Node cannot.
 */
const conditions = ['source', 'node'];

/** Real services and one browser are shared by the files of these projects, so they run one after another. */
const withServices = {
  globalSetup: ['test/setup/services.ts'],
  setupFiles: ['test/setup/reflection.ts', 'test/setup/environment.ts'],
  fileParallelism: false,
  hookTimeout: 120_000,
};

export default defineConfig({
  resolve: { conditions },
  ssr: { resolve: { conditions, externalConditions: conditions } },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: [
            '{shared,server,client,db}/src/**/*.spec.{ts,tsx}',
            'db/launch/**/*.spec.ts',
            'storage-fake/src/**/*.spec.ts',
            'test/run/**/*.spec.ts',
            'test/lint/**/*.spec.ts',
          ],
          setupFiles: ['test/setup/reflection.ts'],
        },
      },
      {
        extends: true,
        test: {
          ...withServices,
          name: 'integration',
          include: ['test/integration/**/*.test.ts'],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          ...withServices,
          name: 'browser',
          include: ['test/browser/**/*.test.ts'],
          testTimeout: 300_000,
        },
      },
    ],
  },
});
