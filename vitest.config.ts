import { defineConfig } from 'vitest/config';

const source = { conditions: ['source'] };

export default defineConfig({
  test: {
    projects: [
      {
        test: { name: 'workshop', include: ['packages/workshop/**/*.test.ts'], testTimeout: 120_000 },
      },
      {
        resolve: source,
        ssr: { resolve: source },
        test: { name: 'engine', include: ['packages/engine/src/**/*.test.ts'] },
      },
      {
        // Nest reads parameter types at run time, so the transform must emit decorator metadata.
        oxc: { decorator: { legacy: true, emitDecoratorMetadata: true } },
        resolve: source,
        ssr: { resolve: source },
        test: {
          name: 'api',
          include: ['api/src/**/*.test.ts', 'api/test/**/*.test.ts'],
          testTimeout: 30_000,
          hookTimeout: 120_000,
        },
      },
      {
        resolve: source,
        test: { name: 'web', include: ['web/src/**/*.test.{ts,tsx}'], environment: 'happy-dom' },
      },
      {
        test: {
          name: 'browser',
          include: ['web/e2e/**/*.test.ts'],
          testTimeout: 120_000,
          hookTimeout: 180_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
