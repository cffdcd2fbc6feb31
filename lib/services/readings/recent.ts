/** What was asked for last, kept because the same position is often asked for again: a page, its figure, its ETag. */

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
