/** The worker's end of the door: it answers each ask under the number it came with. */

/** An ask as it passes to the worker, and its answer on the way back. */
export interface Numbered<T> {
  readonly id: number;
  readonly value: T;
}

/** Answers every ask that comes in. Called once in a worker's own file; an error goes to the page's `onerror`. */
export function answerAsks<A, B>(answer: (ask: A) => B): void {
  addEventListener('message', ({ data }: MessageEvent<Numbered<A>>) => {
    const reply: Numbered<B> = { id: data.id, value: answer(data.value) };
    (globalThis as unknown as { postMessage: (message: unknown) => void }).postMessage(reply);
  });
}
