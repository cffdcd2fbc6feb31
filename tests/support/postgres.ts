/** A PostgreSQL server of the system's packages, in a folder of its own, reached by a Unix socket: no port, no password, no trace. */
import { type ChildProcess, execFileSync, spawn } from 'node:child_process';
import { chmodSync, chownSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { findPostgres, POSTGRES_MISSING } from '@/lib/cli/house/postgres.mjs';

const START_TIMEOUT_MS = 20_000;

/** A server that runs. */
export interface Postgres {
  /** A new, empty database of this server, as a URL. */
  readonly newDatabase: () => Promise<string>;
  /** Ends all of its processes at once, as a power cut would, and starts the server again on the same folder. */
  readonly crash: () => Promise<void>;
  readonly stop: () => Promise<void>;
}

/** Starts a server. Throws, saying what to install, when there is none: a test of both databases never tests one only. */
export async function startPostgres(): Promise<Postgres> {
  const programs = findPostgres(process.env);
  if (programs === undefined) throw new Error(POSTGRES_MISSING);
  const folder = mkdtempSync(join(tmpdir(), 'waypost-pg-'));
  const owner = serverOwner();
  chownSync(folder, owner.uid, owner.gid);
  chmodSync(folder, 0o700);
  const data = join(folder, 'data');
  mkdirSync(data);
  chownSync(data, owner.uid, owner.gid);
  execFileSync(
    join(programs, 'initdb'),
    ['-D', data, '-U', 'waypost', '-A', 'trust', '-E', 'UTF8', '--no-locale', '--no-sync'],
    {
      ...owner,
      cwd: folder,
      stdio: ['ignore', 'ignore', 'pipe'],
    },
  );
  const start = () => startServer(join(programs, 'postgres'), { data, folder, owner });
  let server = await start();
  let count = 0;
  return {
    newDatabase: async () => {
      count += 1;
      await run(folder, `create database world${count}`);
      return urlOf(folder, `world${count}`);
    },
    crash: async () => {
      const ended = exitOf(server);
      process.kill(-(server.pid ?? 0), 'SIGKILL');
      await ended;
      server = await start();
    },
    stop: async () => {
      const ended = exitOf(server);
      server.stdin?.end();
      await ended;
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

interface Owner {
  readonly uid: number;
  readonly gid: number;
}

/** PostgreSQL does not run as root; Debian's package brings a user for it. */
function serverOwner(): Owner {
  const own = { uid: process.getuid?.() ?? 0, gid: process.getgid?.() ?? 0 };
  if (own.uid !== 0) return own;
  const ask = (flag: string) => Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }));
  return { uid: ask('-u'), gid: ask('-g') };
}

/** The server ends when its standard input does, so it never outlives the tests, however those end. */
const WHILE_INPUT_LASTS = '"$0" "$@" </dev/null & server=$!; cat >/dev/null; kill -INT "$server"; wait "$server"';

async function startServer(
  program: string,
  { data, folder, owner }: { data: string; folder: string; owner: Owner },
): Promise<ChildProcess> {
  const settings = ['listen_addresses=', `unix_socket_directories=${folder}`, 'fsync=on', 'max_connections=60'];
  const args = ['-D', data, ...settings.flatMap((setting) => ['-c', setting])];
  const server = spawn('/bin/sh', ['-c', WHILE_INPUT_LASTS, program, ...args], {
    ...owner,
    cwd: folder,
    // A group of its own, so that a crash takes all of the server's processes and nothing else.
    detached: true,
    stdio: ['pipe', 'ignore', 'pipe'],
  });
  let said = '';
  server.stderr?.on('data', (part) => {
    said = `${said}${part}`.slice(-2_000);
  });
  const deadline = Date.now() + START_TIMEOUT_MS;
  while (
    !(await run(folder, 'select 1').then(
      () => true,
      () => false,
    ))
  ) {
    if (server.exitCode !== null || Date.now() > deadline) throw new Error(`PostgreSQL did not start:\n${said}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  return server;
}

function exitOf(server: ChildProcess): Promise<void> {
  return new Promise((resolve) => server.once('exit', () => resolve()));
}

function urlOf(folder: string, database: string): string {
  return `postgresql://waypost@localhost/${database}?host=${encodeURIComponent(folder)}`;
}

async function run(folder: string, statement: string): Promise<void> {
  const client = new Client({ connectionString: urlOf(folder, 'postgres') });
  client.on('error', () => undefined);
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
