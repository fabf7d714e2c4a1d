import { defineConfig } from 'drizzle-kit'

/** `npx drizzle-kit generate --name what-changes` writes the next migration from the tables. */
export default defineConfig({
  dialect: 'postgresql',
  schema: './server/database/tables/index.ts',
  out: './drizzle',
  casing: 'snake_case',
  strict: true,
})
