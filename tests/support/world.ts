/**
 * A fresh world for a test: a migrated database with nothing in it, and people and workspaces made on demand.
 *
 * The migrations run once; every world starts from a picture of the result, kept on disk under the migrations' hash.
 */
import { createHash, randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import { type Database, openDatabase } from '@/db/client';
import { insertUser, type UserRow } from '@/db/queries/users';
import { insertWorkspace, putMembership, type WorkspaceRow } from '@/db/queries/workspaces';
import type { Role } from '@/db/schema';
import { adoptDatabase } from '@/lib/database';

/** Where the migrations are. */
export const MIGRATIONS = join(process.cwd(), 'db/migrations');

/** A world: its database, and ways to people it. */
export interface World extends Database {
  /** A person with a verified address at waypost.test. */
  readonly person: (name: string) => Promise<UserRow>;
  /** A workspace with these people in these roles. */
  readonly workspace: (name: string, members?: Readonly<Partial<Record<Role, UserRow>>>) => Promise<WorkspaceRow>;
}

/** A world in memory. It is made the database of the process too, so that handlers called with a Request find it. */
export async function freshWorld(): Promise<World> {
  const database = await emptyDatabase();
  adoptDatabase(database);
  return worldOf(database, async () => {
    adoptDatabase(undefined);
    await database.close();
  });
}

/** A migrated database in memory without a row, in about half a second. */
export async function emptyDatabase(): Promise<Database> {
  return openDatabase({ image: await migratedImage() });
}

/** People and workspaces for any database. */
export function worldOf(database: Database, close: () => Promise<void> = database.close): World {
  const { db } = database;
  return {
    ...database,
    close,
    person: async (name) => {
      const email = `${name.toLowerCase().replaceAll(' ', '.')}.${randomUUID().slice(0, 8)}@waypost.test`;
      const user = await insertUser(db, { email, emailKey: email, name, emailVerified: new Date() });
      return present(user);
    },
    workspace: async (name, members = {}) => {
      const workspace = present(await insertWorkspace(db, { name, slug: randomUUID() }));
      for (const [role, user] of Object.entries(members)) await putMembership(db, workspace.id, user.id, role as Role);
      return workspace;
    },
  };
}

/** The picture of a migrated, empty database; made when there is none of these migrations yet. */
async function migratedImage(): Promise<Blob> {
  const folder = join(tmpdir(), `waypost-tests-${process.getuid?.() ?? 0}`);
  const path = join(folder, `${migrationsHash()}.tar`);
  try {
    return new Blob([readFileSync(path)]);
  } catch {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
  }
  const client = await PGlite.create();
  await migrate(drizzle(client), { migrationsFolder: MIGRATIONS });
  const image = await client.dumpDataDir('none');
  await client.close();
  // Written aside and then moved: test files run beside each other.
  const aside = `${path}.${process.pid}.${randomUUID()}`;
  writeFileSync(aside, Buffer.from(await image.arrayBuffer()));
  renameSync(aside, path);
  for (const name of readdirSync(folder)) {
    if (name.endsWith('.tar') && join(folder, name) !== path) rmSync(join(folder, name), { force: true });
  }
  return image;
}

/** Of the migrations and of PGlite itself: another version may not read the picture. */
function migrationsHash(): string {
  const hash = createHash('sha256').update(
    readFileSync(join(process.cwd(), 'node_modules/@electric-sql/pglite/package.json')),
  );
  for (const name of readdirSync(MIGRATIONS).sort()) {
    if (name.endsWith('.sql')) hash.update(name).update(readFileSync(join(MIGRATIONS, name)));
  }
  return hash.digest('hex').slice(0, 16);
}

function present<T>(row: T | undefined): T {
  if (row === undefined) throw new Error('the world could not be made');
  return row;
}
