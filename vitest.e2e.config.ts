import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

/**
 * The built application from outside: over HTTP (tests/e2e/api) and in a real browser (tests/e2e/browser).
 * scripts/test.mjs starts one server for all; alone, tests/e2e/setup.ts starts one from .output.
 */
export default defineConfig({
  resolve: {
    alias: {
      '#shared': fileURLToPath(new URL('./shared', import.meta.url)),
      '#server': fileURLToPath(new URL('./server', import.meta.url)),
    },
  },
  test: {
    name: 'e2e',
    environment: 'node',
    include: ['tests/e2e/**/*.spec.ts'],
    globalSetup: ['tests/e2e/setup.ts'],
    // One server and one database for all: files take turns, so that one may count rows.
    fileParallelism: false,
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
})
