/** Reading the words after a command: its options, and what is left. */
import { parseArgs, type ParseArgsConfig } from 'node:util';
import { UsageError } from './usage-error';

type Options = NonNullable<ParseArgsConfig['options']>;

/** Options and words. Throws UsageError, in a sentence, on what is not understood. */
export function commandArguments<O extends Options>(args: readonly string[], options: O) {
  try {
    return parseArgs({ args: [...args], allowPositionals: true, options });
  } catch (error) {
    throw new UsageError(argumentFault(error));
  }
}

function argumentFault(error: unknown): string {
  const { code, message } = error as { readonly code?: string; readonly message: string };
  const option = /'(-[^' ]*)/.exec(message)?.[1] ?? '';
  if (code === 'ERR_PARSE_ARGS_UNKNOWN_OPTION') return `There is no option "${option}".`;
  return message.includes('argument missing')
    ? `The option "${option}" needs a value.`
    : `The option "${option}" takes no value.`;
}

/** An option's value from a list, or undefined where it is left out. */
export function choiceOf<T extends string>(
  name: string,
  given: string | undefined,
  known: readonly T[],
): T | undefined {
  if (given === undefined) return undefined;
  const found = known.find((each) => each === given);
  if (found === undefined)
    throw new UsageError(`There is no ${name} "${given}"; the ${name}s are ${known.join(' and ')}.`);
  return found;
}

/** An option's value as a whole number in bounds. */
export function countOf(name: string, given: string | undefined, max: number): number | undefined {
  if (given === undefined) return undefined;
  const count = Number(given);
  if (!Number.isInteger(count) || count < 1 || count > max) {
    throw new UsageError(`--${name} takes a whole number from 1 to ${max}, not "${given}".`);
  }
  return count;
}

/** A FEN's own words: it has spaces, and the quotes may be forgotten. */
export function fenOf(positionals: readonly string[]): string {
  const fen = positionals.join(' ');
  if (fen === '') {
    throw new UsageError('A FEN is missing. Put it in quotes, or give "-" to read FENs from standard input.');
  }
  return fen;
}
