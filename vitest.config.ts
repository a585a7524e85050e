import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const folder = (name: string): string => fileURLToPath(new URL(name, import.meta.url));

const alias = {
  '@shared': folder('./shared'),
  '@exports': folder('./exports'),
  '@drizzle': folder('./drizzle'),
  '@server': folder('./server'),
  '@seeds': folder('./seeds'),
};

/** Component specs of `src/` run under Angular's own builder (`ng test`), everything else here. */
export default defineConfig({
  resolve: { alias },
  test: {
    environment: 'node',
    pool: 'forks',
    maxWorkers: 2,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          include: [
            '{shared,exports,server,drizzle,seeds,scripts}/**/*.spec.ts',
            'tests/layers/*.spec.ts',
          ],
        },
      },
      {
        extends: true,
        test: { name: 'property', include: ['tests/property/**/*.spec.ts'], testTimeout: 60_000 },
      },
      {
        extends: true,
        test: { name: 'reference', include: ['tests/reference/**/*.spec.ts'], testTimeout: 60_000 },
      },
      {
        extends: true,
        test: {
          name: 'api',
          include: ['tests/api/**/*.spec.ts'],
          globalSetup: ['tests/database-setup.ts'],
          testTimeout: 90_000,
          hookTimeout: 90_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'browser',
          include: ['tests/e2e/**/*.spec.ts'],
          globalSetup: ['tests/database-setup.ts', 'tests/e2e/built-setup.ts'],
          testTimeout: 180_000,
          hookTimeout: 120_000,
          fileParallelism: false,
          maxWorkers: 1,
        },
      },
      {
        extends: true,
        test: {
          name: 'pictures',
          include: ['tests/e2e/*.pictures.ts'],
          globalSetup: ['tests/database-setup.ts', 'tests/e2e/built-setup.ts'],
          testTimeout: 180_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
