import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'sqlite',
  schema: './src/features/*/*-tables.ts',
  out: './drizzle',
});
