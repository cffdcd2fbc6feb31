/**
 * Replies held against their schema.
 *
 * Every reply is written by its schema (lib/api/writer.ts), so fields that were never promised never leave. Whether the fields
 * that do leave have the promised types is checked here: for replies marked `always` each time, for those marked
 * `sampled` in production at the first reply of each call and then at every hundredth, and elsewhere each time too.
 * Sampled are the readings: the engine alone makes them, from the request alone, and a check of one takes as long as a
 * good part of computing it.
 */
import type { z } from 'zod';

/** One reply in so many is checked in production, where the contract says `sampled`. */
const SAMPLE_EVERY = 100;

/** Tells of one reply after another whether it is to be checked. */
export function sampling(how: 'always' | 'sampled', production: boolean): () => boolean {
  if (how === 'always' || !production) return () => true;
  let count = 0;
  return () => count++ % SAMPLE_EVERY === 0;
}

/** A function that passes replies through their schema, or now and then only. Throws on a reply that was never promised. */
export function replyCheck<S extends z.ZodType>(
  schema: S,
  how: 'always' | 'sampled',
  production: boolean,
): (value: z.output<S>) => z.output<S> {
  const isDue = sampling(how, production);
  return (value) => (isDue() ? schema.parse(value) : value);
}
