import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

export default defineConfig({
  // One copy of graphql, the one that Node takes: its classes do not know those of another.
  resolve: { alias: [{ find: /^graphql$/, replacement: fileURLToPath(import.meta.resolve('graphql')) }] },
  test: {
    root: new URL('..', import.meta.url).pathname,
    include: ['tests/**/*.test.ts'],
    setupFiles: ['tests/seed.ts'],
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
})
