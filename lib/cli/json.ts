/** Readings as the API answers them: the same text, so the terminal never says more or less. */
import type { ReadingBytes } from '@/engine';
import { jsonWriter } from '@/lib/api/writer';
import { type BatchLine, batchLineSchema } from '@/openapi/schemas/readings';

const write = jsonWriter(batchLineSchema);
const decoder = new TextDecoder();

/** A reading, or the fault in its place, on one line with its end. */
export function jsonLine(value: ReadingBytes | Extract<BatchLine, { readonly error: unknown }>): string {
  return `${'json' in value ? decoder.decode(value.json) : (write(value) ?? 'null')}\n`;
}
