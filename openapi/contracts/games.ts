/** Whole games: timeline, journeys, commitments. */
import { gamesAnswerSchema } from '../../engine/reading/schema/games';
import { contract, json } from '../contract';
import { EXAMPLE_PGN } from '../schemas/examples';
import { GAMES_CALL_MAX, gamesRequestSchema, PGN_CALL_MAX } from '../schemas/games';

export const createGames = contract({
  id: 'createGames',
  method: 'POST',
  path: '/api/v1/games',
  tag: 'Games',
  scope: 'compute',
  summary: 'Read games',
  description: `PGN to a compact reading of every position, the journey of every man, the moves that changed something for good, and the origin of every lasting feature. Up to ${GAMES_CALL_MAX} games; a bad game is named in "faults" with its line and move, and the good ones are answered.`,
  body: { schema: gamesRequestSchema, bytesMax: PGN_CALL_MAX * 2 },
  reply: json(gamesAnswerSchema, 'sampled'),
  errors: ['pgn-refused'],
  example: { body: { pgn: EXAMPLE_PGN } },
});
