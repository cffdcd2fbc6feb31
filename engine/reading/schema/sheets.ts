/** The JSON of structure sheets: a promise within v1, like that of readings. */
import { z } from 'zod';
import { LEVER_FAULTS, LEVER_STATES, POST_STATES, TRADE_STATES } from '../../structures';
import { colourSchema, kindSchema, sideSchema, squareSchema, squaresBySideSchema, squaresSchema } from './basics';

const bookSchema = z
  .object({
    author: z.string().describe('Who wrote it.'),
    title: z.string().describe('Its title.'),
    year: z.int().describe('Year of the first edition, or of the first in English.'),
  })
  .meta({ id: 'SheetBook', description: 'A handbook that treats the structure; author, title and year from memory.' });

const tradeManSchema = z
  .object({
    kind: kindSchema.describe('The kind of man.'),
    colour: colourSchema.nullable().describe('Of which squares the bishop is, where that matters; else null.'),
  })
  .meta({ id: 'SheetTradeMan', description: 'A man that may be traded.' });

const postShape = {
  kind: kindSchema.describe('The kind of man that belongs there.'),
  square: squareSchema.describe('Its usual square.'),
};
const leverShape = {
  on: squareSchema.describe('The square from which the pawn attacks.'),
  against: squareSchema.describe('The enemy pawn’s square that it attacks from there.'),
};
const tradeShape = {
  own: tradeManSchema.describe('The man of this side.'),
  enemy: tradeManSchema.describe('The man of the other side.'),
};
const planSchema = z.string().describe('The typical plan of this side, in one sentence.');

const tradeSchema = z.object(tradeShape).meta({ id: 'SheetTrade', description: 'A trade, own man for enemy man.' });

const sheetSideSchema = z
  .object({
    keySquares: squaresSchema.describe('Squares that the side wants in hand.'),
    posts: z
      .array(z.object(postShape).meta({ id: 'SheetPost', description: 'A man and its usual square.' }))
      .describe('Usual posts by kind of man.'),
    levers: z
      .array(z.object(leverShape).meta({ id: 'SheetLever', description: 'A pawn’s attack on an enemy pawn.' }))
      .describe('The pawn levers of the side.'),
    wanted: z.array(tradeSchema).describe('Trades that the side looks for.'),
    unwanted: z.array(tradeSchema).describe('Trades that the side keeps out of.'),
    plan: planSchema,
  })
  .meta({ id: 'SheetSide', description: 'What the handbooks teach for one side.' });

const skeletonSchema = z
  .object({
    core: z.string().describe('Pawns that must stand: "d4", "c2|c3" on either, "f" anywhere on the file.'),
    bare: z.string().describe('Files and squares without a pawn of this side.'),
    usual: z.string().describe('Pawns that may be missing; each that is counts as a difference.'),
  })
  .meta({ id: 'SheetSkeleton', description: 'The pawns of one side of a structure, as text.' });

export const structureSheetSchema = z
  .object({
    id: z.string().describe('Stable id of the structure.'),
    name: z.string().describe('Its name in the books.'),
    leader: sideSchema.describe('The side with the leading part, in the colours as written here.'),
    lead: z.string().describe('What the structure means, in a clause.'),
    pawns: z
      .object({ white: skeletonSchema, black: skeletonSchema })
      .describe('The pawns by which the structure is known.'),
    white: sheetSideSchema.describe('What White looks for.'),
    black: sheetSideSchema.describe('What Black looks for.'),
    books: z.array(bookSchema).describe('Books that treat it.'),
  })
  .meta({ id: 'StructureSheet', description: 'Handbook knowledge about one named pawn structure.' });

export const structuresAnswerSchema = z
  .object({
    engine: z.string().describe('Version of the computations.'),
    structures: z.array(structureSheetSchema).describe('All sheets, by family of openings.'),
  })
  .meta({ id: 'StructuresAnswer', description: 'Every structure sheet.' });

const manSchema = z
  .object({ side: sideSchema.describe('Whose man it is.'), kind: kindSchema.describe('What it is.') })
  .nullable()
  .describe('Who stands on the square now; null for nobody.');

