/** `waypost seed`: the demo workspace, written once into a database that nobody has used. */
import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { DEMO_PEOPLE } from '@/db/seed';
import { env } from '@/lib/env';
import { commandArguments } from './arguments';
import { seedDemo } from './seed-demo';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { withDatabase } from './with-database';

const HELP = `waypost seed

Writes a demo workspace into a database in which nobody has an account yet:
a club with invented people, one in each role, and four studies. Otherwise
it changes nothing. \`npm run up\` does the same.

The people share one password, made by chance and kept in the data folder in
the file demo-sign-in.txt, which only you can read.
`;

/** Runs the command on its arguments, without the word "seed". */
export async function runSeed(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, { help: { type: 'boolean', short: 'h' } });
  if (values.help) {
    await written(terminal.output, HELP);
    return EXIT.good;
  }
  if (positionals.length > 0) throw new UsageError('"seed" takes no words after it.');
  return withDatabase(terminal, async (db) => {
    const password = randomBytes(9).toString('base64url');
    if (await seedDemo(db, password)) keepSignIn(password);
    return keptSignIn();
  });
}

function signInFile(): string {
  return join(env.dataFolder, 'demo-sign-in.txt');
}

function keepSignIn(password: string): void {
  const lines = DEMO_PEOPLE.map(({ email, role }) => `${role.padEnd(8)} ${email}`);
  mkdirSync(env.dataFolder, { recursive: true, mode: 0o700 });
  writeFileSync(signInFile(), `${[...lines, `password ${password}`].join('\n')}\n`, { mode: 0o600 });
}

/** How to sign in to the demo workspace; empty where nobody ever wrote it here. */
function keptSignIn(): string {
  try {
    return readFileSync(signInFile(), 'utf8').trimEnd();
  } catch {
    return '';
  }
}
