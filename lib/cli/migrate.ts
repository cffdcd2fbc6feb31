/** `waypost migrate`: the database made and brought up to date. */
import { commandArguments } from './arguments';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { whereItIs, withDatabase } from './with-database';

const HELP = `waypost migrate

Makes the database if there is none, and applies the migrations that it does
not have yet. \`npm run up\` and the server do the same at their start.

Where it is: a PostgreSQL server when DATABASE_URL is set, else embedded in
the folder WAYPOST_DATA (.waypost in the home folder).
`;

/** Runs the command on its arguments, without the word "migrate". */
export async function runMigrate(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, { help: { type: 'boolean', short: 'h' } });
  if (values.help) {
    await written(terminal.output, HELP);
    return EXIT.good;
  }
  if (positionals.length > 0) throw new UsageError('"migrate" takes no words after it.');
  return withDatabase(terminal, async () => `The database is up to date: ${whereItIs()}`);
}
