/** Everything that is kept, to a file and back; by a command, or by the server that has the database at the command's request. */
import { createReadStream, createWriteStream, existsSync, renameSync, rmSync } from 'node:fs';
import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { createGunzip, createGzip } from 'node:zlib';
import type { Db } from '@/db/client';
import { dumpDatabase, RestoreRefused, restoreDatabase } from '@/db/dump';
import { written } from '@/lib/cli/terminal';

/** Why a file was not written or read, in a sentence for whoever asked. */
export class BackupRefused extends Error {}

/** Writes a dump of everything, gzipped, readable for its owner only. Gives the rows. The file stands only when it is whole. */
export async function dumpToFile(db: Db, file: string): Promise<number> {
  if (existsSync(file)) throw new BackupRefused(`There is a file ${file} already; it was not touched.`);
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
    throw isFileFault(error) ? new BackupRefused(`${file} cannot be written: ${error.message}.`) : error;
  }
}

/** Reads a dump into an empty database, all of it or nothing. Gives the rows. */
export async function restoreFromFile(db: Db, file: string): Promise<number> {
  if (!existsSync(file)) throw new BackupRefused(`There is no file ${file}.`);
  const source = createReadStream(file);
  const unzip = createGunzip();
  source.on('error', (error) => unzip.destroy(error));
  try {
    return await restoreDatabase(db, linesOf(source.pipe(unzip)));
  } catch (error) {
    if (error instanceof RestoreRefused) throw new BackupRefused(error.message);
    if (error instanceof Error && 'code' in error) {
      throw new BackupRefused(`${file} cannot be read: ${error.message}. Nothing was changed.`);
    }
    throw error;
  } finally {
    source.destroy();
  }
}

/** The request for a dump that one process sends to the one that has the database. */
export function dumpRequest(file: string): string {
  return JSON.stringify({ dump: file });
}

/** What such a request is answered. */
export type DumpAnswer = { readonly rows: number } | { readonly error: string };

/** Answers the requests of other processes: a dump, and nothing else. */
export async function answerRequest(db: Db, request: string): Promise<string> {
  const { dump } = JSON.parse(request) as { readonly dump?: unknown };
  if (typeof dump !== 'string') return '';
  const answer: DumpAnswer = await dumpToFile(db, dump).then(
    (rows) => ({ rows }),
    (error: unknown) => {
      if (error instanceof BackupRefused) return { error: error.message };
      throw error;
    },
  );
  return JSON.stringify(answer);
}

function isFileFault(error: unknown): error is NodeJS.ErrnoException {
  return error instanceof Error && 'syscall' in error;
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
