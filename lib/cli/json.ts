/** Readings as the API answers them: the same text, so the terminal never says more or less. */
import type { ReadingText } from '@/engine';
import { jsonWriter } from '@/lib/api/writer';
import { type BatchLine, batchLineSchema } from '@/openapi/schemas/readings';

const write = jsonWriter(batchLineSchema);

/** A reading, or the fault in its place, on one line with its end. */
export function jsonLine(value: ReadingText | Extract<BatchLine, { readonly error: unknown }>): string {
  return `${'json' in value ? value.json : (write(value) ?? 'null')}\n`;
}
