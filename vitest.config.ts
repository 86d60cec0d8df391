import { defineConfig } from 'vitest/config';

/** Workspace packages are read from their TypeScript source, so that a test never sees a stale build. */
const conditions = ['source', 'module', 'node', 'development|production'];
const source = {
  resolve: { conditions },
  ssr: { resolve: { conditions } },
};
const server = { deps: { inline: [/@groundward\//] } };

/** Tests that start processes, databases or browsers, and long series of random buildings: they take seconds, not milliseconds. */
const slow = [
  'test/{ground,service,browser,fuzz}/**/*.test.ts',
  'test/independent/{random,semi-rigid}.test.ts',
  'api/src/**/*.test.ts',
];

export default defineConfig({
  ...source,
  test: {
    projects: [
      {
        ...source,
        test: {
          name: 'quick',
          server,
          environment: 'node',
          include: ['engine/{src,command}/**/*.test.ts', 'web/**/*.test.{ts,tsx}', 'test/**/*.test.ts'],
          exclude: ['**/node_modules/**', '**/dist/**', '**/.next/**', ...slow],
          // Seconds on a machine of their own; a shared one may take its time.
          testTimeout: 180_000,
        },
      },
      {
        ...source,
        test: {
          name: 'slow',
          server,
          environment: 'node',
          include: slow,
          exclude: ['**/node_modules/**', '**/dist/**'],
          testTimeout: 240_000,
          hookTimeout: 240_000,
        },
      },
    ],
  },
});
