/** Facts about outposts that hold in a position. */
import { fileOf, relativeRank, squareName } from '../../board';
import type { OutpostValue } from '../../squares';
import { opponent, type Side, type Square } from '../../types';
import type { OutpostsFact } from '../facts/outposts';
import type { ReadingValues } from '../values';
import { comers, countOf, isHeldOffItsFile, manAt, pawnOnItsWay } from './names';

/** Enemy pawns below which every square is an outpost, and none says anything. */
const ENEMY_PAWNS_LEAST = 2;

/** Everything worth saying about outposts. */
export function outpostsFacts(values: ReadingValues): OutpostsFact[] {
  const facts: OutpostsFact[] = [];
  for (const post of values.outposts) {
    if (values.pawns[opponent(post.side)].pawns.length < ENEMY_PAWNS_LEAST) continue;
    const fact = outpostFact(values, post);
    if (fact) facts.push(fact);
  }
  return facts;
}

function outpostFact(values: ReadingValues, post: OutpostValue): OutpostsFact | null {
  const { side, support, challenge, hold, occupant } = post;
  // Most posts are neither taken nor outposts: nothing is said of them.
  const isOutpost = post.rank === 'outpost' && support !== null && hold !== 'open';
  if (!isOutpost && occupant === null) return null;
  const isHeld = (of: Side, pawn: { moves: number } | null, from: Square | undefined) =>
    pawn !== null && pawn.moves > 0 && from !== undefined && isHeldOffItsFile(values, of, from);
  if (isHeld(side, support, support?.pawn) || isHeld(opponent(side), challenge, challenge?.from)) return null;
  return isOutpost ? outpost(values, post, support, hold) : advancedPost(values, post);
}

function outpost(
  values: ReadingValues,
  { side, square, occupant, users, tradable }: OutpostValue,
  support: NonNullable<OutpostValue['support']>,
  hold: 'permanent' | 'fixed',
): OutpostsFact | null {
  const name = squareName(square);
  const man = occupant === null ? null : manAt(values, square);
  // A rook on the seventh has its own sentence.
  if (man?.kind === 'rook' && relativeRank(square, side) === 7) return null;
  if (man !== null && man.kind !== 'king' && man.kind !== 'queen') {
    const pawn = pawnOnItsWay(values, side, support.pawn, support.moves, square);
    return { side, hold, support: pawn, id: 'outpost-taken', man, tradable, squares: [name], men: [name] };
  }
  if (man !== null || values.map.board[square] !== 0 || users.length === 0) return null;
  const coming = comers(values, users, side).filter(
    ({ kind }) => kind === 'knight' || kind === 'bishop' || kind === 'rook',
  );
  const [first] = coming;
  if (!first || (coming.every(({ kind }) => kind === 'rook') && !isOpenFor(values, side, square))) return null;
  return {
    side,
    hold,
    support: pawnOnItsWay(values, side, support.pawn, support.moves, square),
    id: 'outpost-free',
    square: name,
    comers: coming,
    ownKnights: countOf(values, side, 'knight'),
    squares: [name],
    men: coming.filter(({ moves }) => moves === first.moves).map((comer) => comer.square),
  };
}

function advancedPost(values: ReadingValues, { side, square, support, challenge }: OutpostValue): OutpostsFact | null {
  if (!challenge || relativeRank(square, side) < 5) return null;
  const man = manAt(values, square);
  if (man.kind !== 'knight' && man.kind !== 'bishop') return null;
  const name = squareName(square);
  return {
    id: 'advanced-post',
    side,
    man,
    challenge: pawnOnItsWay(values, opponent(side), challenge.from, challenge.moves, square),
    guard: support && support.moves === 0 ? squareName(support.pawn) : null,
    squares: [name, squareName(challenge.from)],
    men: [name],
  };
}

/** Whether no own pawn stands on the file: an outpost for rooks is one on their file (Nimzowitsch, My System, from memory). */
function isOpenFor({ pawns }: ReadingValues, side: Side, square: Square): boolean {
  return !pawns[side].pawns.some((pawn) => fileOf(pawn) === fileOf(square));
}
