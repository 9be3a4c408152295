import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'sqlite',
  schema: './api/src/database/schema/*.ts',
  out: './api/migrations',
});
