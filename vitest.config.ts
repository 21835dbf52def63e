import { defineConfig } from 'vitest/config'

const shared = { resolve: { tsconfigPaths: true } }
const node = { environment: 'node' as const, testTimeout: 20_000 }

export default defineConfig({
  ...shared,
  test: {
    projects: [
      {
        ...shared,
        test: {
          ...node,
          name: 'unit',
          include: ['{shared,payments,server,components,hooks,seed,db}/**/*.test.ts'],
        },
      },
      { ...shared, test: { ...node, name: 'reference', include: ['tests/reference/**/*.test.ts'] } },
      {
        ...shared,
        test: {
          ...node,
          name: 'integration',
          include: ['tests/{integration,contract}/**/*.test.ts'],
          globalSetup: ['tests/support/database-server.ts'],
          hookTimeout: 60_000,
          testTimeout: 30_000,
          maxWorkers: 2,
        },
      },
      // The measured bars (scripts/run-proof.mjs): not part of a plain vitest run, each is started by its name.
      {
        ...shared,
        test: {
          ...node,
          name: 'checks',
          include: ['tests/checks/**/*.check.ts'],
          globalSetup: ['tests/support/database-server.ts'],
          hookTimeout: 120_000,
          testTimeout: 900_000,
          fileParallelism: false,
        },
      },
      {
        ...shared,
        test: {
          ...node,
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/whole-product.ts'],
          hookTimeout: 120_000,
          testTimeout: 120_000,
          // One product for all of them: each journey brings its own people, or takes its own from the demo.
          maxWorkers: 2,
        },
      },
    ],
  },
})
