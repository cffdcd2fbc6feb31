/** Files of any size, game by game: no more than a piece of the file and one game are held. */
import { type PgnGame, pgnText, plainLines } from './pgn';
import { PgnReader } from './pgn-reader';

/** A game longer than this is no game: what there is of it is read as if the file ended there. In characters. */
export const GAME_LENGTH_MAX = 2_000_000;

const NEWLINE = 10;

/**
 * The games of a file that comes in pieces of bytes, numbered and with lines as in the whole file. Each piece is decoded
 * by itself up to its last line end, so that old and new alphabets may be mixed. UTF-16 is read by `pgnText` only.
 */
export async function* pgnStream(pieces: AsyncIterable<Uint8Array> | Iterable<Uint8Array>): AsyncGenerator<PgnGame> {
  let bytes = new Uint8Array(0);
  let text = '';
  let line = 1;
  let number = 1;
  for await (const piece of pieces) {
    const joined = joinedBytes(bytes, piece);
    const end = joined.lastIndexOf(NEWLINE) + 1;
    bytes = joined.subarray(end);
    if (end === 0) continue;
    text += plainLines(pgnText(joined.subarray(0, end)));
    const reader = new PgnReader(text, line);
    const isFull = text.length > GAME_LENGTH_MAX;
    let rest = { at: 0, line };
    for (let game = reader.next(number); game; game = reader.next(number)) {
      // A game at the very end may go on in the next piece, and so may a comment that has no end yet.
      if (!isFull && (!reader.ended || reader.place.at === text.length)) break;
      yield game;
      number++;
      rest = reader.place;
    }
    text = text.slice(rest.at);
    line = rest.line;
  }
  const reader = new PgnReader(text + plainLines(pgnText(bytes)), line);
  for (let game = reader.next(number); game; game = reader.next(number)) {
    yield game;
    number++;
  }
}

function joinedBytes(first: Uint8Array, second: Uint8Array): Uint8Array<ArrayBuffer> {
  const joined = new Uint8Array(first.length + second.length);
  joined.set(first);
  joined.set(second, first.length);
  return joined;
}
