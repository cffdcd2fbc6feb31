/** The terminal command: `npm run waypost -- read "<FEN>"`. What computes needs no server and no database. */
import { fileURLToPath } from 'node:url';
import { env } from '@/lib/env';
import { COMPARE_HELP, runCompare, runExchanges } from './compare';
import { GAME_HELP, runGame } from './game';
import { READ_HELP, runRead } from './read';
import { ROUTES_HELP, runRoutes } from './routes';
import { EXIT, type ExitCode, ownTerminal, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';

const HELP = `waypost: where the pieces belong

Commands
  read "<FEN>"      read a position
  routes "<FEN>"    where men belong and how they get there; a route checked
  compare "<FEN>"…  two to four positions, or a man here and there
  exchanges "<FEN>" every trade, and what it changes
  game FILE.pgn     what changed for good, move by move
  migrate           make the database, or bring it up to date
  seed              the demo workspace, once
  dump FILE         everything that is kept into one file
  restore FILE      such a file into an empty database

"<command> --help" says more.

`;

/** Runs one command and gives its exit code. A command that is not understood is answered on standard error. */
export async function runWaypost(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const [command, ...rest] = args;
  try {
    switch (command) {
      case 'read':
        return await runRead(rest, terminal);
      case 'compare':
        return await runCompare(rest, terminal);
      case 'exchanges':
        return await runExchanges(rest, terminal);
      case 'game':
        return await runGame(rest, terminal);
      case 'routes':
        return await runRoutes(rest, terminal);
      // Loaded only when asked for: the others start faster without a database.
      case 'migrate':
        return await (await import('./migrate')).runMigrate(rest, terminal);
      case 'seed':
        return await (await import('./seed')).runSeed(rest, terminal);
      case 'dump':
        return await (await import('./dump')).runDump(rest, terminal);
      case 'restore':
        return await (await import('./dump')).runRestore(rest, terminal);
      case '--help':
      case '-h':
      case 'help':
        await written(terminal.output, [HELP, READ_HELP, ROUTES_HELP, COMPARE_HELP, GAME_HELP].join('\n'));
        return EXIT.good;
      case undefined:
        throw new UsageError('A command is missing.');
      default:
        throw new UsageError(`There is no command "${command}".`);
    }
  } catch (error) {
    if (!(error instanceof UsageError)) throw error;
    await written(terminal.errors, `${error.message}\nTry: npm run waypost -- --help\n`);
    return EXIT.usage;
  }
}

/** Whoever reads our output may stop early (`| head`): that is no fault of anybody's. */
function endQuietlyWhenUnread(): void {
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit(EXIT.good);
  });
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  endQuietlyWhenUnread();
  process.exitCode = await runWaypost(process.argv.slice(2), ownTerminal(env.noColor));
}
