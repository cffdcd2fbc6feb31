/** What drizzle-kit needs to write the migrations of db/migrations out of db/schema: `npx drizzle-kit generate --name <what>`. */
import { defineConfig } from 'drizzle-kit';

export default defineConfig({ dialect: 'postgresql', schema: './db/schema/index.ts', out: './db/migrations' });
