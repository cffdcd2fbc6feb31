/** A board of letters and plain questions to it: nothing here knows the engine. Squares are names. */
import { attacks, lettersOf, slowExchange, slowLoss } from '../slow/exchange';
import { slowReach } from '../slow/reach';

export type SideName = 'white' | 'black';
export const other = (side: SideName): SideName => (side === 'white' ? 'black' : 'white');

const LETTER: Readonly<Record<string, string>> = {
  pawn: 'p',
  knight: 'n',
  bishop: 'b',
  rook: 'r',
  queen: 'q',
  king: 'k',
};

export const indexOf = (name: string): number => name.charCodeAt(0) - 97 + 8 * (Number(name.charAt(1)) - 1);
export const nameOf = (index: number): string => `${'abcdefgh'.charAt(index % 8)}${Math.floor(index / 8) + 1}`;
export const fileOf = (name: string): number => name.charCodeAt(0) - 97;
/** Rank as the side counts it, 1 to 8. */
export const relative = (name: string, side: SideName): number =>
  side === 'white' ? Number(name.charAt(1)) : 9 - Number(name.charAt(1));
/** The square on a file and relative rank, undefined off the board. */
export function at(file: number, rank: number, side: SideName): string | undefined {
  if (file < 0 || file > 7 || rank < 1 || rank > 8) return undefined;
  return `${'abcdefgh'.charAt(file)}${side === 'white' ? rank : 9 - rank}`;
}
export const isLight = (name: string): boolean => (fileOf(name) + Number(name.charAt(1))) % 2 === 0;
export const ALL = Array.from({ length: 64 }, (_, index) => nameOf(index));

/** One position, asked slowly. */
export class SlowBoard {
  readonly letters: string[];
  readonly toMove: SideName;
  /** The square on which a pawn of the side to move may capture in passing. */
  readonly passing: string | null;

  constructor(fen: string) {
    const [, side, , passing = '-'] = fen.split(' ');
    this.letters = lettersOf(fen);
    this.toMove = side === 'b' ? 'black' : 'white';
    this.passing = passing === '-' ? null : passing;
  }

  /** The board after a move, whoever is to move. */
  played(from: string, to: string): SlowBoard {
    const after = new SlowBoard('8/8/8/8/8/8/8/8 w');
    after.letters.splice(0, 64, ...this.letters);
    after.letters[indexOf(to)] = this.letter(from);
    after.letters[indexOf(from)] = '';
    return after;
  }

  letter(square: string): string {
    return this.letters[indexOf(square)] ?? '';
  }

  sideOn(square: string): SideName | null {
    const letter = this.letter(square);
    return letter === '' ? null : letter === letter.toUpperCase() ? 'white' : 'black';
  }

  kindOn(square: string): string | null {
    const letter = this.letter(square).toLowerCase();
    return Object.entries(LETTER).find(([, each]) => each === letter)?.[0] ?? null;
  }

  is(square: string, side: SideName, kind: string): boolean {
    return this.sideOn(square) === side && this.kindOn(square) === kind;
  }

  men(side: SideName, kind?: string): string[] {
    return ALL.filter((square) => this.sideOn(square) === side && (kind === undefined || this.kindOn(square) === kind));
  }

  attackers(side: SideName, square: string): string[] {
    return this.men(side).filter((from) => attacks(this.letters, indexOf(from), indexOf(square)));
  }

  attacks(from: string, square: string): boolean {
    return attacks(this.letters, indexOf(from), indexOf(square));
  }

  seen(from: string): string[] {
    return ALL.filter((square) => this.attacks(from, square));
  }

  /** Pawns gained by the enemy of the man on the square by capturing it; 0 where nothing. */
  enPrise(square: string): number {
    return Math.max(0, slowExchange(this.letters, this.sideOn(square) !== 'white', indexOf(square)) ?? 0);
  }

  /** What the enemy gains by capturing a man of the kind put on the square, taken off its origin. */
  loss(side: SideName, kind: string, square: string, origin: string | null): number {
    const letter = LETTER[kind] ?? '';
    return slowLoss(
      this.letters,
      side === 'white' ? letter.toUpperCase() : letter,
      indexOf(square),
      origin === null ? -1 : indexOf(origin),
    );
  }

  /** Who commands the square, tested with a knight of each side. */
  command(square: string): string {
    const white = this.loss('white', 'knight', square, null) === 0;
    const black = this.loss('black', 'knight', square, null) === 0;
    return white ? (black ? 'open' : 'white') : black ? 'black' : 'disputed';
  }

  reach(from: string, movesMax = 3): Map<string, number> {
    return new Map(
      [...slowReach(this.letters, indexOf(from), movesMax)].map(([square, moves]) => [nameOf(square), moves]),
    );
  }

  /** The first man from a square by steps of file and rank, null where there is none. */
  first(from: string, files: number, ranks: number): string | null {
    for (let file = fileOf(from) + files, rank = Number(from.charAt(1)) + ranks; ; file += files, rank += ranks) {
      const square = at(file, rank, 'white');
      if (square === undefined) return null;
      if (this.letter(square) !== '') return square;
    }
  }

  /** Moves of the man: pseudo-legal, pins kept, no castling. */
  moves(from: string): string[] {
    const side = this.sideOn(from) ?? 'white';
    const king = this.men(side, 'king')[0];
    const enemy = other(side);
    const targets = ALL.filter((to) => {
      if (to === this.passing && side === this.toMove && this.kindOn(from) === 'pawn' && this.attacks(from, to))
        return true;
      if (this.sideOn(to) === side || this.kindOn(to) === 'king') return false;
      if (this.kindOn(from) !== 'pawn') return this.attacks(from, to);
      if (this.sideOn(to) === enemy) return this.attacks(from, to);
      const next = at(fileOf(from), relative(from, side) + 1, side);
      const second = relative(from, side) === 2 ? at(fileOf(from), 4, side) : undefined;
      const free = next !== undefined && this.letter(next) === '';
      return (to === next && free) || (to === second && free && this.letter(to) === '');
    });
    if (!king || from === king) return targets;
    return targets.filter((to) => {
      const after = this.letters.map((letter, index) =>
        index === indexOf(to) ? this.letter(from) : index === indexOf(from) ? '' : letter,
      );
      const sliders = this.men(enemy).filter(
        (each) => each !== to && ['bishop', 'rook', 'queen'].includes(this.kindOn(each) ?? ''),
      );
      return !sliders.some(
        (each) => attacks(after, indexOf(each), indexOf(king)) && !attacks(this.letters, indexOf(each), indexOf(king)),
      );
    });
  }

  safeMoves(from: string): string[] {
    const side = this.sideOn(from) ?? 'white';
    return this.moves(from).filter((to) => this.loss(side, this.kindOn(from) ?? '', to, from) === 0);
  }

  /** Squares to which the king can step. */
  flights(king: string): string[] {
    const side = this.sideOn(king) ?? 'white';
    return this.seen(king).filter((to) => {
      if (this.sideOn(to) === side || this.kindOn(to) === 'king') return false;
      return this.loss(side, 'king', to, king) === 0;
    });
  }
}
