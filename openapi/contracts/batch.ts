/** Reading many positions in one request. */
import { contract, lines } from '../contract';
import { EXAMPLE_ENDING, EXAMPLE_FEN } from '../schemas/examples';
import { BATCH_FENS_MAX, batchLineSchema, batchRequestSchema } from '../schemas/readings';

export const createReadings = contract({
  id: 'createReadings',
  method: 'POST',
  path: '/api/v1/readings/batch',
  tag: 'Readings',
  scope: 'compute',
  summary: 'Read many positions',
  description: `Reads up to ${BATCH_FENS_MAX} positions and answers one JSON value a line, in the order of the request, each as soon as it is computed. A FEN that cannot be read is answered in its place.`,
  body: { schema: batchRequestSchema, bytesMax: 262144 },
  reply: lines(batchLineSchema),
  errors: [],
  example: { body: { fens: [EXAMPLE_FEN, EXAMPLE_ENDING, 'not a position'], include: ['lead'] } },
});
