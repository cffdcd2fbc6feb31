/** What the call about games takes. */
import { z } from 'zod';

/** Longest PGN of one call, in characters; longer files are imported by a job. */
export const PGN_CALL_MAX = 200_000;
/** Most games that one call reads. */
export const GAMES_CALL_MAX = 20;

export const gamesRequestSchema = z
  .strictObject({
    pgn: z.string().min(1).max(PGN_CALL_MAX).describe('One game or several, with comments, variations and glyphs.'),
  })
  .meta({ id: 'GamesRequest', description: 'Games to be read.' });
export type GamesRequest = z.infer<typeof gamesRequestSchema>;
