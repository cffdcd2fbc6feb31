/**
 * A position as plain letters, and what the Laws say of it: who attacks what, who is pinned, where men can go. Slow, and
 * without a line of the engine's. Squares are 0 (a1) to 63 (h8); sides and kinds are plain words.
 */
import { attacks, lettersOf, slowExchange, slowLoss } from '../slow/exchange';
import { slowReach } from '../slow/reach';

export type Side = 'white' | 'black';
export type Kind = 'pawn' | 'knight' | 'bishop' | 'rook' | 'queen' | 'king';

const KIND_OF: Readonly<Record<string, Kind>> = {
  p: 'pawn',
  n: 'knight',
  b: 'bishop',
  r: 'rook',
  q: 'queen',
  k: 'king',
};

export const other = (side: Side): Side => (side === 'white' ? 'black' : 'white');
export const fileOf = (square: number): number => square % 8;
/** Rank as the side counts it, 1 to 8. */
export const rankFor = (side: Side, square: number): number =>
  side === 'white' ? Math.floor(square / 8) + 1 : 8 - Math.floor(square / 8);
export const nameOf = (square: number): string => `${'abcdefgh'.charAt(square % 8)}${Math.floor(square / 8) + 1}`;
export const squareOf = (name: string): number => 'abcdefgh'.indexOf(name.charAt(0)) + 8 * (Number(name.charAt(1)) - 1);
export const fileLetter = (file: number): string => 'abcdefgh'.charAt(file);
export const colourOf = (square: number): 'light' | 'dark' =>
  (fileOf(square) + Math.floor(square / 8)) % 2 === 0 ? 'dark' : 'light';
/** The square so many files to the right and ranks forward, as the side looks at the board from its own end; -1 off it. */
export function step(side: Side, from: number, files: number, ranks: number): number {
  const file = fileOf(from) + files;
  const rank = Math.floor(from / 8) + (side === 'white' ? ranks : -ranks);
  return file < 0 || file > 7 || rank < 0 || rank > 7 ? -1 : rank * 8 + file;
}
export const letterFor = (side: Side, letter: string): string =>
  side === 'white' ? letter.toUpperCase() : letter.toLowerCase();

/** One position, asked about in plain words. */
export class Scene {
  readonly board: readonly string[];
  readonly mover: Side;
  /** The square on which a pawn may capture in passing; -1 for none. */
  readonly passing: number;
  readonly #reach = new Map<number, Map<number, number>>();
  readonly #safeMoves = new Map<number, number[]>();
  readonly #command = new Map<number, Side | 'open' | 'disputed'>();

  constructor(board: readonly string[], mover: Side, passing = -1) {
    this.board = board;
    this.mover = mover;
    this.passing = passing;
  }

  static ofFen(fen: string): Scene {
    const [, mover, , passing = '-'] = fen.split(' ');
    return new Scene(lettersOf(fen), mover === 'b' ? 'black' : 'white', passing === '-' ? -1 : squareOf(passing));
  }

  /** The same with another board. */
  with(board: readonly string[]): Scene {
    return new Scene(board, this.mover, -1);
  }

  /** The board after the man on one square has gone to another. */
  moved(from: number, to: number): Scene {
    return this.with(this.board.map((man, at) => (at === to ? (this.board[from] ?? '') : at === from ? '' : man)));
  }

  /** The board without the man on a square. */
  without(square: number): Scene {
    return this.with(this.board.map((man, at) => (at === square ? '' : man)));
  }

  letter(square: number): string {
    return this.board[square] ?? '';
  }

  sideOn(square: number): Side | null {
    const letter = this.letter(square);
    return letter === '' ? null : letter === letter.toUpperCase() ? 'white' : 'black';
  }

  kindOn(square: number): Kind | null {
    return KIND_OF[this.letter(square).toLowerCase()] ?? null;
  }

  men(side: Side, ...kinds: readonly Kind[]): number[] {
    return [...this.board.keys()].filter((at) => {
      const kind = this.kindOn(at);
      return kind !== null && this.sideOn(at) === side && (kinds.length === 0 || kinds.includes(kind));
    });
  }

  pawns(side: Side): number[] {
    return this.men(side, 'pawn');
  }

  hasPawn(side: Side, square: number): boolean {
    return this.letter(square) === letterFor(side, 'p');
  }

  king(side: Side): number {
    return this.board.indexOf(letterFor(side, 'k'));
  }

  /** Squares that the man attacks. */
  seen(from: number): number[] {
    return [...this.board.keys()].filter((to) => attacks(this.board, from, to));
  }

  /** Men of the side that attack the square. */
  attackers(side: Side, square: number): number[] {
    return this.men(side).filter((from) => attacks(this.board, from, square));
  }

  /** The man that pins the one on the square to its king; -1 where it is not pinned. */
  pinner(square: number): number {
    const side = this.sideOn(square);
    if (side === null) return -1;
    const king = this.king(side);
    if (king < 0 || king === square) return -1;
    const bare = this.without(square);
    const enemies = this.men(other(side));
    return enemies.find((from) => attacks(bare.board, from, king) && !attacks(this.board, from, king)) ?? -1;
  }

  /** Moves with pins kept: castling and captures of kings left out, kings may step into check. */
  moves(from: number): number[] {
    const side = this.sideOn(from);
    if (side === null) return [];
    const targets = this.seen(from).filter((to) => {
      if (this.kindOn(to) === 'king' || this.sideOn(to) === side) return false;
      return this.kindOn(from) !== 'pawn' || this.letter(to) !== '' || (to === this.passing && side === this.mover);
    });
    if (this.kindOn(from) === 'pawn') targets.push(...this.advances(from));
    const pinner = this.pinner(from);
    const king = this.king(side);
    return targets.filter((to) => pinner < 0 || to === pinner || !attacks(this.moved(from, to).board, pinner, king));
  }

  /** Squares to which a pawn can step straight on now. */
  advances(from: number): number[] {
    const side = this.sideOn(from) ?? 'white';
    const one = step(side, from, 0, 1);
    if (one < 0 || this.letter(one) !== '') return [];
    const two = step(side, from, 0, 2);
    return rankFor(side, from) === 2 && this.letter(two) === '' ? [one, two] : [one];
  }

  safeMoves(from: number): number[] {
    const known = this.#safeMoves.get(from);
    if (known) return known;
    const found = this.moves(from).filter((to) => slowLoss(this.board, this.letter(from), to, from) === 0);
    this.#safeMoves.set(from, found);
    return found;
  }

  /** Safe moves to each square, up to three, the enemy standing still; squares out of reach are missing. */
  reach(from: number): Map<number, number> {
    const known = this.#reach.get(from);
    if (known) return known;
    const found = slowReach(this.board, from, 3);
    this.#reach.set(from, found);
    return found;
  }

  /** What the side gains, in pawns, by capturing on the square: never below 0. */
  gain(side: Side, square: number): number {
    return Math.max(0, slowExchange(this.board, side === 'white', square) ?? 0);
  }

  /** Whether a man of the side, given by its letter and put on the square, is lost there in part or whole. */
  lost(side: Side, letter: string, square: number, origin = -1): boolean {
    return slowLoss(this.board, letterFor(side, letter), square, origin) > 0;
  }

  /** Who commands a square: a knight of each side is put there. */
  command(square: number): Side | 'open' | 'disputed' {
    const known = this.#command.get(square);
    if (known) return known;
    const [white, black] = [!this.lost('white', 'n', square), !this.lost('black', 'n', square)];
    const found = white ? (black ? 'open' : 'white') : black ? 'black' : 'disputed';
    this.#command.set(square, found);
    return found;
  }
}
