/** Values to server-sent events (WHATWG HTML, 9.2), with a comment now and then so that no proxy takes the line for dead. */

const BEAT_MS = 15_000;

/** A stream of events: each value is the data of one. When the caller goes away the values are asked to stop. */
export function eventStream<V>(values: AsyncIterable<V>, text: (value: V) => string): ReadableStream<Uint8Array> {
  const encoder = new TextEncoder();
  const iterator = values[Symbol.asyncIterator]();
  let beat: NodeJS.Timeout | undefined;
  return new ReadableStream<Uint8Array>({
    start(controller) {
      beat = setInterval(() => controller.enqueue(encoder.encode(': still here\n\n')), BEAT_MS);
      beat.unref();
    },
    async pull(controller) {
      const next = await iterator.next();
      if (!next.done) return controller.enqueue(encoder.encode(`data: ${text(next.value)}\n\n`));
      clearInterval(beat);
      controller.close();
    },
    async cancel() {
      clearInterval(beat);
      await iterator.return?.();
    },
  });
}
