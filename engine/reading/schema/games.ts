/** The JSON of games: a promise within v1. */
import { z } from 'zod';
import { kindSchema, sideSchema, squareSchema, squaresSchema } from './basics';

const count = z.int().min(0);
const ply = count.describe('Half-moves played.');
const move = z.string().describe('With its number, as "12. Nf3" or "12... c5".');
const bySide = z.object({ white: count, black: count });

const compactSideSchema = z.object({
  weakSquares: count.describe('Weak squares of the side itself.'),
  outposts: count.describe('Outposts of the side: no enemy pawn can come, a pawn guards them now or in one move.'),
  files: count.describe('Files it controls.'),
  safeMoves: count.describe('Safe moves of all its men.'),
  flights: count.describe('Flight squares of its king.'),
  shelter: count.describe('Own pawns before its king: on its file and the files beside, one a file at most.'),
  kingAttackers: count.describe('Enemy men that attack the zone of its king.'),
  material: count.describe('Worth of its men in pawns, the king left out.'),
});

export const timelinePlySchema = z
  .object({
    ply,
    move: move.nullable().describe('The move that led here; null at the beginning.'),
    fen: z.string().describe('The position, six fields.'),
    structure: z
      .object({ id: z.string(), name: z.string(), side: sideSchema })
      .nullable()
      .describe('The named pawn structure; its side leads, or is to move where the structure is alike for both.'),
    command: z
      .object({ centre: bySide, queenside: bySide, kingside: bySide, whiteCamp: bySide, blackCamp: bySide })
      .describe('Squares commanded: c3 to f6; files a to c; files f to h; ranks 1 to 3; ranks 6 to 8.'),
    white: compactSideSchema,
    black: compactSideSchema,
  })
  .meta({ id: 'TimelinePly', description: 'A compact reading of one position of a game.' });

export const journeySchema = z
  .object({
    side: sideSchema,
    kind: kindSchema.describe('The kind it began as.'),
    start: squareSchema,
    stays: z.array(z.object({ square: squareSchema, from: ply, plies: count })).describe('Where it stood, how long.'),
    takenAt: count.nullable().describe('The half-move that took it; null: it is there at the end.'),
    promoted: z.object({ kind: kindSchema, at: count }).nullable().describe('What it became, and at which half-move.'),
  })
  .meta({ id: 'Journey', description: 'One man’s way through the game.' });

const featureKindSchema = z
  .enum([
    'structure',
    'weak-square',
    'outpost',
    'open-file',
    'half-open-file',
    'bishop-pair',
    'passed-pawn',
    'isolated-pawn',
    'backward-pawn',
    'doubled-pawn',
    'weak-complex',
    'ram',
    'castling-lost',
  ])
  .meta({ id: 'FeatureKind', description: 'A kind of lasting feature.' });

const featureFields = {
  kind: featureKindSchema,
  side: sideSchema.nullable().describe('Whose it is: who suffers from a weakness, who has the rest; null: both.'),
  squares: squaresSchema.describe('Its squares, those of pawns as they stand there.'),
  hold: z
    .enum(['permanent', 'fixed'])
    .nullable()
    .describe('Weak squares and outposts: for good, or while the pawns that could come are stopped; else null.'),
  text: z.string().describe('The claim, without full stop.'),
};

export const commitmentSchema = z
  .object({
    ply,
    move,
    side: sideSchema,
    act: z
      .enum(['pawn-move', 'capture', 'promotion', 'king-move', 'rook-move'])
      .describe('A king’s or rook’s move is one where it gives up castling.'),
    changes: z
      .array(z.object({ ...featureFields, made: z.boolean().describe('Made by the move; else ended.') }))
      .describe('One a feature; it still stands two half-moves later, or the game is over.'),
    text: z.string().describe('The move and its changes in sentences, those of one kind together.'),
  })
  .meta({ id: 'Commitment', description: 'A move that cannot be taken back, and what it changed for good.' });

export const originSchema = z
  .object({ ...featureFields, ply: ply.describe('0: there from the beginning.'), move: move.nullable() })
  .meta({ id: 'Origin', description: 'A lasting feature of the last position, and the move since which it stands.' });

export const gameReadingSchema = z
  .object({
    game: z.int().min(1).describe('Its number in the text.'),
    tags: z.record(z.string(), z.string()).describe('Its PGN tags by name.'),
    result: z.enum(['1-0', '0-1', '1/2-1/2', '*']),
    plies: count.describe('Half-moves of the main line.'),
    timeline: z.array(timelinePlySchema).describe('One a position, the start first.'),
    journeys: z.array(journeySchema).describe('One a man, in square order of where they began.'),
    commitments: z.array(commitmentSchema).describe('In the order of the game.'),
    origins: z.array(originSchema).describe('One a lasting feature of the last position.'),
  })
  .meta({ id: 'GameReading', description: 'A game: timeline, journeys, commitments, origins.' });

export const gameFaultSchema = z
  .object({
    game: z.int().min(1).describe('Its number in the text.'),
    line: z.int().min(0).describe('Line of the text, from 1.'),
    move: z.string().nullable().describe('The move at fault with its number; null where no move is.'),
    code: z.string().describe('Stable within v1, as "illegal-move".'),
    message: z.string().describe('A sentence.'),
  })
  .meta({ id: 'GameFault', description: 'Why a game was not kept, and where.' });

export const gamesAnswerSchema = z
  .object({ engine: z.string(), games: z.array(gameReadingSchema), faults: z.array(gameFaultSchema) })
  .meta({ id: 'GamesAnswer', description: 'The games that could be read, and why the others could not.' });
export type GamesAnswer = z.infer<typeof gamesAnswerSchema>;
export type GameReadingAnswer = z.infer<typeof gameReadingSchema>;
