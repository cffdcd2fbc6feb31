/** A PostgreSQL server of the system's packages, in a folder of its own, reached by a Unix socket: no port, no password, no trace. */
import { type ChildProcess, execFileSync, spawn, type SpawnOptions } from 'node:child_process';
import { chmodSync, chownSync, mkdirSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { findPostgres, POSTGRES_MISSING } from '@/lib/cli/house/postgres.mjs';

const START_TIMEOUT_MS = 20_000;

/** A server that runs. */
export interface Postgres {
  /** A new, empty database of this server, as a URL. */
  readonly newDatabase: () => Promise<string>;
  /** Kills the server without a chance to tidy up, and starts it again on the same folder. */
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
      process.kill(Number(readFileSync(join(data, 'postmaster.pid'), 'utf8').split('\n')[0]), 'SIGKILL');
      server.stdin?.end();
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

/** The server ends when its standard input does, so it never outlives the tests, however those end; without tidying what is thrown away. */
const WHILE_INPUT_LASTS = `
  "$0" "$@" </dev/null &
  server=$!
  exec 3<&0
  (cat <&3 >/dev/null; kill -QUIT "$server" 2>/dev/null) &
  wait "$server"`;

interface Start {
  readonly data: string;
  readonly folder: string;
  readonly owner: Owner;
}

/** Starts it and waits until it answers. After a crash the first tries may find processes of the old one on their way out. */
async function startServer(program: string, start: Start): Promise<ChildProcess> {
  const deadline = Date.now() + START_TIMEOUT_MS;
  for (;;) {
    let said = '';
    const server = spawnServer(program, start, (words) => {
      said = `${said}${words}`.slice(-2_000);
    });
    while (server.exitCode === null && Date.now() < deadline) {
      if (await answers(start.folder)) return server;
      await new Promise((resolve) => setTimeout(resolve, 50));
    }
    server.stdin?.end();
    if (Date.now() >= deadline) throw new Error(`PostgreSQL did not start:\n${said}`);
  }
}

function spawnServer(program: string, { data, folder, owner }: Start, said: (words: string) => void): ChildProcess {
  const settings = ['listen_addresses=', `unix_socket_directories=${folder}`, 'fsync=on', 'max_connections=60'];
  const args = ['-D', data, ...settings.flatMap((setting) => ['-c', setting])];
  const options = { ...owner, cwd: folder, stdio: ['pipe', 'ignore', 'pipe'] } satisfies SpawnOptions;
  const server = spawn('/bin/sh', ['-c', WHILE_INPUT_LASTS, program, ...args], options);
  server.stderr?.on('data', (part) => said(String(part)));
  return server;
}

function answers(folder: string): Promise<boolean> {
  return run(folder, 'select 1').then(
    () => true,
    () => false,
  );
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
