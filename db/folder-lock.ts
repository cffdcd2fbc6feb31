/**
 * One process at a time on the embedded folder: two would lose rows without a word.
 *
 * The lock is a listening Unix socket beside the folder: the kernel closes it when its process dies, however it dies.
 * Sockets are numbered. Whoever finds the highest one dead binds the next number; a name that is taken cannot be bound
 * twice, and a number is only removed when a higher one stands, so of several that start at once exactly one succeeds.
 */
import { linkSync, readdirSync, rmSync } from 'node:fs';
import { connect, createServer, type Socket } from 'node:net';
import { basename, dirname, join } from 'node:path';

/** How long the holder has to say its name: it may be busy opening the database. */
const NAME_TIMEOUT_MS = 3_000;

/** The longest request of another process, in characters: a word and a path. */
const REQUEST_LENGTH_MAX = 8_192;

/** The longest address of a Unix socket that all systems take, less what we add to the folder's name. */
const FOLDER_BYTES_MAX = 80;

/** What the holder answers a request of another process, which has no place on the folder itself. One line each way. */
export type AnswerRequest = (request: string) => Promise<string>;

/** A lock that is held. */
export interface FolderLock {
  /** From now on requests are answered. Before, and where this is never called, the answer is empty. */
  readonly answerWith: (answer: AnswerRequest) => void;
  readonly release: () => Promise<void>;
}

/** The folder belongs to another process. */
export class FolderHeld extends Error {
  /** The holder's process id; undefined when it did not say. */
  readonly pid: number | undefined;

  constructor(folder: string, pid: number | undefined) {
    super(
      `The data folder ${folder} is in use by ${pid === undefined ? 'another process' : `process ${pid}`}. ` +
        'One copy of Waypost can run on a folder: end that one, or choose another folder with WAYPOST_DATA.',
    );
    this.name = 'FolderHeld';
    this.pid = pid;
  }
}

/** Takes the lock of a folder whose parent exists. Throws FolderHeld when another process has it. */
export async function lockFolder(folder: string): Promise<FolderLock> {
  if (Buffer.byteLength(folder) > FOLDER_BYTES_MAX) {
    throw new Error(`The path of the data folder may have ${FOLDER_BYTES_MAX} bytes at most: ${folder}`);
  }
  const own = `${folder}.lock-${process.pid}-new`;
  rmSync(own, { force: true });
  let answer: AnswerRequest = async () => '';
  const callers = new Set<Socket>();
  const server = createServer({ allowHalfOpen: true }, (socket) => {
    callers.add(socket);
    socket.once('close', () => callers.delete(socket));
    serve(socket, (request) => answer(request));
  });
  await new Promise<void>((resolve, reject) => server.once('error', reject).listen(own, resolve));
  server.unref();
  const release = () =>
    new Promise<void>((resolve) => {
      server.close(() => resolve());
      for (const caller of callers) caller.destroy();
    });
  try {
    while (!(await takeNumber(folder, own))) {
      // Another process took the number between our look and our try: look again.
    }
  } catch (error) {
    await release();
    throw error;
  } finally {
    rmSync(own, { force: true });
  }
  return {
    answerWith: (given) => {
      answer = given;
    },
    release,
  };
}

/** Asks the process that holds a folder for something; undefined when nobody holds it, or it does not answer such requests. */
export async function askFolder(folder: string, request: string): Promise<string | undefined> {
  const number = numbersAt(folder).at(-1);
  if (number === undefined) return undefined;
  return new Promise((resolve) => {
    let said = '';
    const socket = connect(socketPath(folder, number), () => socket.write(`${request}\n`));
    socket.setEncoding('utf8');
    socket.on('data', (part: string) => {
      said += part;
    });
    socket.on('error', () => resolve(undefined));
    socket.on('end', () => {
      socket.end();
      // The first line is the holder's name.
      resolve(said.split('\n')[1] || undefined);
    });
  });
}

/** Says who holds the folder, and answers the one line that may come. */
function serve(socket: Socket, answer: AnswerRequest): void {
  let heard = '';
  socket.setEncoding('utf8');
  // Whoever asked may be gone before the answer.
  socket.on('error', () => undefined);
  socket.on('end', () => socket.end());
  socket.on('data', (part: string) => {
    if (heard.includes('\n')) return;
    heard = (heard + part).slice(0, REQUEST_LENGTH_MAX);
    const end = heard.indexOf('\n');
    if (end < 0) return;
    answer(heard.slice(0, end)).then(
      (line) => socket.end(`${line}\n`),
      () => socket.end(),
    );
  });
  socket.write(`${process.pid}\n`);
}

/** One try. False when another one was quicker; throws when the folder is held. */
async function takeNumber(folder: string, own: string): Promise<boolean> {
  const highest = numbersAt(folder).at(-1) ?? 0;
  if (highest > 0) {
    const holder = await askHolder(socketPath(folder, highest));
    if (holder !== 'dead') throw new FolderHeld(folder, holder.pid);
  }
  const number = highest + 1;
  if (!linked(own, socketPath(folder, number))) return false;
  const numbers = numbersAt(folder);
  // Ours was free only because its time is over: somebody holds a higher one.
  if (numbers.at(-1) !== number) {
    rmSync(socketPath(folder, number), { force: true });
    return false;
  }
  for (const old of numbers.slice(0, -1)) rmSync(socketPath(folder, old), { force: true });
  return true;
}

function socketPath(folder: string, number: number): string {
  return `${folder}.lock-${number}`;
}

/** The numbers that stand beside the folder, ascending. */
function numbersAt(folder: string): number[] {
  const start = `${basename(folder)}.lock-`;
  return readdirSync(dirname(join(folder)))
    .filter((name) => name.startsWith(start))
    .map((name) => name.slice(start.length))
    .filter((rest) => /^\d+$/.test(rest))
    .map(Number)
    .sort((a, b) => a - b);
}

/** Whether the name was free and is now ours. */
function linked(from: string, to: string): boolean {
  try {
    linkSync(from, to);
    return true;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'EEXIST') return false;
    throw error;
  }
}

/** Who answers at a socket. Nobody listening means that its process is gone. */
function askHolder(path: string): Promise<'dead' | { readonly pid: number | undefined }> {
  return new Promise((resolve) => {
    let said = '';
    const socket = connect(path);
    const named = () => {
      socket.destroy();
      const pid = /^\d+/.exec(said)?.[0];
      resolve({ pid: pid === undefined ? undefined : Number(pid) });
    };
    socket.setTimeout(NAME_TIMEOUT_MS, named);
    socket.setEncoding('utf8');
    socket.on('data', (part: string) => {
      said += part;
      if (said.includes('\n')) named();
    });
    socket.on('end', named);
    socket.on('error', (error: NodeJS.ErrnoException) => {
      if (error.code === 'ECONNREFUSED' || error.code === 'ENOENT') resolve('dead');
      else named();
    });
  });
}
