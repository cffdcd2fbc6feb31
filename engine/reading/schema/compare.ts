/** The JSON of comparisons and exchange tests: a promise within v1. */
import { z } from 'zod';
import { THEMES } from '../../types';
import { kindSchema, sideSchema, squareSchema, squaresSchema } from './basics';
import { statementSchema } from './statement';

function change<S extends z.ZodType>(value: S) {
  return z.object({ a: value.describe('Before.'), b: value.describe('After.') });
}

const count = z.int().min(0);
const themeSchema = z.enum(THEMES);
const bySide = <S extends z.ZodType>(value: S) => z.object({ white: value, black: value });

export const squareDifferenceSchema = z
  .object({
    square: squareSchema,
    occupant: change(z.object({ side: sideSchema, kind: kindSchema }).nullable()).describe('What stands there.'),
    attackers: bySide(change(count)).describe('How many men of each side attack it.'),
    command: change(z.enum(['white', 'black', 'open', 'disputed'])).describe('As in a reading.'),
    weakFor: bySide(change(z.enum(['permanent', 'fixed']).nullable())).describe('Its hold as a weak square of a side.'),
    outpostFor: bySide(change(z.boolean())).describe('Whether it is an outpost of a side.'),
  })
  .meta({ id: 'SquareDifference', description: 'A square on which anything differs.' });

const manCountsSchema = z.object({
  safeMoves: count,
  enemyHalf: count.describe('Squares attacked in the enemy half.'),
  attackers: count,
  defenders: count,
  enPrise: z.number().describe('Pawns the enemy gains by taking it now.'),
});

export const manDifferenceSchema = z
  .object({
    side: sideSchema,
    kind: kindSchema,
    squares: change(squareSchema.nullable()).describe('Where it stands; null: not on the board.'),
    counts: change(manCountsSchema.nullable()),
  })
  .meta({ id: 'ManDifference', description: 'A man that stands elsewhere, is gone or new, or whose counts differ.' });

export const balanceLineSchema = z
  .object({
    theme: themeSchema,
    counts: z.string().describe('What is counted, in words.'),
    white: change(count),
    black: change(count),
  })
  .meta({ id: 'BalanceLine', description: 'One count a theme, before and after.' });

export const differenceSentenceSchema = z
  .object({
    id: z.string().describe('Stable id of what is said, e.g. "last-guard-gone".'),
    theme: themeSchema,
    side: sideSchema.nullable().describe('Whose gain or loss it is; null: of both.'),
    good: z.boolean().describe('Good for that side; where it is of both: there is more of it.'),
    weight: z.number().describe('Only orders.'),
    text: z.string(),
    squares: squaresSchema,
    men: squaresSchema.describe('Men of B that it points at.'),
    facts: z.record(z.string(), z.unknown()).describe('What the text is made from.'),
  })
  .meta({ id: 'DifferenceSentence', description: 'A sentence of the difference.' });

export const differenceSchema = z
  .object({
    squares: z.array(squareDifferenceSchema),
    men: z.array(manDifferenceSchema),
    balance: z.array(balanceLineSchema),
    gained: z.array(statementSchema).describe('Statements of B that A does not make word for word.'),
    lost: z.array(statementSchema).describe('Statements of A that B does not make.'),
    unchanged: count.describe('How many statements both make.'),
    sentences: z.array(differenceSentenceSchema).describe('Best said first.'),
  })
  .meta({ id: 'Difference', description: 'All that differs from A to B.' });

export const comparisonSchema = z
  .object({
    engine: z.string(),
    subjects: z
      .array(z.object({ fen: z.string(), label: z.string() }))
      .describe('What was compared, each as a position; the first is the one the others are held against.'),
    differences: z.array(differenceSchema).describe('From the first subject to each of the others, in order.'),
  })
  .meta({ id: 'Comparison', description: 'Two to four positions or placements side by side.' });
export type Comparison = z.infer<typeof comparisonSchema>;

const traderSchema = z.object({ square: squareSchema, kind: kindSchema });

export const exchangeSchema = z
  .object({
    white: traderSchema,
    black: traderSchema,
    offers: bySide(count.nullable()).describe(
      'Own safe moves until each side’s man attacks the other; 0: now; null: not within three.',
    ),
    fen: z.string().describe('The position with both gone.'),
    balance: z.array(balanceLineSchema),
    themes: bySide(count).describe('Themes whose balance moves towards each side.'),
    reasons: z
      .array(
        z.object({
          id: z.string().describe('As in the sentences.'),
          side: sideSchema,
          good: z.boolean(),
          times: z.int().min(1).describe('How many such sentences.'),
          points: z.number().describe('What they add up to; below 0 where they speak against the side.'),
        }),
      )
      .describe('What is said for and against each side, counted and weighed.'),
    points: bySide(z.number()).describe('The points of the reasons of each side, added up; only orders.'),
    helps: sideSchema.nullable().describe('The side that the trade helps by those points; null: neither.'),
    sentences: z.array(differenceSentenceSchema),
  })
  .meta({ id: 'Exchange', description: 'One trade and what it changes.' });

export const exchangeTestSchema = z
  .object({
    engine: z.string(),
    fen: z.string(),
    white: z.array(traderSchema).describe('White’s men that can be traded: the rows.'),
    black: z.array(traderSchema).describe('Black’s men that can be traded: the columns.'),
    exchanges: z.array(exchangeSchema).describe('Row by row; pairs of unlike worth are left out.'),
  })
  .meta({ id: 'ExchangeTest', description: 'Every trade of men of like worth.' });
export type ExchangeTestAnswer = z.infer<typeof exchangeTestSchema>;
