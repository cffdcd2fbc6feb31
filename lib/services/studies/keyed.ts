/** A FEN with the key by which its reading is found. */
import { formatFen } from '@/engine';
import { positionOf } from '@/lib/services/readings/position';

/** The FEN in normal form and its key: the fields that a reading depends on. Diagrams may be kept too. Throws `fen-refused`. */
export function keyed(text: string, path = '/fen'): { readonly fen: string; readonly positionKey: string } {
  const fen = formatFen(positionOf(text, path, 'diagram'));
  return { fen, positionKey: fen.split(' ').slice(0, 4).join(' ') };
}
