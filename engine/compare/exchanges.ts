/**
 * The exchange test: every pair of men that could be traded, and what each side gains when both leave the board.
 *
 * Minor men are traded for minor men, rooks for rooks, queens for queens; the turn stays as it is. A trade can be
 * offered where one of the two attacks the other, now or after safe moves of its own, the enemy standing still.
 */
import { formatFen, type Position, squareNamed } from '../board';
import type { Reach } from '../reach';
import { newDesk, readBoard, readValues } from '../reading';
import { bears } from '../routes';
import { bySide, type Kind, type Side, type Square, type SquareName } from '../types';
import { compareBoards } from './compare';
import { gainOf } from './counts';
import type { BalanceLine, DifferenceSentence } from './difference';
import type { Board } from './given';
import { without } from './placement';

/** A man that can be traded. */
export interface Trader {
  readonly square: SquareName;
  readonly kind: Kind;
}

/** One trade: a cell of the matrix. */
export interface Exchange {
  readonly white: Trader;
  readonly black: Trader;
  /** Own moves until each side's man attacks the other: 0 now, null not within three. */
  readonly offers: { readonly white: number | null; readonly black: number | null };
  /** The position with both men gone. */
  readonly fen: string;
  readonly balance: readonly BalanceLine[];
  /** Themes whose balance moves towards each side. */
  readonly themes: { readonly white: number; readonly black: number };
  /** What is said for and against each side, counted and weighed. */
  readonly reasons: readonly Reason[];
  /** The points of the reasons of each side, added up; they only order. */
  readonly points: { readonly white: number; readonly black: number };
  /** The side that the trade helps; null where the points differ by less than one. */
  readonly helps: Side | null;
  readonly sentences: readonly DifferenceSentence[];
}

/** So many sentences of one kind for or against a side, and the points that they add up to. */
export interface Reason {
  readonly id: DifferenceSentence['id'];
  readonly side: Side;
  readonly good: boolean;
  readonly times: number;
  readonly points: number;
}

export interface ExchangeTest {
  readonly white: readonly Trader[];
  readonly black: readonly Trader[];
  /** Row by row, White's men being the rows. */
  readonly exchanges: readonly Exchange[];
}

/** Sentences of a cell. */
const SENTENCES_MAX = 5;
/** Points in which the sides must differ for a trade to help one of them. */
const HELPS_MIN = 1;

/** All trades of a position, with what each changes. */
export function exchangeTest(position: Position): ExchangeTest {
  const before = readBoard(position);
  const { reach } = readValues(position);
  const desk = newDesk();
  const traders = (side: Side): Trader[] =>
    before.men
      .filter((man) => man.side === side && classOf(man.kind) > 0)
      .map(({ square, kind }) => ({ square, kind }));
  const [white, black] = [traders('white'), traders('black')];
  const exchanges = white.flatMap((own) =>
    black.flatMap((other) =>
      classOf(own.kind) === classOf(other.kind) ? exchange(position, before, reach, own, other, desk) : [],
    ),
  );
  return { white, black, exchanges };
}

/** Men of one class are traded for each other; 0: never. */
function classOf(kind: Kind): number {
  if (kind === 'knight' || kind === 'bishop') return 1;
  return kind === 'rook' ? 2 : kind === 'queen' ? 3 : 0;
}

function exchange(
  position: Position,
  before: Board,
  reach: Reach,
  white: Trader,
  black: Trader,
  desk: ReturnType<typeof newDesk>,
): Exchange[] {
  const [at, on] = [squareNamed(white.square)!, squareNamed(black.square)!];
  const left = without(position, [at, on]);
  if (!left.ok) return [];
  const { balance, sentences } = compareBoards(before, readBoard(left.value, desk));
  const reasons = reasonsOf(sentences);
  const points = bySide((side) => pointsOf(reasons, side));
  const lead = points.white - points.black;
  return [
    {
      white,
      black,
      offers: { white: offerMoves(position, reach, at, on), black: offerMoves(position, reach, on, at) },
      fen: formatFen(left.value),
      balance,
      themes: { white: themesFor(balance, 'white'), black: themesFor(balance, 'black') },
      reasons,
      points,
      helps: Math.abs(lead) < HELPS_MIN ? null : lead > 0 ? 'white' : 'black',
      sentences: sentences.slice(0, SENTENCES_MAX),
    },
  ];
}

function themesFor(balance: readonly BalanceLine[], side: Side): number {
  return balance.filter((line) => gainOf(line, side) > 0).length;
}

/** What a sentence counts towards its side: what lasts counts more than what is merely so. */
const POINTS: Readonly<Partial<Record<DifferenceSentence['id'], number>>> = {
  'problem-bishop-gone': 6,
  'problem-bishop-made': 6,
  'now-en-prise': 2,
  'en-prise-no-more': 2,
  'target-made': 2,
  'target-gone': 2,
  'outpost-made': 2,
  'outpost-gone': 2,
  'weak-square-made': 2,
  'weak-square-mended': 2,
  'last-guard-gone': 1.5,
  'file-taken': 1.5,
  'bishop-pair-won': 2,
  'bishop-pair-given': 2,
};

/** Points of every other sentence. */
const POINTS_UNSAID = 0.5;

function reasonsOf(sentences: readonly DifferenceSentence[]): Reason[] {
  const reasons = new Map<string, Reason>();
  for (const { id, side, good } of sentences) {
    if (side === null) continue;
    const key = `${id} ${side} ${good}`;
    const times = (reasons.get(key)?.times ?? 0) + 1;
    reasons.set(key, { id, side, good, times, points: (good ? 1 : -1) * times * (POINTS[id] ?? POINTS_UNSAID) });
  }
  return [...reasons.values()];
}

function pointsOf(reasons: readonly Reason[], side: Side): number {
  return reasons.reduce((sum, { side: owner, points }) => (owner === side ? sum + points : sum), 0);
}

/** Own safe moves until the man of `from` attacks `target`; null where not within three moves. */
function offerMoves({ board }: Position, reach: Reach, from: Square, target: Square): number | null {
  const place = board[from]! & 7;
  const side = board[from]! >> 3;
  const { map } = reach.safety;
  const number = map.squares.indexOf(from, side << 5) & 31;
  const row = ((side << 5) | number) << 6;
  let least: number | null = null;
  for (let square = 0; square < 64; square++) {
    const moves = reach.moves[row | square]!;
    if (moves < 0 || (least !== null && moves >= least)) continue;
    if (bears(board, place, square as Square, target, from)) least = moves;
  }
  return least;
}
