/** Running other programs from `up` and `check`, which have nothing but Node itself before the packages are there. */
import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/** The folder of package.json, without a slash at its end. */
export const ROOT = fileURLToPath(new URL('../../..', import.meta.url)).replace(/[\\/]$/, '');

/** The environment of every program that we start. */
export const ENVIRONMENT = { ...process.env, NEXT_TELEMETRY_DISABLED: '1' };

/** A program of one of our packages, as the arguments that Node runs it by. */
export const PROGRAM = {
  biome: 'node_modules/@biomejs/biome/bin/biome',
  eslint: 'node_modules/eslint/bin/eslint.js',
  knip: 'node_modules/knip/bin/knip.js',
  next: 'node_modules/next/dist/bin/next',
  playwright: 'node_modules/@playwright/test/cli.js',
  tsc: 'node_modules/typescript/bin/tsc',
  vitest: 'node_modules/vitest/vitest.mjs',
};

/**
 * Runs a program in the project's folder, with our standard output and error, to its end.
 *
 * @param {string} command
 * @param {readonly string[]} args
 * @param {Record<string, string | undefined>} [environment] added to ours
 * @returns {Promise<boolean>} whether it ended well; false also when there is no such program
 */
export function run(command, args, environment = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: ROOT, stdio: 'inherit', env: { ...ENVIRONMENT, ...environment } });
    child.once('error', () => resolve(false));
    child.once('exit', (code) => resolve(code === 0));
  });
}

/**
 * Runs a program of our packages with this Node.
 *
 * @param {keyof typeof PROGRAM} name
 * @param {readonly string[]} args
 * @param {Record<string, string | undefined>} [environment]
 */
export function runProgram(name, args, environment) {
  return run(process.execPath, [PROGRAM[name], ...args], environment);
}
