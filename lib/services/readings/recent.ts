/** The readings asked for last, kept because the same position is often asked for again: a page, its figure, its ETag. */
import type { Reading } from '@/engine/reading/schema';

/** How many readings are kept: a reading takes about a tenth of a megabyte, so some twenty in all. */
const KEPT_MAX = 200;

/** Values kept up to a number; the one that was not asked for longest goes first. */
export class Recent<V> {
  readonly #kept = new Map<string, V>();
  readonly #max: number;

  constructor(max: number) {
    this.#max = max;
  }

  get(key: string): V | undefined {
    const found = this.#kept.get(key);
    if (found === undefined) return undefined;
    this.#kept.delete(key);
    this.#kept.set(key, found);
    return found;
  }

  set(key: string, value: V): void {
    this.#kept.delete(key);
    this.#kept.set(key, value);
    const oldest = this.#kept.keys().next();
    if (this.#kept.size > this.#max && !oldest.done) this.#kept.delete(oldest.value);
  }
}

/** The readings that this process made last, by mode and FEN. */
export const recentReadings = new Recent<Reading>(KEPT_MAX);
