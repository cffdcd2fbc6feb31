/** The only reader of process.env. */

export const env = {
  /** Whether this is the built service and not development or a test. */
  isProduction: process.env.NODE_ENV === 'production',
  /** Level of the log: pino's names. */
  logLevel: process.env.LOG_LEVEL ?? (process.env.NODE_ENV === 'test' ? 'silent' : 'info'),
  /** Set and not empty: no colour in the terminal (no-color.org). */
  noColor: process.env.NO_COLOR,
} as const;