const heldKeySchema = z
  .object({
    square: squareSchema.describe('The key square.'),
    occupant: manSchema,
    attackers: squaresBySideSchema.describe('Men that attack it, cheapest first.'),
    controller: sideSchema
      .nullable()
      .describe('The one side whose knight would be safe there; null where both sides’ would, or neither’s.'),
  })
  .meta({ id: 'SheetKeySquareHeld', description: 'A key square, and who holds it.' });

const heldPostSchema = z
  .object({
    ...postShape,
    state: z.enum(POST_STATES).describe('held: a man of that kind stands there; own-man or enemy-man: another; free.'),
    occupant: manSchema,
    safe: z.boolean().describe('A man of that kind would not be lost there by exchange.'),
    users: z
      .array(
        z.object({
          from: squareSchema.describe('Where the man stands.'),
          moves: z.int().min(1).describe('Its own moves to the post.'),
        }),
      )
      .describe('Men of that kind that can come safely within three moves, soonest first.'),
  })
  .meta({ id: 'SheetPostHeld', description: 'A post, who stands there and who can come.' });

const heldLeverSchema = z
  .object({
    ...leverShape,
    state: z
      .enum(LEVER_STATES)
      .describe('ready: attacks now; needs-moves; blocked: men on the road; impossible: see fault.'),
    fault: z
      .enum(LEVER_FAULTS)
      .nullable()
      .describe('no-pawn: none can come; no-target: nothing to attack; rammed: an enemy pawn on the road.'),
    from: squareSchema.nullable().describe('The pawn that makes it.'),
    moves: z.int().min(0).nullable().describe('Pawn moves to the square, the double step being one.'),
    blockers: squaresSchema.describe('Men on the road, nearest first.'),
    supported: z.boolean().describe('Another own pawn guards the square, as things stand.'),
  })
  .meta({ id: 'SheetLeverHeld', description: 'A lever, and whether it is to be had.' });

const heldTradeSchema = z
  .object({
    ...tradeShape,
    state: z.enum(TRADE_STATES).describe('available: both such men are there; one-left; done: neither is.'),
    ownMen: squaresSchema.describe('Such men of this side.'),
    enemyMen: squaresSchema.describe('Such men of the other side.'),
  })
  .meta({ id: 'SheetTradeHeld', description: 'A trade, and whether it can still come.' });

const heldSideSchema = z
  .object({
    keySquares: z.array(heldKeySchema).describe('Squares that the side wants in hand, and who holds them.'),
    posts: z.array(heldPostSchema).describe('Usual posts, and who can come.'),
    levers: z.array(heldLeverSchema).describe('Levers, and the pawn moves they need.'),
    wanted: z.array(heldTradeSchema).describe('Trades that the side looks for.'),
    unwanted: z.array(heldTradeSchema).describe('Trades that the side keeps out of.'),
    plan: planSchema,
  })
  .meta({ id: 'SheetSideHeld', description: 'What of the sheet holds for one side.' });

export const sheetAnswerSchema = z
  .object({
    engine: z.string().describe('Version of the computations.'),
    fen: z.string().describe('The position, six fields, normalised.'),
    sheet: z
      .object({
        id: z.string().describe('Id of the structure.'),
        name: z.string().describe('Its name.'),
        side: sideSchema.describe('The side that has the leading part here.'),
        differs: z.int().min(0).describe('Pawns that differ from the model.'),
        lead: z.string().describe('What the structure means, in a clause.'),
        white: heldSideSchema.describe('White’s part.'),
        black: heldSideSchema.describe('Black’s part.'),
        books: z.array(bookSchema).describe('Books that treat it.'),
      })
      .nullable()
      .describe('The sheet of the named structure; null where the pawns have no name.'),
  })
  .meta({ id: 'SheetAnswer', description: 'What of a structure sheet holds in a position.' });

export type StructureSheetJson = z.infer<typeof structureSheetSchema>;
export type StructuresAnswer = z.infer<typeof structuresAnswerSchema>;
export type SheetAnswer = z.infer<typeof sheetAnswerSchema>;
