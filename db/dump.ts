/**
 * A whole database as lines of text, and back: from either database to either.
 *
 * A first line says what follows; then for each table a line with its columns and a line a row, as the database itself
 * writes it in JSON; a last line counts the rows. Rows are never parsed here, so no number loses a digit on the way.
 */
import { getTableColumns, is, type SQL, sql } from 'drizzle-orm';
import { getTableConfig, PgTable } from 'drizzle-orm/pg-core';
import type { Db } from './client';
import * as schema from './schema';

const FORMAT = 'waypost dump 1';
const ROWS_AT_ONCE = 200;

/** Why a dump cannot be restored, in a sentence. */
export class RestoreRefused extends Error {
  constructor(sentence: string) {
    super(sentence);
    this.name = 'RestoreRefused';
  }
}

/** Writes everything as it is at one moment, line after line without line ends. Gives the number of rows. */
export function dumpDatabase(db: Db, at: Date, write: (line: string) => Promise<void>): Promise<number> {
  return db.transaction(
    async (tx) => {
      let rows = 0;
      await write(JSON.stringify({ format: FORMAT, at: at.toISOString() }));
      for (const table of tablesInOrder()) {
        const { name, columns } = shapeOf(table);
        await write(JSON.stringify({ table: name, columns }));
        await tx.execute(sql`declare dumped no scroll cursor for select to_jsonb(t)::text as line from ${table} t`);
        for (;;) {
          const lines = await textsOf(tx, sql.raw(`fetch ${ROWS_AT_ONCE} from dumped`));
          for (const line of lines) await write(`[${line}]`);
          rows += lines.length;
          if (lines.length < ROWS_AT_ONCE) break;
        }
        await tx.execute(sql`close dumped`);
      }
      await write(JSON.stringify({ end: true, rows }));
      return rows;
    },
    { isolationLevel: 'repeatable read', accessMode: 'read only' },
  );
}

/** Reads what dumpDatabase wrote into a migrated, empty database: all of it or nothing. Gives the number of rows. */
export async function restoreDatabase(db: Db, lines: AsyncIterable<string>): Promise<number> {
  return db.transaction(async (tx) => {
    await refuseFilled(tx);
    const reading = new Restoring(tx);
    for await (const line of lines) await reading.take(line);
    return reading.finish();
  });
}

/** A restore on its way: the rows of a table are gathered and written many at once. */
class Restoring {
  readonly #db: Db;
  readonly #tables = new Map(tablesInOrder().map((table) => [shapeOf(table).name, shapeOf(table).columns]));
  #begun = false;
  #ended = false;
  #into: { readonly table: string; readonly columns: readonly string[] } | undefined;
  #waiting: string[] = [];
  #rows = 0;

  constructor(db: Db) {
    this.#db = db;
  }

  async take(line: string): Promise<void> {
    if (this.#ended) throw new RestoreRefused('The dump goes on after its end.');
    if (line.startsWith('[')) {
      this.#waiting.push(line.slice(1, -1));
      if (this.#waiting.length >= ROWS_AT_ONCE) await this.#write();
      return;
    }
    await this.#write();
    await this.#takeHead(headOf(line));
  }

  finish(): number {
    if (!this.#ended) throw new RestoreRefused('The dump ends in the middle.');
    return this.#rows;
  }

  async #takeHead(head: Readonly<Record<string, unknown>>): Promise<void> {
    if (!this.#begun) {
      if (head.format !== FORMAT) throw new RestoreRefused('This is not a dump that this version of Waypost can read.');
      this.#begun = true;
    } else if (typeof head.table === 'string' && Array.isArray(head.columns)) {
      this.#into = this.#known(head.table, head.columns.map(String));
    } else if (head.end === true) {
      if (head.rows !== this.#rows) {
        throw new RestoreRefused(`The dump says that it has ${String(head.rows)} rows, and has ${this.#rows}.`);
      }
      this.#ended = true;
    } else {
      throw new RestoreRefused('The dump has a line that is not understood.');
    }
  }

  /** The table and columns, if we have them: a dump of a later version may have others, and none of its rows may be lost. */
  #known(table: string, columns: readonly string[]) {
    const ours = this.#tables.get(table);
    const strange = columns.find((column) => !ours?.includes(column));
    if (ours === undefined || strange !== undefined) {
      const what = ours === undefined ? `the table ${table}` : `the column ${table}.${strange}`;
      throw new RestoreRefused(`The dump has ${what}, which this version of Waypost does not know.`);
    }
    return { table, columns };
  }

  async #write(): Promise<void> {
    if (this.#waiting.length === 0) return;
    if (this.#into === undefined) throw new RestoreRefused('The dump has a row before the first table.');
    const table = sql.identifier(this.#into.table);
    // Columns that the dump does not have yet get what a new row gets.
    const columns = sql.join(
      this.#into.columns.map((column) => sql.identifier(column)),
      sql`, `,
    );
    const rows = `[${this.#waiting.join(',')}]`;
    const insert = sql`insert into ${table} (${columns}) select ${columns} from jsonb_populate_recordset(null::${table}, ${rows}::jsonb)`;
    await this.#db.execute(insert).catch((error: Error) => {
      // The error's own message repeats the rows.
      throw new RestoreRefused(
        `Rows of ${this.#into?.table} were refused: ${String((error.cause as Error | undefined)?.message)}.`,
      );
    });
    this.#rows += this.#waiting.length;
    this.#waiting = [];
  }
}

function headOf(line: string): Readonly<Record<string, unknown>> {
  try {
    return JSON.parse(line) as Readonly<Record<string, unknown>>;
  } catch {
    throw new RestoreRefused('The dump has a line that is not understood.');
  }
}

async function refuseFilled(db: Db): Promise<void> {
  for (const table of tablesInOrder()) {
    const rows = await textsOf(db, sql`select 'row' as line from ${table} limit 1`);
    if (rows.length > 0) {
      throw new RestoreRefused(
        `The database is not empty: the table ${shapeOf(table).name} has rows. Nothing was changed.`,
      );
    }
  }
}

/** The column `line` of a query's rows, which both drivers give in the same place. */
async function textsOf(db: Db, query: SQL): Promise<string[]> {
  const { rows } = (await db.execute(query)) as unknown as { readonly rows: readonly { readonly line: string }[] };
  return rows.map(({ line }) => line);
}

/** Every table, each after those it points at, else by name: loaders of modules differ in the order of what a module exports. */
function tablesInOrder(): PgTable[] {
  const ordered = new Set<PgTable>();
  const add = (table: PgTable): void => {
    if (ordered.has(table)) return;
    for (const { reference } of getTableConfig(table).foreignKeys) {
      const { foreignTable } = reference();
      if (foreignTable !== table) add(foreignTable);
    }
    ordered.add(table);
  };
  const tables = (Object.values(schema) as unknown[]).filter((value): value is PgTable => is(value, PgTable));
  for (const table of tables.sort((a, b) => (shapeOf(a).name < shapeOf(b).name ? -1 : 1))) add(table);
  return [...ordered];
}

function shapeOf(table: PgTable): { readonly name: string; readonly columns: readonly string[] } {
  return {
    name: getTableConfig(table).name,
    columns: Object.values(getTableColumns(table)).map((column) => column.name),
  };
}
