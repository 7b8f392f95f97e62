import vue from '@vitejs/plugin-vue';
import { defineConfig } from 'vitest/config';

/** Three projects: pure rules, components in a light DOM, and the server against a real MariaDB. */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: ['tests/unit/**/*.test.ts', 'tests/reference/**/*.test.ts'],
          environment: 'node',
        },
      },
      {
        plugins: [vue()],
        test: { name: 'components', include: ['tests/components/**/*.test.ts'], environment: 'happy-dom' },
      },
      {
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/database-setup.ts'],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
