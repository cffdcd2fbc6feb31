/** Editing a position: men moved, put and taken off, each edit giving a position that the engine has admitted. */
import { formatFen, manOn, type Position, parseFen, soundRights, withMen } from '@/engine/board';
import { type Man, opponent, type Square } from '@/engine/types';

/**
 * The position after some squares are set anew. It is read strictly where it is legal and as a diagram where
 * it is not, so that editing never stops half-way. Castling rights stay while king and rook stand.
 * Undefined where not even a diagram can hold it (more than 32 men of one side).
 */
export function edited(
  position: Position,
  changes: readonly { square: Square; man: Man | null }[],
): Position | undefined {
  const next = withMen(position, changes);
  return admitted({ ...next, castling: position.castling, halfmoves: 0 });
}

/** The man on one square moved to another, whatever stands there taken off. The same position where there is nothing to move. */
export function withManMoved(position: Position, from: Square, to: Square): Position | undefined {
  const man = manOn(position, from);
  if (!man || from === to) return position;
  return edited(position, [
    { square: from, man: null },
    { square: to, man },
  ]);
}

/** The same men with the other side to move. */
export function withSideChanged(position: Position): Position | undefined {
  return admitted({ ...position, sideToMove: opponent(position.sideToMove), enPassant: null });
}

/** The position as the FEN door admits it, rights that cannot be left out: strict if it can be, else as a diagram. */
export function admitted(position: Position): Position | undefined {
  const text = formatFen({ ...position, castling: soundRights(position.board, position.castling) });
  const strict = parseFen(text, 'strict');
  if (strict.ok) return strict.value.position;
  const diagram = parseFen(text, 'diagram');
  return diagram.ok ? diagram.value.position : undefined;
}
