/** The JSON of a reading: a promise within v1. Fields may be added, none renamed or given another meaning. */
import { z } from 'zod';
import {
  colourSchema,
  faultSchema,
  fileSchema,
  kindSchema,
  sideSchema,
  squareSchema,
  squaresBySideSchema,
  squaresSchema,
} from './basics';
import { statementSchema } from './statement';

const userSchema = z.object({
  from: squareSchema.describe('Where the man stands now.'),
  kind: kindSchema,
  moves: z
    .int()
    .min(0)
    .describe('Own moves needed to stand there safely, the enemy standing still; 0: it stands there.'),
});

export const squareReadingSchema = z
  .object({
    square: squareSchema,
    occupant: z.object({ side: sideSchema, kind: kindSchema }).nullable(),
    attackers: squaresBySideSchema.describe(
      'Men that attack the square, cheapest first, pinned men included (FIDE Laws 3.1).',
    ),
    held: squaresBySideSchema.describe('Attackers that an absolute pin keeps from capturing here.'),
    behind: squaresBySideSchema.describe('Sliders that would join after a friendly man in front has captured here.'),
    command: z
      .enum(['white', 'black', 'open', 'disputed'])
      .describe('Whose knight would be safe here: one side’s, both (open) or neither (disputed).'),
    exchange: z
      .object({ white: z.number().nullable(), black: z.number().nullable() })
      .describe('Gain in pawns for the side that begins to capture here; null where it cannot.'),
  })
  .meta({ id: 'SquareReading', description: 'One square: who attacks it and who commands it.' });

export const manReadingSchema = z
  .object({
    square: squareSchema,
    side: sideSchema,
    kind: kindSchema,
    moves: squaresSchema.describe('Squares it can move to: pseudo-legal, pins kept.'),
    safeMoves: squaresSchema.describe('Those of its moves on which it is not lost by exchange.'),
    sees: z.int().describe('Squares attacked, own men included.'),
    seesAhead: z.int().describe('Of these, squares on ranks ahead of it.'),
    pinned: z.boolean(),
    enPrise: z.number().describe('Pawns the enemy gains by taking it now; 0 if nothing.'),
    attackers: squaresSchema.describe('Enemy men that attack it, cheapest first.'),
    defenders: squaresSchema.describe('Own men that guard it, cheapest first.'),
    duties: z
      .array(
        z.object({
          square: squareSchema,
          loses: z.number().describe('Pawns lost there if the man leaves.'),
          by: z.enum(['guard', 'screen']).describe('It guards the man, or shuts the line of an enemy slider.'),
        }),
      )
      .describe('What falls if it leaves.'),
    trapped: z.boolean().describe('Attackable and without a safe square.'),
    notes: z
      .array(z.string())
      .describe('Named traits: bad-bishop, bad-but-active, rim, outpost, overloaded and others.'),
  })
  .meta({ id: 'ManReading', description: 'One man and what it can do from where it stands.' });

export const pawnSideSchema = z
  .object({
    islands: z.int(),
    isolated: squaresSchema,
    doubled: squaresSchema,
    backward: squaresSchema,
    passed: squaresSchema,
    protectedPassed: squaresSchema,
    candidates: squaresSchema,
    onLight: z.int(),
    onDark: z.int(),
    majorities: z
      .array(z.enum(['queenside', 'centre', 'kingside']))
      .describe('Wings (a to c, d to e, f to h) where this side has more pawns.'),
  })
  .meta({ id: 'PawnSide', description: 'The pawns of one side.' });

export const weakSquareSchema = z
  .object({
    square: squareSchema,
    side: sideSchema.describe('The side whose weakness it is.'),
    hold: z.enum(['permanent', 'fixed']),
    matters: z.boolean(),
    commandedByEnemy: z.boolean(),
    users: z.array(userSchema).describe('Enemy men that can come to stand there safely, soonest first.'),
    complex: colourSchema.describe('The colour of the square.'),
  })
  .meta({ id: 'WeakSquare', description: 'A square that its side’s pawns cannot guard.' });

const pawnDistance = z.object({ from: squareSchema, moves: z.int() });

export const outpostSchema = z
  .object({
    square: squareSchema,
    side: sideSchema.describe('The side that may use it.'),
    rank: z
      .enum(['outpost', 'advanced'])
      .describe('"advanced": a pawn may still challenge it, or no pawn supports it.'),
    deep: z.boolean().describe('On the side’s 7th rank.'),
    hold: z.enum(['permanent', 'fixed', 'open']),
    challenge: pawnDistance.nullable().describe('The soonest enemy pawn that can attack it.'),
    support: z
      .object({ pawn: squareSchema, moves: z.int() })
      .nullable()
      .describe('The soonest own pawn that can guard it; moves 0: it does now.'),
    occupant: squareSchema.nullable().describe('The square itself when an own man stands there.'),
    users: z.array(userSchema),
    tradable: z.boolean().describe('The enemy has a minor piece that can challenge it.'),
  })
  .meta({ id: 'Outpost', description: 'An outpost or advanced post.' });

