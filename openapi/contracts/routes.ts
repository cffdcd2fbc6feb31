/** Where men belong and how they get there; a given route checked. */
import { routeCheckSchema, routesAnswerSchema } from '../../engine/reading/schema/routes';
import { contract, json } from '../contract';
import { EXAMPLE_FEN } from '../schemas/examples';
import { routeCheckRequestSchema, routesRequestSchema } from '../schemas/routes';

export const createRoutes = contract({
  id: 'createRoutes',
  method: 'POST',
  path: '/api/v1/routes',
  tag: 'Routes',
  scope: 'compute',
  summary: 'Find posts and routes',
  description:
    'Ranks the posts of one man, or of all men of a side, with the counts that rank them, the safe ways there, what must be prepared first, who can dispute the post, and what a small exact search says. An aid to judgement: the weights are in the answer.',
  body: { schema: routesRequestSchema, bytesMax: 4096 },
  reply: json(routesAnswerSchema, 'sampled'),
  errors: ['fen-refused'],
  example: { body: { fen: EXAMPLE_FEN, man: 'f3', choicesMax: 3 } },
});

export const createRouteCheck = contract({
  id: 'createRouteCheck',
  method: 'POST',
  path: '/api/v1/routes/check',
  tag: 'Routes',
  scope: 'compute',
  summary: 'Check a route',
  description: 'A verdict for each step of a route that a person gives, with its reason, the enemy standing still.',
  body: { schema: routeCheckRequestSchema, bytesMax: 4096 },
  reply: json(routeCheckSchema, 'sampled'),
  errors: ['fen-refused'],
  example: { body: { fen: EXAMPLE_FEN, route: ['f3', 'd2', 'b3'] } },
});
