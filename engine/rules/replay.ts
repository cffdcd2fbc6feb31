/** A game walked on one board: moves by SAN, positions when they are asked for. */
import type { Position } from '../board';
import type { Square } from '../types';
import { AMBIGUOUS, findSan, sanOf, UNREADABLE } from './san';
import { inCheck, make, newUndo, type ScratchBoard, scratchBoard } from './scratch-board';

/** A move that was made, packed as the scratch board packs moves. */
export interface Step {
  readonly from: Square;
  readonly to: Square;
  /** Code of the man that moved (of the pawn, where it was promoted). */
  readonly man: number;
  /** Code of the man that was taken, 0 for none; and where it stood. */
  readonly captured: number;
  readonly capturedOn: Square;
  /** Place of the kind it was promoted to; 0 for none. */
  readonly promoted: number;
  readonly castling: 'king' | 'queen' | null;
  readonly san: string;
}

/** Why a text names no move: it is no move at all, none like it is legal, several are, or it passes where one cannot. */
export type StepRefusal = 'unreadable-move' | 'illegal-move' | 'ambiguous-move' | 'null-move';

/** How programs write that a side passes: no move of the standard, but often seen in variations. */
const NULL_MOVES: ReadonlySet<string> = new Set(['--', 'Z0', 'null', '0000', '@@@@']);

/** A board that moves forward. */
export class Walk {
  readonly #board: ScratchBoard;
  readonly #mode: Position['mode'];
  readonly #undo = newUndo();
  #halfmoves: number;
  #fullmove: number;

  constructor(start: Position) {
    this.#board = scratchBoard(start);
    this.#mode = start.mode;
    this.#halfmoves = start.halfmoves;
    this.#fullmove = start.fullmove;
  }

  /** Number of the move to be made, and who makes it. */
  get turn(): { readonly fullmove: number; readonly side: 'white' | 'black' } {
    return { fullmove: this.#fullmove, side: this.#board.side === 0 ? 'white' : 'black' };
  }

  /** Lets the side to move pass, where the text says so and it is not in check. */
  pass(text: string): boolean {
    const board = this.#board;
    if (!NULL_MOVES.has(text) || inCheck(board, board.side)) return false;
    board.side ^= 1;
    board.passing = -1;
    this.#halfmoves++;
    if (board.side === 0) this.#fullmove++;
    return true;
  }

  /** Makes the move that a text names, or says why there is none. */
  step(text: string): Step | StepRefusal {
    const board = this.#board;
    const move = findSan(board, text);
    if (move < 0) {
      if (NULL_MOVES.has(text)) return 'null-move';
      return move === UNREADABLE ? 'unreadable-move' : move === AMBIGUOUS ? 'ambiguous-move' : 'illegal-move';
    }
    const san = sanOf(board, move);
    const from = (move & 63) as Square;
    const special = move >> 16;
    const man = board.men[from]!;
    const undo = this.#undo;
    make(board, move, undo);
    this.#halfmoves = (man & 7) === 1 || undo.captured !== 0 ? 0 : this.#halfmoves + 1;
    if (board.side === 0) this.#fullmove++;
    return {
      from,
      to: ((move >> 6) & 63) as Square,
      man,
      captured: undo.captured,
      capturedOn: undo.capturedOn as Square,
      promoted: (move >> 12) & 15,
      castling: special === 3 ? 'king' : special === 4 ? 'queen' : null,
      san,
    };
  }

  /** The position as it stands, on a board of its own. */
  position(): Position {
    const { men, side, rights, passing } = this.#board;
    return {
      mode: this.#mode,
      board: Uint8Array.from(men),
      sideToMove: side === 0 ? 'white' : 'black',
      castling: {
        whiteKing: (rights & 1) !== 0,
        whiteQueen: (rights & 2) !== 0,
        blackKing: (rights & 4) !== 0,
        blackQueen: (rights & 8) !== 0,
      },
      enPassant: passing < 0 ? null : (passing as Square),
      halfmoves: this.#halfmoves,
      fullmove: this.#fullmove,
    };
  }

  /** The same board in a walk of its own, for a variation. */
  fork(): Walk {
    return new Walk(this.position());
  }
}
