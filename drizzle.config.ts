import { defineConfig } from 'drizzle-kit';

export default defineConfig({ dialect: 'sqlite', schema: './api/database/schema/*.ts', out: './api/database/migrations' });
