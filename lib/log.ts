/** The log: JSON lines on standard output, without personal data. */
import { pino } from 'pino';
import { env } from './env';

export const log = pino({ level: env.logLevel, base: null, serializers: { err: loggedError } });

/**
 * Of an error what helps to mend it, and nothing that people sent: the database's errors carry the values of the query,
 * and their causes whole rows.
 */
export function loggedError(error: unknown): Readonly<Record<string, unknown>> {
  if (!(error instanceof Error)) return { message: typeof error };
  const { code } = error as { readonly code?: unknown };
  const { cause } = error;
  return {
    type: error.name,
    message: withoutValues(error.message),
    stack: withoutValues(error.stack ?? ''),
    ...(typeof code === 'string' && { code }),
    ...(cause !== undefined && { cause: loggedError(cause) }),
  };
}

/** Drizzle writes a query's values after `params:`, up to where the stack begins. */
function withoutValues(text: string): string {
  return text.replace(/\nparams:[\s\S]*?(?=\n\s+at |$(?![\s\S]))/g, '');
}
