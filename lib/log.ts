/** The log: JSON lines on standard output, without personal data. */
import { pino } from 'pino';
import { env } from './env';

export const log = pino({ level: env.logLevel, base: null });
