/** A terminal whose input is given and whose output is kept. */
import { Readable, Writable } from 'node:stream';
import { runWaypost } from '@/lib/cli/waypost';

export interface Ran {
  readonly code: number;
  readonly output: string;
  readonly errors: string;
}

function kept(): { readonly stream: Writable; readonly text: () => string } {
  let text = '';
  const stream = new Writable({
    write(chunk, _encoding, done) {
      text += String(chunk);
      done();
    },
  });
  return { stream, text: () => text };
}

/** Runs the command as the terminal would. Input may come in pieces, as from a pipe. */
export async function ran(args: readonly string[], input: readonly string[] = [], colour = false): Promise<Ran> {
  const [output, errors] = [kept(), kept()];
  const code = await runWaypost(args, {
    input: Readable.from(input),
    output: output.stream,
    errors: errors.stream,
    colour,
  });
  return { code, output: output.text(), errors: errors.text() };
}
