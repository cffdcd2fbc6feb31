/**
 * Good and bad bishops. Bad, as the books have it (Capablanca, Chess Fundamentals, 1921, by the colour of the
 * pawns; that only fixed ones in the centre count is Nimzowitsch's, from memory): a fixed centre pawn, files c to f,
 * stands on its colour, and so do half or more of its side's pawns. Activity is another matter: a bad bishop
 * outside its chain can be active.
 */
import { firstMen } from '../attacks';
import { BISHOP, colourOf, fileOf, rankOf, relativeRank, SQUARES, viewOrder } from '../board';
import type { Lever, PawnReading, PawnValues } from '../pawns';
import { hasBishop } from '../squares';
import { opponent, type Side, type Square } from '../types';
import type { MenContext, Note } from './man-value';

export interface BishopValue {
  readonly square: Square;
  readonly side: Side;
  /** Own pawns on its colour, and all own pawns. */
  readonly onColour: readonly Square[];
  readonly ownPawns: number;
  /** Own pawns on its colour on the files c to f that enemy pawns fix: see `isFixedByPawns`. */
  readonly fixedCentre: readonly Square[];
  readonly bad: boolean;
  /** Outside the chain: see `isOutside`. */
  readonly outside: boolean;
  /** For a bad bishop inside its chain, what would mend it. */
  readonly remedy: BishopRemedy | null;
}

export interface BishopRemedy {
  /** The enemy has a bishop of the colour to trade it for. */
  readonly tradeable: boolean;
  /** A lever of its side against an enemy pawn that rams one of the fixed centre pawns. */
  readonly lever: Lever | null;
  /** The nearest square outside the chain that it reaches safely, with the moves needed. */
  readonly outside: { readonly square: Square; readonly moves: number } | null;
}

/** All bishops in square order. */
export function bishopValues(context: MenContext, pawns: PawnValues): BishopValue[] {
  return SQUARES.filter((square) => (context.map.board[square]! & 7) === BISHOP).map((square) =>
    bishopValue(context, pawns, square),
  );
}

function bishopValue(context: MenContext, pawns: PawnValues, square: Square): BishopValue {
  const side: Side = context.map.board[square]! >> 3 ? 'black' : 'white';
  const colour = colourOf(square);
  const onColour: Square[] = [];
  const fixed: PawnReading[] = [];
  for (const pawn of pawns.pawns) {
    if (pawn.side !== side || colourOf(pawn.square) !== colour) continue;
    onColour.push(pawn.square);
    const isCentral = fileOf(pawn.square) >= 2 && fileOf(pawn.square) <= 5;
    if (isCentral && isFixedByPawns(pawn, pawns[side].pawns)) fixed.push(pawn);
  }
  const ownPawns = pawns[side].pawns.length;
  const fixedCentre = fixed.map((pawn) => pawn.square);
  const bad = fixed.length > 0 && onColour.length * 2 >= ownPawns;
  const outside = isOutside(context, side, square, square, fixedCentre);
  return {
    square,
    side,
    onColour,
    ownPawns,
    fixedCentre,
    bad,
    outside,
    remedy: bad && !outside ? remedyOf(context, pawns, side, square, fixed) : null,
  };
}

/**
 * Fixed by pawns: it cannot take one, and an enemy pawn stands before it or holds the square before it while no own pawn
 * guards that square. With a neighbour at its side it may step up as a lever, like f7-f6 against e5. A pawn that only a
 * piece stands before is not fixed: the piece will go.
 */
function isFixedByPawns({ square, rammed, stopAttacked, levers }: PawnReading, own: readonly Square[]): boolean {
  if (levers.some(({ moves }) => moves === 0)) return false;
  if (rammed) return true;
  // An own pawn guards the stop square just when it stands beside this one.
  return stopAttacked && !own.some((pawn) => rankOf(pawn) === rankOf(square) && Math.abs(pawn - square) === 1);
}

/**
 * Outside the chain: from the square neither forward diagonal runs first into one of the fixed centre pawns, and
 * at least one leads into the enemy half. `origin` is the bishop's own square, taken to be empty.
 */
function isOutside({ map }: MenContext, side: Side, square: Square, origin: Square, fixed: readonly Square[]): boolean {
  const lines = firstMen(map);
  let reaches = relativeRank(square, side) >= 5;
  for (const direction of side === 'white' ? [4, 7] : [5, 6]) {
    let first = lines[(square << 3) | direction]!;
    if (first === origin) first = lines[(origin << 3) | direction]!;
    if (first < 0) {
      reaches ||= leadsAcross(side, square, direction);
      continue;
    }
    if (fixed.includes(first as Square)) return false;
    reaches ||= relativeRank(first as Square, side) >= 5;
  }
  return reaches;
}

/** Whether an open diagonal from the square ends in the enemy half. */
function leadsAcross(side: Side, square: Square, direction: number): boolean {
  const toRight = direction === 4 || direction === 6;
  const steps = toRight ? 7 - fileOf(square) : fileOf(square);
  return relativeRank(square, side) + steps >= 5;
}

function remedyOf(
  context: MenContext,
  pawns: PawnValues,
  side: Side,
  square: Square,
  fixed: readonly PawnReading[],
): BishopRemedy {
  const rammers = fixed.filter((pawn) => pawn.rammed).map((pawn) => pawn.stop);
  const levers = pawns.levers.filter((lever) => lever.side === side && rammers.includes(lever.against));
  levers.sort((a, b) => a.moves - b.moves || viewOrder(a.from, side) - viewOrder(b.from, side));
  const { map } = context;
  const row = ((side === 'white' ? 0 : 32) | map.numbers[square]!) << 6;
  const fixedSquares = fixed.map((pawn) => pawn.square);
  let outside: BishopRemedy['outside'] = null;
  for (const to of SQUARES) {
    const moves = context.reach.moves[row | to]!;
    if (moves <= 0 || (outside && moves > outside.moves)) continue;
    if (outside && moves === outside.moves && viewOrder(to, side) > viewOrder(outside.square, side)) continue;
    if (isOutside(context, side, to, square, fixedSquares)) outside = { square: to, moves };
  }
  return { tradeable: hasBishop(map.board, opponent(side), colourOf(square)), lever: levers[0] ?? null, outside };
}

/** What a bishop's man note says: bad inside its chain, or bad but active outside it. */
export function bishopNotes(bishops: readonly BishopValue[]): Map<Square, Note> {
  const notes = new Map<Square, Note>();
  for (const { square, bad, outside } of bishops) if (bad) notes.set(square, outside ? 'bad-but-active' : 'bad-bishop');
  return notes;
}
