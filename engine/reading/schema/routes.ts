/** The JSON of routes: a promise within v1, like that of readings. */
import { z } from 'zod';
import { STEP_CODES } from '../../routes';
import { kindSchema, sideSchema, squareSchema, squaresSchema } from './basics';

export const guardSchema = z
  .object({
    verdict: z
      .enum(['holds', 'loses', 'unknown'])
      .describe('Whether something is lost by force, the enemy to move; "unknown": the search gave up.'),
    line: z.array(z.string()).describe('The moves that show the loss, in SAN, the enemy first.'),
    loses: z.number().describe('Pawns lost; 200 stands for mate; 0 where it holds.'),
  })
  .meta({
    id: 'RouteGuard',
    description: 'A safeguard, no opinion: a small exact search over captures, checks and promotions.',
  });

export const routeStepSchema = z
  .object({
    to: squareSchema,
    safe: z.boolean().describe('The enemy gains nothing by capturing the man there.'),
    attackedBy: squaresSchema.describe('Enemy men that attack it there, cheapest first.'),
    guardedBy: squaresSchema.describe('Own men that guard it there, cheapest first.'),
    pawnHit: z
      .object({ from: squareSchema, moves: z.int().min(0) })
      .nullable()
      .describe('The enemy pawn that can hit it there soonest, and in how many pawn moves.'),
  })
  .meta({ id: 'RouteStep', description: 'One stop of a route.' });

export const routeChoiceSchema = z
  .object({
    man: squareSchema,
    kind: kindSchema,
    post: squareSchema,
    moves: z.int().min(1).describe('Own moves of the man: as many as stops.'),
    stops: squaresSchema.describe('The shown route, from the first stop to the post.'),
    shortest: z.int().min(1).describe('How many safe routes of this length there are.'),
    steps: z.array(routeStepSchema),
    parts: z
      .record(z.string(), z.object({ now: z.number(), there: z.number() }))
      .describe('The counts that rank it, with the man where it stands and on the post.'),
    gain: z.number().describe('Weighted sum of the differences, with the weights of the documented table.'),
    challenge: z
      .object({ by: squareSchema, kind: kindSchema, moves: z.int().min(0) })
      .nullable()
      .describe('Soonest the enemy can dispute the post; 0 moves: he does.'),
    drops: z.array(z.object({ square: squareSchema, loses: z.number() })).describe('Duties left behind.'),
    preparations: z
      .array(z.object({ move: z.string(), moves: z.int().min(2) }))
      .describe('Own moves, in SAN, that make the route possible or shorter; total moves with them.'),
    needs: z.string().nullable().describe('The preparation that must be played first; null where none must.'),
    guard: guardSchema,
    text: z.string().describe('The same in sentences.'),
  })
  .meta({ id: 'RouteChoice', description: 'A man, a post, and the way there.' });

export const routesAnswerSchema = z
  .object({
    engine: z.string(),
    fen: z.string(),
    side: sideSchema,
    weights: z
      .record(z.string(), z.number())
      .describe('What one more of each part counts: the documented table by which the choices are ranked.'),
    choices: z.array(routeChoiceSchema).describe('Best first; one a man and post.'),
  })
  .meta({ id: 'RoutesAnswer', description: 'Where a side’s men belong and how they get there.' });

export const checkedStepSchema = z
  .object({
    to: squareSchema,
    code: z
      .enum(STEP_CODES)
      .describe(
        'fine; not-a-move; own-man or captures: the square is taken; exposes-king; gives-check before the last step; unsafe: lost by exchange; loses: the guard sees something lost.',
      ),
    loses: z.number().describe('Pawns lost by exchange on the square.'),
    step: routeStepSchema.nullable().describe('Null where the step is no move.'),
    guard: guardSchema.nullable(),
    reason: z.string().describe('The verdict in a sentence.'),
  })
  .meta({ id: 'CheckedStep', description: 'The verdict of one step of a given route.' });

export const routeCheckSchema = z
  .object({
    engine: z.string(),
    fen: z.string(),
    side: sideSchema,
    man: squareSchema,
    kind: kindSchema,
    steps: z.array(checkedStepSchema).describe('Steps in order; none after one that is no move.'),
    firstFault: z.int().min(0).nullable().describe('Place of the first step that is not fine, from 0.'),
    holds: z.boolean().describe('All steps are fine.'),
  })
  .meta({ id: 'RouteCheck', description: 'A route that a person gave, step by step.' });

export type RouteGuard = z.infer<typeof guardSchema>;
export type RouteStep = z.infer<typeof routeStepSchema>;
export type RouteChoice = z.infer<typeof routeChoiceSchema>;
export type RoutesAnswer = z.infer<typeof routesAnswerSchema>;
export type CheckedStep = z.infer<typeof checkedStepSchema>;
export type RouteCheck = z.infer<typeof routeCheckSchema>;
