/** `waypost dump` and `waypost restore`: everything that is kept to one file, and back. */
import { resolve } from 'node:path';
import { askFolder } from '@/db/folder-lock';
import { type DumpAnswer, dumpRequest, dumpToFile, restoreFromFile } from '@/lib/backup';
import { databaseFolder } from '@/lib/database';
import { commandArguments } from './arguments';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { CommandStopped, whereItIs, withDatabase } from './with-database';

const HELP = `waypost dump FILE
waypost restore FILE

dump writes everything that is kept into one file (lines of JSON, gzipped),
as it is at one moment. The file holds addresses and hashed passwords: it is
readable for you only. An existing file is not overwritten. A server that runs
on the embedded database writes the file itself, and other requests wait till
it is done.

restore reads such a file into an empty database: all of it or nothing. From
the embedded database to a PostgreSQL server and back is the same command:
  npm run waypost -- dump kept.gz
  DATABASE_URL=postgresql://... npm run waypost -- restore kept.gz
`;

/** Runs `dump` on its arguments, without the word itself. */
export async function runDump(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const file = await fileOf('dump', args, terminal);
  if (file === undefined) return EXIT.good;
  const done = (rows: number) => `${rows} rows of ${whereItIs()} are in ${file}`;
  return withDatabase(terminal, async (db) => done(await dumpToFile(db, file)), {
    whenHeld: async () => {
      const answer = await askFolder(databaseFolder(), dumpRequest(resolve(file)));
      if (answer === undefined) return undefined;
      const given = JSON.parse(answer) as DumpAnswer;
      if ('error' in given) throw new CommandStopped(given.error);
      return done(given.rows);
    },
  });
}

/** Runs `restore` on its arguments, without the word itself. */
export async function runRestore(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const file = await fileOf('restore', args, terminal);
  if (file === undefined) return EXIT.good;
  return withDatabase(
    terminal,
    async (db) => `${await restoreFromFile(db, file)} rows of ${file} are in ${whereItIs()}`,
  );
}

/** The one file that a command takes; undefined when help was asked for, and given. */
async function fileOf(command: string, args: readonly string[], terminal: Terminal): Promise<string | undefined> {
  const { positionals, values } = commandArguments(args, { help: { type: 'boolean', short: 'h' } });
  if (values.help) {
    await written(terminal.output, HELP);
    return undefined;
  }
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0) throw new UsageError(`"${command}" takes one file.`);
  return file;
}
