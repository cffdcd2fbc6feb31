/** `waypost dump` and `waypost restore`: everything that is kept to one file, and back. */
import { createReadStream, createWriteStream, existsSync, renameSync, rmSync } from 'node:fs';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { createGunzip, createGzip } from 'node:zlib';
import type { Db } from '@/db/client';
import { dumpDatabase, RestoreRefused, restoreDatabase } from '@/db/dump';
import { commandArguments } from './arguments';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { CommandStopped, whereItIs, withDatabase } from './with-database';

const HELP = `waypost dump FILE
waypost restore FILE

dump writes everything that is kept into one file (lines of JSON, gzipped),
as it is at one moment. The file holds addresses and hashed passwords: it is
readable for you only. An existing file is not overwritten.

restore reads such a file into an empty database: all of it or nothing. From
the embedded database to a PostgreSQL server and back is the same command:
  npm run waypost -- dump kept.gz
  DATABASE_URL=postgresql://... npm run waypost -- restore kept.gz

The embedded database belongs to one process: end the server first.
`;

/** Runs `dump` on its arguments, without the word itself. */
export function runDump(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  return withFile('dump', args, terminal, async (db, file) => {
    if (existsSync(file)) throw new CommandStopped(`There is a file ${file} already; it was not touched.`);
    return `${await dumpToFile(db, file)} rows of ${whereItIs()} are in ${file}`;
  });
}

/** Runs `restore` on its arguments, without the word itself. */
export function runRestore(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  return withFile('restore', args, terminal, async (db, file) => {
    if (!existsSync(file)) throw new CommandStopped(`There is no file ${file}.`);
    return `${await restoreFromFile(db, file)} rows of ${file} are in ${whereItIs()}`;
  });
}

async function withFile(
  command: 'dump' | 'restore',
  args: readonly string[],
  terminal: Terminal,
  work: (db: Db, file: string) => Promise<string>,
): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, { help: { type: 'boolean', short: 'h' } });
  if (values.help) {
    await written(terminal.output, HELP);
    return EXIT.good;
  }
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0) throw new UsageError(`"${command}" takes one file.`);
  return withDatabase(terminal, (db) => work(db, file));
}

/** Writes beside the file and moves it there at the end, so that a dump that stands is whole. */
async function dumpToFile(db: Db, file: string): Promise<number> {
  const unfinished = `${file}.unfinished`;
  const zip = createGzip();
  const whole = pipeline(zip, createWriteStream(unfinished, { mode: 0o600 }));
  try {
    const rows = await dumpDatabase(db, new Date(), async (line) => {
      // Nobody takes the line any longer: then the file failed, and says why.
      if (!(await written(zip, `${line}\n`))) await whole;
    });
    zip.end();
    await whole;
    renameSync(unfinished, file);
    return rows;
  } catch (error) {
    zip.destroy();
    await whole.catch(() => undefined);
    rmSync(unfinished, { force: true });
    throw isFileFault(error) ? new CommandStopped(`${file} cannot be written: ${error.message}.`) : error;
  }
}

function isFileFault(error: unknown): error is NodeJS.ErrnoException {
  return error instanceof Error && 'syscall' in error;
}

async function restoreFromFile(db: Db, file: string): Promise<number> {
  const source = createReadStream(file);
  const unzip = createGunzip();
  source.on('error', (error) => unzip.destroy(error));
  try {
    return await restoreDatabase(db, linesOf(source.pipe(unzip)));
  } catch (error) {
    if (error instanceof RestoreRefused) throw new CommandStopped(error.message);
    if (error instanceof Error && 'code' in error) {
      throw new CommandStopped(`${file} cannot be read: ${error.message}. Nothing was changed.`);
    }
    throw error;
  } finally {
    source.destroy();
  }
}

/** Lines of a stream of bytes. Only \n ends one: JSON may hold the other line ends of Unicode as they are. */
async function* linesOf(input: Readable): AsyncGenerator<string> {
  const decoder = new TextDecoder();
  let rest = '';
  for await (const chunk of input) {
    const parts = (rest + decoder.decode(chunk as Uint8Array, { stream: true })).split('\n');
    rest = parts.pop() ?? '';
    yield* parts;
  }
  if (rest !== '') yield rest;
}
