/** What must hold of men, rights and checks before a position can have come from play. */
import { SIDES, type Side, type Square } from '../types';
import { type Fault, fault } from './fault';
import { inWords } from './fen-board';
import { EDGES, KNIGHT_LEAPS, LEAP_ROW, STRIDES } from './geometry';
import { type CastlingRights, manCode, NO_CASTLING } from './position';
import { ahead, colourOf, kingDistance, rankOf, relativeRank, squareName, step } from './squares';

/** Men of one side that a diagram may hold: the attack map keeps one bit a man. */
export const MEN_MAX = 32;

const SIDE_NAMES = { white: 'White', black: 'Black' } as const;

function squaresWith(board: Readonly<Uint8Array>, code: number): Square[] {
  const squares: Square[] = [];
  for (let at = board.indexOf(code); at >= 0; at = board.indexOf(code, at + 1)) squares.push(at as Square);
  return squares;
}

/** Faults of the men alone: kings, edge pawns, impossible counts. */
export function menFaults(board: Readonly<Uint8Array>): Fault[] {
  const faults: Fault[] = [];
  for (const side of SIDES) {
    const who = SIDE_NAMES[side];
    const kings = squaresWith(board, manCode(side, 'king')).length;
    if (kings === 0) faults.push(fault('board', 'no-king', `${who} has no king.`));
    if (kings > 1) faults.push(fault('board', 'many-kings', `${who} has ${kings} kings; there is one a side.`));
  }
  for (const side of SIDES) {
    for (const square of squaresWith(board, manCode(side, 'pawn'))) {
      if (rankOf(square) !== 0 && rankOf(square) !== 7) continue;
      const name = squareName(square);
      faults.push(
        fault(
          'board',
          'pawn-on-edge',
          `A pawn stands on ${name}; no pawn ever stands on the first or last rank.`,
          name,
        ),
      );
    }
  }
  for (const side of SIDES) faults.push(...countFaults(board, side));
  return faults;
}

function countFaults(board: Readonly<Uint8Array>, side: Side): Fault[] {
  const who = SIDE_NAMES[side];
  const count = (kind: Parameters<typeof manCode>[1]) => squaresWith(board, manCode(side, kind)).length;
  const pawns = count('pawn');
  const total = board.reduce((sum, code) => sum + (code !== 0 && code >> 3 === (side === 'white' ? 0 : 1) ? 1 : 0), 0);
  if (total > MEN_MAX) {
    return [
      fault(
        'board',
        'too-many-men',
        `${who} has ${total} men; Waypost reads at most ${MEN_MAX} of one side, even in diagrams.`,
      ),
    ];
  }
  const bishops = squaresWith(board, manCode(side, 'bishop'));
  const lightBishops = bishops.filter((square) => colourOf(square) === 'light').length;
  const faults: Fault[] = [];
  if (pawns > 8) faults.push(fault('board', 'too-many-pawns', `${who} has ${pawns} pawns; there are at most eight.`));
  if (total > 16)
    faults.push(fault('board', 'men-count', `${who} has ${total} men; a game starts with sixteen a side.`));
  const promoted =
    Math.max(0, count('knight') - 2) +
    // One bishop a colour of squares is there from the start; it can never change to the other.
    Math.max(0, lightBishops - 1) +
    Math.max(0, bishops.length - lightBishops - 1) +
    Math.max(0, count('rook') - 2) +
    Math.max(0, count('queen') - 1);
  const gone = 8 - pawns;
  if (gone >= 0 && total <= 16 && promoted > gone) {
    const men = promoted === 1 ? 'one man' : `${inWords(promoted)} men`;
    const goneText = gone === 0 ? 'no pawn is' : gone === 1 ? 'only one pawn is' : `only ${inWords(gone)} pawns are`;
    faults.push(fault('board', 'promoted-count', `${who} must have ${men} from promotion, but ${goneText} gone.`));
  }
  return faults;
}

/** The first man met from a square in a direction, -1 where there is none. */
function firstMan(board: Readonly<Uint8Array>, from: Square, direction: number): number {
  const edge = EDGES[(from << 3) | direction]!;
  for (let at: number = from; at !== edge; ) {
    at += STRIDES[direction]!;
    if (board[at] !== 0) return at;
  }
  return -1;
}

