/** What the service keeps: the values asked for last, and never more than its bound. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Recent } from '@/lib/services/readings/recent';

/** The slow twin: a list of keys, the one asked for last at the end. */
class SlowRecent {
  #entries: (readonly [string, number])[] = [];
  constructor(readonly max: number) {}
  get(key: string): number | undefined {
    const found = this.#entries.find(([name]) => name === key);
    if (found) this.#entries = [...this.#entries.filter((entry) => entry !== found), found];
    return found?.[1];
  }
  set(key: string, value: number): void {
    this.#entries = [...this.#entries.filter(([name]) => name !== key), [key, value] as const].slice(-this.max);
  }
}

describe('Recent', () => {
  it('answers like a plain list, whatever is asked', () => {
    const step = fc.record({
      key: fc.constantFrom('a', 'b', 'c', 'd', 'e'),
      value: fc.option(fc.nat(), { nil: undefined }),
    });
    fc.assert(
      fc.property(fc.array(step), fc.integer({ min: 1, max: 4 }), (steps, max) => {
        const [fast, slow] = [new Recent<number>(max), new SlowRecent(max)];
        for (const { key, value } of steps) {
          if (value === undefined) expect(fast.get(key)).toBe(slow.get(key));
          else {
            fast.set(key, value);
            slow.set(key, value);
          }
        }
      }),
    );
  });
});
