/** Commands on the database of the settings: opened, migrated, used and closed; what stands in the way is said in a sentence. */
import type { Db } from '@/db/client';
import { FolderHeld } from '@/db/folder-lock';
import { BackupRefused } from '@/lib/backup';
import { closeDatabase, databaseFolder, openDb, openedDatabase } from '@/lib/database';
import { env } from '@/lib/env';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';

/** Why a command on the database goes no further, in a sentence for the terminal. */
export class CommandStopped extends Error {}

/** What else there is to do when another process has the database. */
interface Otherwise {
  /** Gives what was done, or undefined when there was no way. */
  readonly whenHeld?: () => Promise<string | undefined>;
}

/** Opens the database, runs the work on it and closes it again. The work says what it did. */
export async function withDatabase(
  terminal: Terminal,
  work: (db: Db) => Promise<string>,
  { whenHeld }: Otherwise = {},
): Promise<ExitCode> {
  try {
    await written(terminal.output, `${await worked(work, whenHeld)}\n`);
    return EXIT.good;
  } catch (error) {
    if (!(error instanceof CommandStopped || error instanceof BackupRefused)) throw error;
    await written(terminal.errors, `${error.message}\n`);
    return EXIT.fault;
  } finally {
    await closeDatabase();
  }
}

async function worked(work: (db: Db) => Promise<string>, whenHeld: Otherwise['whenHeld']): Promise<string> {
  try {
    await openedDatabase();
  } catch (error) {
    const done = error instanceof FolderHeld ? await whenHeld?.() : undefined;
    if (done !== undefined) return done;
    throw new CommandStopped(`The database could not be opened. ${reasonOf(error)}`);
  }
  return work(openDb());
}

/** Where the database is, in words that hold no password. */
export function whereItIs(): string {
  return env.databaseUrl === undefined ? databaseFolder() : 'the PostgreSQL server of DATABASE_URL';
}

/** A connection tried at several addresses fails with one error for each, and no words of its own. */
function reasonOf(error: unknown): string {
  if (error instanceof AggregateError) return error.errors.map(reasonOf).join('; ');
  return error instanceof Error ? error.message : String(error);
}
