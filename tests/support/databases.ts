/** Both databases, for tests that have to hold on each. */
import { afterAll, beforeAll, describe } from 'vitest';
import { type Database, openDatabase } from '@/db/client';
import { type Postgres, startPostgres } from './postgres';
import { emptyDatabase, MIGRATIONS } from './world';

/** What a test of both databases is given. */
export interface Databases {
  /** A migrated database without a row, closed after the tests. */
  readonly fresh: () => Promise<Database>;
}

/** Describes the same promises twice: once over PGlite in memory, once over a PostgreSQL server. */
export function describeOnBoth(name: string, promises: (databases: Databases) => void): void {
  describe(`${name}, on PGlite`, () => {
    promises({ fresh: closedAfter(emptyDatabase) });
  });
  describe(`${name}, on PostgreSQL`, () => {
    let postgres: Postgres | undefined;
    beforeAll(async () => {
      postgres = await startPostgres();
    }, 60_000);
    // Registered before the closing of databases, and so run after it: vitest runs what was registered last first.
    afterAll(() => postgres?.stop(), 60_000);
    const fresh = closedAfter(async () => {
      if (postgres === undefined) throw new Error('the server has not been started');
      const database = await openDatabase({ url: await postgres.newDatabase() });
      await database.migrate(MIGRATIONS);
      return database;
    });
    promises({ fresh });
  });
}

function closedAfter(open: () => Promise<Database>): () => Promise<Database> {
  const opened: Database[] = [];
  afterAll(async () => {
    for (const database of opened) await database.close();
  });
  return async () => {
    const database = await open();
    opened.push(database);
    return database;
  };
}
