/** The exchange test of a position. */
import { ENGINE_VERSION, formatFen } from '@/engine';
import { exchangeTest } from '@/engine/compare';
import type { ExchangeTestAnswer } from '@/engine/reading/schema/compare';
import { positionOf } from '@/lib/services/readings/position';
import type { ExchangesRequest } from '@/openapi/schemas/compare';

/** Computes the matrix in place. Throws `fen-refused`. */
export function testExchanges({ fen, mode }: ExchangesRequest): ExchangeTestAnswer {
  const position = positionOf(fen, '/fen', mode);
  return { engine: ENGINE_VERSION, fen: formatFen(position), ...exchangeTest(position) } as ExchangeTestAnswer;
}
