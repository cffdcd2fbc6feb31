/** Readings as the API answers them: written by the same schemas, so the terminal never says more or less. */
import { jsonWriter } from '@/lib/api/writer';
import { type BatchLine, batchLineSchema } from '@/openapi/schemas/readings';

const write = jsonWriter(batchLineSchema);

/** A reading, or the fault in its place, on one line with its end. */
export function jsonLine(value: BatchLine): string {
  return `${write(value) ?? 'null'}\n`;
}
