import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
// `server-only` throws on import outside a React server build; the tests are the server here.
const alias = { '@': root.replace(/\/$/, ''), 'server-only': `${root}tests/server-only.ts` };

/** One project a kind of test, so that each can be run alone: `npx vitest run --project unit`. */
export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: { name: 'unit', include: ['tests/unit/**/*.test.ts'], testTimeout: 120_000 },
      },
      {
        resolve: { alias },
        test: { name: 'published', include: ['tests/published/**/*.test.ts'] },
      },
      {
        resolve: { alias },
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/api/database.setup.ts'],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/browser/server.setup.ts'],
          fileParallelism: false,
          testTimeout: 180_000,
          hookTimeout: 240_000,
        },
      },
    ],
  },
});
