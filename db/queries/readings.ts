/** Readings that are kept: one for each position and engine. */
import { and, eq, inArray } from 'drizzle-orm';
import type { Reading } from '@/engine/reading/schema';
import type { Db } from '@/db/client';
import { readings } from '@/db/schema';

/** A reading to be kept. */
export interface KeptReading {
  readonly positionKey: string;
  readonly engineVersion: string;
  readonly reading: Reading;
}

/** Keeps readings; those that are kept already stay. */
export async function keepReadings(db: Db, rows: readonly KeptReading[]): Promise<void> {
  if (rows.length > 0)
    await db
      .insert(readings)
      .values([...rows])
      .onConflictDoNothing();
}

/** The readings that are kept of these positions, by key. */
export async function readingsOf(
  db: Db,
  positionKeys: readonly string[],
  engineVersion: string,
): Promise<ReadonlyMap<string, Reading>> {
  if (positionKeys.length === 0) return new Map();
  const rows = await db
    .select()
    .from(readings)
    .where(and(inArray(readings.positionKey, [...positionKeys]), eq(readings.engineVersion, engineVersion)));
  return new Map(rows.map(({ positionKey, reading }) => [positionKey, reading]));
}
