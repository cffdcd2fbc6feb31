/** A command whose request the services may refuse: the refusal goes to standard error, in words. */
import { AppError } from '@/lib/errors';
import type { Answer } from './lines';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { item } from './wrap';

/** Runs the command; a refusal is written with each of its faults and ends it with code 1. */
export async function refused(terminal: Terminal, run: () => Promise<ExitCode>): Promise<ExitCode> {
  try {
    return await run();
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const faults = error.faults.length > 0 ? error.faults : [{ message: error.message, field: undefined }];
    const lines = faults.flatMap(({ field, message }) => item(field ? `  ${field}: ` : '  ', message));
    await written(terminal.errors, `${['This was refused.', ...lines].join('\n')}\n`);
    return EXIT.fault;
  }
}

/** What a line of a stream is answered: the value, or the first of the faults that refused it. */
export function answered<V>(compute: () => V): Answer<V> {
  try {
    return { ok: true, value: compute() };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return { ok: false, fault: error.faults[0] ?? { code: error.code, message: error.message } };
  }
}
