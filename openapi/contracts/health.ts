/** Whether the service lives and is ready. */
import { z } from 'zod';
import { contract, json } from '../contract';

export const getHealth = contract({
  id: 'getHealth',
  method: 'GET',
  path: '/api/health',
  tag: 'About',
  scope: 'open',
  summary: 'Live and ready',
  description: 'Answers as long as the service lives; "ready" says that it takes work.',
  reply: json(
    z
      .object({
        status: z.enum(['ready']),
        engine: z.string().describe('Version of the computations.'),
        uptimeSeconds: z.number().min(0),
      })
      .meta({ id: 'Health' }),
  ),
  errors: [],
  example: {},
});
