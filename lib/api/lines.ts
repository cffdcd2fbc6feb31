/**
 * Values to a stream of JSON lines, made only as fast as they are taken away.
 *
 * The stream asks for the next lines when those before have left, so memory stays flat however slow the caller is.
 */
import { Written } from './reply';

/** A stream of NDJSON: `text` gives the JSON of a value that is not written yet. When the caller goes away the values are asked to stop. */
export function lineStream<V>(
  values: AsyncIterable<V | Written>,
  text: (value: V) => string,
): ReadableStream<Uint8Array> {
  const encoder = new TextEncoder();
  const iterator = values[Symbol.asyncIterator]();
  return new ReadableStream<Uint8Array>(
    {
      async pull(controller) {
        const next = await iterator.next();
        if (next.done) controller.close();
        else
          controller.enqueue(
            next.value instanceof Written ? next.value.bytes : encoder.encode(`${text(next.value)}\n`),
          );
      },
      async cancel() {
        await iterator.return?.();
      },
    },
    { highWaterMark: 0 },
  );
}
