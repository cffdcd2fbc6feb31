/** Positions and placements compared; the exchange test. */
import { comparisonSchema, exchangeTestSchema } from '../../engine/reading/schema/compare';
import { contract, json } from '../contract';
import { comparisonRequestSchema, exchangesRequestSchema } from '../schemas/compare';
import { EXAMPLE_FEN } from '../schemas/examples';

const tag = 'Comparisons';

export const createComparison = contract({
  id: 'createComparison',
  method: 'POST',
  path: '/api/v1/comparisons',
  tag,
  scope: 'compute',
  summary: 'Compare positions or placements',
  description:
    'Holds one to three positions against a first: what differs by square, man and theme, what is said of one only, and the difference in sentences. A placement is a position with one man put elsewhere.',
  body: { schema: comparisonRequestSchema, bytesMax: 8192 },
  reply: json(comparisonSchema, 'sampled'),
  errors: ['fen-refused'],
  example: {
    body: {
      subjects: [{ fen: EXAMPLE_FEN }, { fen: EXAMPLE_FEN, place: { from: 'f3', to: 'e5' }, label: 'Knight on e5' }],
    },
  },
});

export const createExchanges = contract({
  id: 'createExchanges',
  method: 'POST',
  path: '/api/v1/exchanges',
  tag,
  scope: 'compute',
  summary: 'Test the trades',
  description:
    'For every pair of men of like worth: what changes when both leave the board, and when it could be offered.',
  body: { schema: exchangesRequestSchema, bytesMax: 4096 },
  reply: json(exchangeTestSchema, 'sampled'),
  errors: ['fen-refused'],
  example: { body: { fen: EXAMPLE_FEN } },
});
