import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = { '@': fileURLToPath(new URL('./src', import.meta.url)) }

/**
 * Four projects. `unit` needs nothing; `client` needs a DOM; `api` and `e2e` need PostgreSQL at
 * TEST_DATABASE_URL, which `npm test` starts, and `e2e` a built product and Chromium.
 */
export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          include: ['tests/unit/**/*.test.ts'],
          environment: 'node',
          // A bound against hanging, not a measure: a shared machine may be very slow.
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'client',
          include: ['tests/client/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['tests/support/client-setup.ts'],
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/database-template.ts'],
          hookTimeout: 60_000,
          testTimeout: 30_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/product.ts'],
          fileParallelism: false,
          hookTimeout: 120_000,
          testTimeout: 240_000,
        },
      },
    ],
  },
})
