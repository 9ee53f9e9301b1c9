import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const here = import.meta.dirname;
const resolve = { alias: { '@': here, 'server-only': `${here}/tests/support/empty.ts` } };

/** Projects that need no database. */
const pure = (name: string, include: string) => ({
  resolve,
  test: { name, environment: 'node' as const, include: [include], testTimeout: 20_000 },
});

/**
 * Projects on a real PostgreSQL: one throwaway cluster for the run (tests/support/global-setup.ts) and one fresh
 * database for each file (tests/support/fresh-database.ts), set up before the file loads any module of ours.
 */
const database = (name: string) => ({
  resolve,
  test: {
    name,
    environment: 'node' as const,
    include: [`tests/${name}/**/*.test.ts`],
    globalSetup: ['tests/support/global-setup.ts'],
    setupFiles: ['tests/support/fresh-database.ts'],
    pool: 'forks' as const,
    isolate: true,
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
});

export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      pure('unit', 'tests/unit/**/*.test.ts'),
      pure('published', 'tests/published/**/*.test.ts'),
      pure('golden', 'tests/golden/**/*.test.ts'),
      {
        plugins: [react()],
        resolve,
        test: {
          name: 'component',
          environment: 'happy-dom',
          include: ['tests/unit/components/**/*.test.tsx'],
          testTimeout: 20_000,
        },
      },
      database('integration'),
      database('tenancy'),
    ],
  },
});
