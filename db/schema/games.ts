/** Games in studies, and every position of theirs with what one can search for. */
import { sql } from 'drizzle-orm';
import { index, integer, jsonb, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { users } from './accounts';
import { createdAt, deletedAt, id, updatedAt, version } from './columns';
import { studies } from './studies';

/** A game: its PGN as it came, its tags, and a summary for lists. */
export const games = pgTable(
  'games',
  {
    id: id(),
    studyId: uuid('study_id')
      .notNull()
      .references(() => studies.id, { onDelete: 'cascade' }),
    pgn: text('pgn').notNull(),
    tags: jsonb('tags').$type<Readonly<Record<string, string>>>().notNull().default({}),
    /** SHA-256 of the tags and moves that make it this game. */
    fingerprint: text('fingerprint').notNull(),
    summary: jsonb('summary').$type<Readonly<Record<string, unknown>>>().notNull().default({}),
    /** What the summary was computed by; null: not yet. */
    engineVersion: text('engine_version'),
    version: version(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
    deletedAt: deletedAt(),
  },
  (table) => [
    // The same file twice makes no doubles; a game in the trash does not stand in the way of a new import.
    uniqueIndex('games_fingerprint').on(table.studyId, table.fingerprint).where(sql`${table.deletedAt} is null`),
    // A study's games, the oldest first, by cursor.
    index('games_study').on(table.studyId, table.createdAt, table.id).where(sql`${table.deletedAt} is null`),
  ],
);

/** A position of a game after so many half-moves, with the words under which a search finds it. */
export const gamePositions = pgTable(
  'game_positions',
  {
    gameId: uuid('game_id')
      .notNull()
      .references(() => games.id, { onDelete: 'cascade' }),
    /** Half-moves played; 0 is the position the game began from. */
    ply: integer('ply').notNull(),
    fen: text('fen').notNull(),
    positionKey: text('position_key').notNull(),
    /** The move that led here, in SAN; null at the beginning. */
    san: text('san'),
    /** Ids of the named structures. */
    structures: text('structures').array().notNull().default(sql`'{}'::text[]`),
    /** Side, kind and square of each post that is taken: `white knight d5`. */
    posts: text('posts').array().notNull().default(sql`'{}'::text[]`),
    /** State and file: `open c`, `half-open white d`. */
    files: text('files').array().notNull().default(sql`'{}'::text[]`),
    themes: text('themes').array().notNull().default(sql`'{}'::text[]`),
  },
  (table) => [
    primaryKey({ columns: [table.gameId, table.ply] }),
    // Where else a position occurred.
    index('game_positions_key').on(table.positionKey),
    // Search asks for rows that hold a word; only an inverted index answers that.
    index('game_positions_structures').using('gin', table.structures),
    index('game_positions_posts').using('gin', table.posts),
    index('game_positions_files').using('gin', table.files),
    index('game_positions_themes').using('gin', table.themes),
  ],
);
