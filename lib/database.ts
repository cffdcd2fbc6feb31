/** The one database of this process: opened once, migrated, and closed when the process is asked to end. */
import { join } from 'node:path';
import { type Database, type Db, openDatabase } from '@/db/client';
import { env } from '@/lib/env';
import { log } from '@/lib/log';

const MIGRATIONS = join(/*turbopackIgnore: true*/ process.cwd(), 'db/migrations');

/** Kept on the process: Next bundles a module more than once, and each copy has to find the same database. */
const KEPT = Symbol.for('waypost.database');

interface Kept {
  opening?: Promise<Database> | undefined;
  open?: Database | undefined;
}

const process_ = globalThis as typeof globalThis & { [KEPT]?: Kept };
const kept: Kept = (process_[KEPT] ??= {});

/** Opens and migrates the database of the settings, or gives the one that is open. A failure is tried anew by the next call. */
export function openedDatabase(): Promise<Database> {
  kept.opening ??= openMigrated().then(
    (database) => (kept.open = database),
    (error: unknown) => {
      kept.opening = undefined;
      throw error;
    },
  );
  return kept.opening;
}

/** The database that is open; throws when none is. The server opens it before it answers its first request. */
export function openDb(): Db {
  if (kept.open === undefined) throw new Error('The database is not open: await openedDatabase() first.');
  return kept.open.db;
}

/** Makes this the database of the process, as tests do with one of theirs; undefined takes it away again. */
export function adoptDatabase(database: Database | undefined): void {
  kept.open = database;
  kept.opening = database && Promise.resolve(database);
}

/** Closes the database if it is open or about to be. */
export async function closeDatabase(): Promise<void> {
  const { opening } = kept;
  adoptDatabase(undefined);
  await (await opening?.catch(() => undefined))?.close();
}

/** The folder of the embedded database. */
export function databaseFolder(): string {
  return join(env.dataFolder, 'database');
}

async function openMigrated(): Promise<Database> {
  if (env.isBuilding)
    throw new Error('A page asks for the database while it is built: it must be drawn at each request.');
  if (env.databaseUrl !== undefined && !/^postgres(ql)?:\/\//.test(env.databaseUrl)) {
    // Not repeated: it may hold a password.
    throw new Error('DATABASE_URL is not the address of a PostgreSQL server: it begins with postgresql://');
  }
  const database = await openDatabase({
    url: env.databaseUrl,
    folder: databaseFolder(),
    onError: (error) => log.warn({ err: error }, 'a connection to the database broke'),
  });
  try {
    await database.migrate(MIGRATIONS);
    return database;
  } catch (error) {
    await database.close();
    throw error;
  }
}
