/** What a terminal command is given of the outside world, and how it writes there. */
import { once } from 'node:events';
import type { Readable, Writable } from 'node:stream';

export interface Terminal {
  readonly input: Readable;
  readonly output: Writable;
  readonly errors: Writable;
  /** Whether the output understands colours and wants them. */
  readonly colour: boolean;
}

/** The exit codes of every command. */
export const EXIT = { good: 0, fault: 1, usage: 2 } as const;
export type ExitCode = (typeof EXIT)[keyof typeof EXIT];

/** The command's own terminal. Colour only on a screen, and not where NO_COLOR is set (no-color.org). */
export function ownTerminal(noColor: string | undefined): Terminal {
  return {
    input: process.stdin,
    output: process.stdout,
    errors: process.stderr,
    colour: process.stdout.isTTY === true && (noColor === undefined || noColor === ''),
  };
}

/** Writes and waits until there is room for more; false when nobody reads any longer. */
export async function written(output: Writable, text: string): Promise<boolean> {
  if (output.destroyed || output.writableEnded) return false;
  if (output.write(text)) return true;
  const waiting = new AbortController();
  const { signal } = waiting;
  await Promise.race([once(output, 'drain', { signal }), once(output, 'close', { signal })]);
  waiting.abort();
  return !output.destroyed;
}
