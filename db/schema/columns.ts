/** Columns that many tables have, each with one meaning everywhere. */
import { type ExtraConfigColumn, integer, timestamp, uuid } from 'drizzle-orm/pg-core';

/** A moment, in whole milliseconds as a Date has them, so that what was read compares equal with what was written. */
export function moment(name: string) {
  return timestamp(name, { withTimezone: true, precision: 3, mode: 'date' });
}

/** The row's own id: random, so that nothing is guessed or counted by it. */
export function id() {
  return uuid('id').primaryKey().defaultRandom();
}

/** When the row was made. */
export function createdAt() {
  return moment('created_at').notNull().defaultNow();
}

/** When the row last changed. Written by whoever changes it. */
export function updatedAt() {
  return moment('updated_at').notNull().defaultNow();
}

/** Set: in the trash since then. Every query but those of the trash leaves such rows out. */
export function deletedAt() {
  return moment('deleted_at');
}

/** 1 when made, one more with each change: what If-Match is compared with. */
export function version() {
  return integer('version').notNull().default(1);
}

/**
 * A column of an index in the order of `order by … desc`. That order has nulls first, and drizzle's `desc()` alone makes an
 * index with nulls last, which PostgreSQL then cannot walk through, not even over a column without nulls.
 */
export function newestFirst(column: ExtraConfigColumn) {
  return column.desc().nullsFirst();
}
