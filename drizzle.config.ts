import { defineConfig } from 'drizzle-kit';

// Only `npm run db:generate` reads this: it compares db/schema with the last migration and needs no database.
export default defineConfig({ dialect: 'postgresql', schema: './db/schema/*.ts', out: './db/migrations' });
