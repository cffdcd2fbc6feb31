/** The schema: what the migrations make is what the code believes, on both databases. */
import { execFile } from 'node:child_process';
import { cpSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { promisify } from 'node:util';
import { getTableColumns, is, sql } from 'drizzle-orm';
import { getTableConfig, PgTable } from 'drizzle-orm/pg-core';
import { describe, expect, it } from 'vitest';
import type { Db } from '@/db/client';
import { insertUser, userByEmailKey } from '@/db/queries/users';
import * as schema from '@/db/schema';
import { describeOnBoth } from '@/tests/support/databases';
import { MIGRATIONS } from '@/tests/support/world';

const TABLES = (Object.values(schema) as unknown[]).filter((value): value is PgTable => is(value, PgTable));

/** Rows of a query about the catalogue, as both drivers give them. */
async function rowsOf(db: Db, query: ReturnType<typeof sql>): Promise<Record<string, unknown>[]> {
  const given = (await db.execute(query)) as unknown as { readonly rows: Record<string, unknown>[] };
  return given.rows;
}

describeOnBoth('migrations', ({ fresh }) => {
  it('make every table and column of the schema, and no others', async () => {
    const { db } = await fresh();
    const found = await rowsOf(
      db,
      sql`select table_name || '.' || column_name || ' ' || is_nullable as name from information_schema.columns where table_schema = 'public'`,
    );
    const believed = TABLES.flatMap((table) =>
      Object.values(getTableColumns(table)).map(
        (column) => `${getTableConfig(table).name}.${column.name} ${column.notNull ? 'NO' : 'YES'}`,
      ),
    );
    expect(found.map(({ name }) => name).sort()).toEqual(believed.sort());
    expect(TABLES.length).toBe(23);
  });

  it('can be applied again, and by several at once', async () => {
    const database = await fresh();
    await Promise.all([1, 2, 3].map(() => database.migrate(MIGRATIONS)));
    const [row] = await rowsOf(database.db, sql`select count(*)::int as count from drizzle.__drizzle_migrations`);
    expect(row?.count).toBe(readdirSync(MIGRATIONS).filter((name) => name.endsWith('.sql')).length);
  });

  it('index every foreign key, or lead a primary key with it', async () => {
    // A deletion in one table asks every table that points at it; without an index that reads the whole table.
    const { db } = await fresh();
    const bare = await rowsOf(
      db,
      sql`select c.conrelid::regclass || '.' || a.attname as name from pg_constraint c
          join pg_attribute a on a.attrelid = c.conrelid and a.attnum = c.conkey[1]
          where c.contype = 'f' and c.confdeltype = 'c'
          and not exists (select 1 from pg_index i where i.indrelid = c.conrelid and i.indkey[0] = c.conkey[1])`,
    );
    expect(bare.map(({ name }) => name)).toEqual([]);
  });

  it('keep a moment to the millisecond, and text of any script', async () => {
    const { db } = await fresh();
    const createdAt = new Date('2026-03-29T01:59:59.987Z');
    await insertUser(db, { email: 'Ω@waypost.test', emailKey: 'ω@waypost.test', name: 'Żółw 馬', createdAt });
    expect(await userByEmailKey(db, 'ω@waypost.test')).toMatchObject({ name: 'Żółw 馬', createdAt });
  });

  it('refuse a second person at one address, and a person without one', async () => {
    const { db } = await fresh();
    const ada = { email: 'ada@waypost.test', emailKey: 'ada@waypost.test' };
    expect(await insertUser(db, ada)).toBeDefined();
    expect(await insertUser(db, { ...ada, email: 'ADA@waypost.test' })).toBeUndefined();
    await expect(insertUser(db, { name: 'Nobody' })).rejects.toMatchObject({
      cause: { constraint: 'users_has_address' },
    });
    expect(await insertUser(db, { deletedAt: new Date() })).toBeDefined();
  });
});

describe('the schema', () => {
  it('has no change that is not yet a migration', { timeout: 60_000 }, async () => {
    const folder = mkdtempSync(join(tmpdir(), 'waypost-migrations-'));
    try {
      cpSync(MIGRATIONS, folder, { recursive: true });
      // Its paths are taken from the project's folder, whether or not they begin with a slash.
      const out = relative(process.cwd(), folder);
      const args = ['generate', '--dialect', 'postgresql', '--schema', 'db/schema/index.ts', '--out', out];
      const { stdout } = await promisify(execFile)(process.execPath, ['node_modules/drizzle-kit/bin.cjs', ...args]);
      expect(stdout).toContain('No schema changes');
      expect(readdirSync(folder).sort()).toEqual(readdirSync(MIGRATIONS).sort());
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  });
});
