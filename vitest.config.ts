import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))
const alias = { '@': folder('src'), '@shared': folder('shared') }

/** `unit` needs nothing but Node; `integration` gets a PostgreSQL database of its own per worker. */
export default defineConfig({
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          include: ['tests/{shared,src,scripts}/**/*.test.{ts,tsx}'],
          environment: 'node',
          setupFiles: ['tests/setup/strict.ts'],
          // Properties try hundreds of surveys, and a busy machine takes its time.
          testTimeout: 60_000,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'integration',
          include: ['tests/server/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/setup/database-template.ts'],
          setupFiles: ['tests/setup/integration.ts'],
          testTimeout: 20_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
        },
      },
    ],
  },
})