/** Squares of the men of a side that attack a square. */
export function attackersOnBoard(board: Readonly<Uint8Array>, side: Side, square: Square): Square[] {
  const found: Square[] = [];
  const shift = side === 'white' ? 0 : 8;
  for (let at = square * LEAP_ROW, from = KNIGHT_LEAPS[at]!; from >= 0; from = KNIGHT_LEAPS[++at]!) {
    if (board[from] === shift + 2) found.push(from as Square);
  }
  for (let direction = 0; direction < 8; direction++) {
    const from = firstMan(board, square, direction);
    if (from < 0) continue;
    const kind = board[from]! - shift;
    const near = kingDistance(square, from as Square) === 1;
    const slides = kind === 5 || kind === (direction < 4 ? 4 : 3);
    // A white pawn strikes upwards, so it is met by looking down from the square.
    const pawnStrikes = kind === 1 && near && direction >= 4 && STRIDES[direction]! < 0 === (side === 'white');
    if (slides || pawnStrikes || (kind === 6 && near)) found.push(from as Square);
  }
  return found;
}

/** Faults of checks: the side that is not to move stands in check, or more men give check than can. */
export function checkFaults(board: Readonly<Uint8Array>, sideToMove: Side): Fault[] {
  const faults: Fault[] = [];
  const waiting: Side = sideToMove === 'white' ? 'black' : 'white';
  const checkersOf = (side: Side) => {
    const [king] = squaresWith(board, manCode(side, 'king'));
    return king === undefined ? [] : attackersOnBoard(board, side === 'white' ? 'black' : 'white', king);
  };
  const [checker] = checkersOf(waiting);
  if (checker !== undefined) {
    const name = squareName(checker);
    faults.push(
      fault(
        'side',
        'opponent-in-check',
        `${SIDE_NAMES[waiting]} is in check from ${name}, but ${SIDE_NAMES[sideToMove]} is to move.`,
        name,
      ),
    );
  }
  const checkers = checkersOf(sideToMove);
  if (checkers.length > 2) {
    faults.push(
      fault(
        'board',
        'too-many-checks',
        `${SIDE_NAMES[sideToMove]} is in check from ${checkers.length} men; two are the most that a move can give.`,
      ),
    );
  }
  return faults;
}

const CASTLING_SQUARES = [
  ['whiteKing', 'K', 4, 7, 'white'],
  ['whiteQueen', 'Q', 4, 0, 'white'],
  ['blackKing', 'k', 60, 63, 'black'],
  ['blackQueen', 'q', 60, 56, 'black'],
] as const;

/** Faults of castling rights against the squares of kings and rooks. */
export function castlingFaults(board: Readonly<Uint8Array>, rights: CastlingRights): Fault[] {
  const faults: Fault[] = [];
  for (const [right, letter, king, rook, side] of CASTLING_SQUARES) {
    if (!rights[right]) continue;
    for (const [square, kind] of [
      [king, 'king'],
      [rook, 'rook'],
    ] as const) {
      if (board[square] === manCode(side, kind)) continue;
      const name = squareName(square as Square);
      faults.push(
        fault(
          'castling',
          'castling-squares',
          `Castling "${letter}" needs ${SIDE_NAMES[side]}’s ${kind} on ${name}.`,
          name,
        ),
      );
    }
  }
  return faults;
}

/** The rights that king and rook stand ready for; the others are dropped. */
export function soundRights(board: Readonly<Uint8Array>, rights: CastlingRights): CastlingRights {
  const isSound = (right: keyof CastlingRights) =>
    rights[right] && castlingFaults(board, { ...NO_CASTLING, [right]: true }).length === 0;
  return {
    whiteKing: isSound('whiteKing'),
    whiteQueen: isSound('whiteQueen'),
    blackKing: isSound('blackKing'),
    blackQueen: isSound('blackQueen'),
  };
}

/** Faults of the square passed over by a pawn's double step, against rank, pawn and empty squares. */
export function enPassantFaults(board: Readonly<Uint8Array>, sideToMove: Side, square: Square): Fault[] {
  const name = squareName(square);
  if (relativeRank(square, sideToMove) !== 6) {
    const rank = sideToMove === 'white' ? 'sixth' : 'third';
    return [
      fault(
        'enPassant',
        'en-passant-rank',
        `With ${SIDE_NAMES[sideToMove]} to move a pawn can be taken in passing on the ${rank} rank only, not on ${name}.`,
        name,
      ),
    ];
  }
  const mover: Side = sideToMove === 'white' ? 'black' : 'white';
  const pawn = ahead(square, mover);
  const origin = step(square, 0, mover === 'white' ? -1 : 1);
  if (pawn === undefined || board[pawn] !== manCode(mover, 'pawn')) {
    const there = pawn === undefined ? name : squareName(pawn);
    return [
      fault(
        'enPassant',
        'en-passant-pawn',
        `No ${mover} pawn stands on ${there}, so none has just passed ${name}.`,
        name,
      ),
    ];
  }
  if (board[square] !== 0 || (origin !== undefined && board[origin] !== 0)) {
    return [
      fault(
        'enPassant',
        'en-passant-blocked',
        `A pawn cannot have passed ${name}: its way from its first square is not empty.`,
        name,
      ),
    ];
  }
  return [];
}
