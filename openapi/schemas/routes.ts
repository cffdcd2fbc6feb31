/** What the calls about routes take. */
import { z } from 'zod';
import { sideSchema, squareSchema } from '../../engine/reading/schema';
import { CHECKED_STEPS_MAX } from '../../engine/routes';
import { fenSchema } from './ids';

/** Longest route that is looked for, in moves of the man. */
export const ROUTE_MOVES_MAX = 6;
/** Most choices of one answer. */
export const ROUTE_CHOICES_MAX = 40;

export const routesRequestSchema = z
  .strictObject({
    fen: fenSchema,
    man: squareSchema
      .optional()
      .describe('Square of the one knight, bishop, rook or queen to be placed. Left out: all men of the side.'),
    side: sideSchema.optional().describe('Whose men. Left out: the side of the man, else the side to move.'),
    movesMax: z.int().min(1).max(ROUTE_MOVES_MAX).default(4).describe('The longest route, in moves of the man.'),
    choicesMax: z.int().min(1).max(ROUTE_CHOICES_MAX).default(12).describe('The most choices answered.'),
  })
  .meta({ id: 'RoutesRequest', description: 'A position, and whose men are to be placed.' });
export type RoutesRequest = z.infer<typeof routesRequestSchema>;

/** A move in SAN or a square's name is never longer. */
const STEP_LENGTH_MAX = 10;

export const routeCheckRequestSchema = z
  .strictObject({
    fen: fenSchema,
    route: z
      .array(z.string().max(STEP_LENGTH_MAX))
      .min(1)
      .max(CHECKED_STEPS_MAX + 1)
      .describe("Squares, the man's own first, e.g. f3, d2, f1; or its moves in SAN, e.g. Nd2, Nf1."),
  })
  .meta({ id: 'RouteCheckRequest', description: 'A route to be checked step by step.' });
export type RouteCheckRequest = z.infer<typeof routeCheckRequestSchema>;
