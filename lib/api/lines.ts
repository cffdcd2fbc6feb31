/**
 * Values to a stream of JSON lines, made only as fast as they are taken away.
 *
 * The stream asks for the next chunk when the one before has left, so memory stays flat however slow the caller is. Between
 * chunks the event loop has its turn, so the server goes on answering others. The first chunk is a single line: it leaves
 * before the second is computed.
 */

/** Lines of a chunk after the first: two or three milliseconds of computing. */
const CHUNK_LINES = 4;

/**
 * Turns of the event loop between two chunks. An idle turn takes some ten microseconds, while a small request of somebody
 * else's takes dozens of turns before it is answered: with one turn a chunk it would wait for dozens of chunks.
 */
const TURNS_BETWEEN = 16;

/** A stream of NDJSON: `write` gives the JSON of a value. When the caller goes away the values are asked to stop. */
export function lineStream<V>(values: Iterable<V>, write: (value: V) => string): ReadableStream<Uint8Array> {
  const encoder = new TextEncoder();
  const iterator = values[Symbol.iterator]();
  let isFirst = true;
  return new ReadableStream<Uint8Array>(
    {
      async pull(controller) {
        for (let turn = 0; turn < TURNS_BETWEEN; turn += 1) await eventLoopTurn();
        const count = isFirst ? 1 : CHUNK_LINES;
        isFirst = false;
        let text = '';
        for (let line = 0; line < count; line += 1) {
          const next = iterator.next();
          if (next.done) {
            if (text !== '') controller.enqueue(encoder.encode(text));
            controller.close();
            return;
          }
          text += `${write(next.value)}\n`;
        }
        controller.enqueue(encoder.encode(text));
      },
      cancel() {
        iterator.return?.();
      },
    },
    { highWaterMark: 0 },
  );
}

function eventLoopTurn(): Promise<void> {
  return new Promise((resolve) => setImmediate(resolve));
}
