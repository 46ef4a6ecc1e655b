import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

/** Tests that only compute: no database, no server, no browser. A component test asks for jsdom in its first line. */
function pure(name: string) {
  return {
    extends: true as const,
    test: { name, include: [`tests/${name}/**/*.test.{ts,tsx}`], environment: 'node' as const },
  };
}

export default defineConfig({
  resolve: { alias: { '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, '') } },
  test: {
    // Nothing a test does may depend on the machine's zone or language.
    env: { TZ: 'UTC', LANG: 'C.UTF-8' },
    testTimeout: 20_000,
    maxWorkers: 2,
    projects: [
      pure('unit'),
      pure('property'),
      pure('published'),
      {
        extends: true,
        test: {
          name: 'integration',
          globalSetup: 'tests/support/integration-setup.ts',
          include: ['tests/integration/**/*.test.ts'],
          environment: 'node',
          // Real servers and clusters start and stop in here.
          testTimeout: 120_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
