/** The database: PostgreSQL embedded in a folder, embedded in memory, or a server. One type for all three. */
import { existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import { drizzle as drizzlePg } from 'drizzle-orm/node-postgres';
import { migrate as migratePg } from 'drizzle-orm/node-postgres/migrator';
import { drizzle as drizzlePglite } from 'drizzle-orm/pglite';
import { migrate as migratePglite } from 'drizzle-orm/pglite/migrator';
import { Pool } from 'pg';
import { type FolderLock, lockFolder } from './folder-lock';
import * as schema from './schema';

/** A connection or a transaction. Inside a transaction pass the transaction on, never the outer one: that would wait for itself. */
export type Db = PgDatabase<PgQueryResultHKT, typeof schema>;

/** An open database. */
export interface Database {
  readonly db: Db;
  /** Applies the migrations of a folder that are not yet applied. Several processes may do so at once. */
  readonly migrate: (folder: string) => Promise<void>;
  /** Answers other processes that ask for the folder; only where there is one. */
  readonly answerWith?: FolderLock['answerWith'];
  /** Ends all connections; what is under way is finished first. */
  readonly close: () => Promise<void>;
}

/** Where the database is. A URL goes before a folder; with neither it is in memory, from `image` if there is one. */
export interface Place {
  readonly url?: string | undefined;
  readonly folder?: string | undefined;
  /** What PGlite's `dumpDataDir` gave. */
  readonly image?: Blob | undefined;
  /** Told of connections that broke while idle. */
  readonly onError?: (error: Error) => void;
}

/** One number for all of us: who migrates holds this lock of the server. */
const MIGRATION_LOCK = 760_915_021;

/** Opens the database at a place. Throws FolderHeld when another process has the folder. */
export async function openDatabase({ url, folder, image, onError }: Place): Promise<Database> {
  if (url !== undefined) return openServer(url, onError);
  if (folder !== undefined) return openFolder(folder);
  return embedded(await PGlite.create(image === undefined ? {} : { loadDataDir: image }));
}

function openServer(connectionString: string, onError: (error: Error) => void = () => undefined): Database {
  const pool = new Pool({ connectionString, max: 10 });
  // Without a listener a connection that breaks while idle would end the process.
  pool.on('error', onError);
  return {
    db: drizzlePg(pool, { schema }),
    migrate: async (migrationsFolder) => {
      const connection = await pool.connect();
      try {
        await connection.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
        await migratePg(drizzlePg(connection), { migrationsFolder });
        await connection.query('select pg_advisory_unlock($1)', [MIGRATION_LOCK]);
      } finally {
        connection.release();
      }
    },
    close: () => pool.end(),
  };
}

async function openFolder(folder: string): Promise<Database> {
  mkdirSync(dirname(folder), { recursive: true, mode: 0o700 });
  const lock = await lockFolder(folder);
  try {
    await createFolder(folder);
    const database = embedded(await PGlite.create(folder), () => lock.release());
    return { ...database, answerWith: lock.answerWith };
  } catch (error) {
    await lock.release();
    throw error;
  }
}

/** Makes the folder whole or not at all: one that was left half made is not taken for a database. */
async function createFolder(folder: string): Promise<void> {
  if (existsSync(join(folder, 'PG_VERSION'))) return;
  const unfinished = `${folder}.unfinished`;
  rmSync(unfinished, { recursive: true, force: true });
  await (await PGlite.create(unfinished)).close();
  renameSync(unfinished, folder);
}

function embedded(client: PGlite, closed: () => Promise<void> = async () => undefined): Database {
  const db = drizzlePglite(client, { schema });
  return {
    db,
    migrate: (migrationsFolder) => migratePglite(db, { migrationsFolder }),
    close: async () => {
      await client.close();
      await closed();
    },
  };
}
