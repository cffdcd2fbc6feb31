/** `npm run up`: from a fresh clone to a page that one can open. Needs Node and npm only. */
import { execFile, spawn } from 'node:child_process';
import { createServer } from 'node:net';
import { needsBuild } from './house/build-age.mjs';
import { install, requireNode } from './house/install.mjs';
import { ENVIRONMENT, PROGRAM, ROOT, runProgram } from './house/run.mjs';

const START_TIMEOUT_MS = 60_000;

/**
 * Ends with a sentence for the person at the terminal.
 *
 * @param {string} sentence
 * @returns {never}
 */
function stop(sentence) {
  console.error(sentence);
  process.exit(1);
}

/** The port to serve on: PORT, or 3000. */
function wantedPort() {
  const port = Number(process.env.PORT || 3000);
  return Number.isInteger(port) && port > 0 && port < 65_536 ? port : stop(`PORT is not a port: ${process.env.PORT}`);
}

/**
 * Whether nobody listens on the port yet.
 *
 * @param {number} port
 * @returns {Promise<boolean>}
 */
function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen(port, () => probe.close(() => resolve(true)));
  });
}

/**
 * Starts the built application and hands on the signals that end it.
 *
 * @param {number} port
 */
function serve(port) {
  const server = spawn(process.execPath, [PROGRAM.next, 'start', '-p', String(port)], {
    cwd: ROOT,
    stdio: ['ignore', 'inherit', 'inherit'],
    // Our own handler of signals closes the database (lib/start.ts).
    env: { ...ENVIRONMENT, NODE_ENV: 'production', NEXT_MANUAL_SIG_HANDLE: 'true' },
  });
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => server.kill(signal));
  }
  server.once('exit', (code) => process.exit(code ?? 0));
}

/**
 * Makes the database and the demo workspace, in a process of its own: the first time takes memory that the server need
 * not keep. Ends with the reason when there is one.
 *
 * @returns {Promise<string>} how to sign in to the demo workspace; empty when there is none
 */
function prepare() {
  const args = ['--import', 'tsx', 'lib/cli/waypost.ts', 'seed'];
  return new Promise((resolve) => {
    execFile(process.execPath, args, { cwd: ROOT, env: ENVIRONMENT }, (error, output, errors) => {
      if (error) stop(errors.trim() || error.message);
      resolve(output.trim());
    });
  });
}

/**
 * Waits until the application says that it lives.
 *
 * @param {string} url
 */
async function untilLive(url) {
  const deadline = Date.now() + START_TIMEOUT_MS;
  while (Date.now() < deadline) {
    const answer = await fetch(`${url}/api/health`).catch(() => undefined);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 150));
  }
  stop(`Nothing answered at ${url} within ${START_TIMEOUT_MS / 1000} seconds.`);
}

requireNode();
const port = wantedPort();
const url = `http://localhost:${port}`;
if (!(await isFree(port))) stop(`Port ${port} is taken. Choose another: PORT=${port + 1} npm run up`);
if (!(await install())) stop('The packages could not be installed; what npm said stands above.');
if (needsBuild(ROOT) && !(await runProgram('next', ['build'], { NODE_ENV: 'production' }))) {
  stop('The build failed; the reason stands above.');
}
const signIn = await prepare();
serve(port);
await untilLive(url);
console.log(`
Waypost is ready. Open ${url}

  a reading as JSON    ${url}/api/v1/readings?fen=8/8/8/3k4/8/3K4/3P4/8%20w%20-%20-%200%201
  the API document     ${url}/api/v1/openapi.json

${signIn === '' ? 'No sign-in is needed to read positions.' : `To see the demo workspace, sign in at ${url}/sign-in as\n\n${signIn.replace(/^/gm, '  ')}`}

End with Ctrl+C.
`);
