/**
 * Replies held against their schema.
 *
 * A reply marked `always` passes through its schema each time, so that what was never promised never leaves. One marked
 * `sampled` holds nothing but what the engine computed from the request itself; checking all of it costs about as much as
 * computing it, so in production the first reply of each call and then every hundredth is checked, and elsewhere each one.
 */
import type { z } from 'zod';

/** One reply in so many is checked in production, where the contract says `sampled`. */
const SAMPLE_EVERY = 100;

/** A function that passes replies through their schema, or now and then only. Throws on a reply that was never promised. */
export function replyCheck<S extends z.ZodType>(schema: S, how: 'always' | 'sampled', production: boolean): (value: z.output<S>) => z.output<S> {
  if (how === 'always' || !production) return (value) => schema.parse(value);
  let count = 0;
  return (value) => {
    const isDue = count % SAMPLE_EVERY === 0;
    count += 1;
    return isDue ? schema.parse(value) : value;
  };
}
