/** A request's FEN as a position of the engine. */
import { parseFen, type Position } from '@/engine';
import type { Mode } from '@/openapi/schemas/ids';
import { fenRefused } from './fen-refused';

/** The position. Throws `fen-refused` with every fault; `path` is the JSON pointer to the FEN in the request. */
export function positionOf(fen: string, path = '/fen', mode: Mode = 'strict'): Position {
  const read = parseFen(fen, mode);
  if (!read.ok) throw fenRefused(read.fault, path);
  return read.value.position;
}