export const fileReadingSchema = z
  .object({
    file: fileSchema,
    status: z.enum(['open', 'half-open', 'closed']),
    halfOpenFor: sideSchema.nullable(),
    heavy: squaresBySideSchema.describe('Rooks and queens on the file.'),
    control: z.enum(['white', 'black', 'shared', 'none']),
    entries: squaresBySideSchema.describe('Squares on the 7th and 8th rank of each side where it can enter.'),
    targets: z.array(z.object({ square: squareSchema, side: sideSchema })),
  })
  .meta({ id: 'FileReading', description: 'One file.' });

export const diagonalReadingSchema = z
  .object({
    from: squareSchema,
    direction: z.enum(['a1h8', 'h1a8']),
    squares: squaresSchema.describe('Squares seen along the diagonal from the man, nearest first, one way.'),
    stoppedBy: squareSchema.nullable(),
    stopperFixed: z.boolean().describe('The man that stops it is a rammed pawn.'),
  })
  .meta({ id: 'DiagonalReading', description: 'How far a bishop or queen sees along a diagonal, one way.' });

export const kingReadingSchema = z
  .object({
    square: squareSchema,
    shelter: z.array(z.object({ file: fileSchema, pawn: squareSchema.nullable(), advanced: z.int() })),
    openBeside: z.array(fileSchema).describe('Files of the king and beside it, open or half-open for the enemy.'),
    reachedBy: squaresSchema.describe('Enemy men that attack its zone.'),
    guardedBy: squaresSchema.describe('Own men that guard its zone.'),
    flights: squaresSchema.describe('Squares it can step to now.'),
    luft: squaresSchema.describe('Flights off its back rank.'),
    luftMoves: z
      .array(z.object({ from: squareSchema, to: squareSchema }))
      .describe('Own pawn moves that would give it its first luft.'),
    weakBackRank: z.boolean().describe('No luft, no own rook or queen on the back rank, and the enemy has one.'),
  })
  .meta({ id: 'KingReading', description: 'A king and its shelter.' });

export const totalsSchema = z
  .object({
    controlled: z.int(),
    commanded: z.int(),
    enemyHalf: z.int(),
    centre: z.int(),
    extendedCentre: z.int(),
    safeMoves: z.int(),
  })
  .meta({ id: 'Totals', description: 'Counts of one side over the whole board.' });

export const structureMatchSchema = z.object({
  id: z.string(),
  name: z.string(),
  side: sideSchema.describe('The side that has the structure’s leading part.'),
  differs: z.int().describe('Pawns that differ from the model.'),
});

export const readingSchema = z
  .object({
    engine: z.string().describe('Version of the computations.'),
    fen: z.string().describe('Six fields, normalised.'),
    mode: z.enum(['strict', 'diagram']),
    warnings: z.array(faultSchema),
    sideToMove: sideSchema,
    squares: z.array(squareReadingSchema).describe('64, a1 first, then b1 … h8.'),
    men: z.array(manReadingSchema).describe('One a man, in square order.'),
    pawns: z.object({
      white: pawnSideSchema,
      black: pawnSideSchema,
      rams: z.array(z.object({ white: squareSchema, black: squareSchema })),
      levers: z.array(
        z.object({
          from: squareSchema,
          against: squareSchema,
          side: sideSchema,
          moves: z.int(),
          supported: z.boolean(),
        }),
      ),
      fixedness: z.object({ all: z.number().nullable(), centre: z.number().nullable() }),
      structure: structureMatchSchema.nullable(),
    }),
    weakSquares: z.array(weakSquareSchema),
    outposts: z.array(outpostSchema),
    files: z.array(fileReadingSchema).describe('8, a first.'),
    diagonals: z.array(diagonalReadingSchema),
    colourComplexes: z.array(
      z.object({
        side: sideSchema,
        colour: colourSchema,
        squares: squaresSchema,
        ownBishop: z.boolean(),
        enemyBishop: z.boolean(),
      }),
    ),
    kings: z.object({ white: kingReadingSchema.nullable(), black: kingReadingSchema.nullable() }),
    totals: z.object({ white: totalsSchema, black: totalsSchema }),
    statements: z.array(statementSchema).describe('By weight, heaviest first.'),
    lead: z.array(z.string()).describe('Keys of the few statements that matter most.'),
  })
  .meta({ id: 'Reading', description: 'Everything computed for one position.' });

export type Reading = z.infer<typeof readingSchema>;
