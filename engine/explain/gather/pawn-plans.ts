/** Facts about what pawns can still do: levers, minority attacks, majorities. */
import { ahead, fileOf, squareName } from '../../board';
import type { Lever } from '../../pawns';
import { opponent, type Side, type Square } from '../../types';
import type { LeverFact, Majority, StructureFact } from '../facts/structure';
import type { ReadingValues } from '../values';
import { compareInView } from '../words';
import { isHeldOffItsFile, manAtOrNull, namesInView } from './names';

/** Adds levers still to come, minority attacks and majorities of a side. */
export function planFacts(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  levers(values, side, facts);
  minority(values, side, facts);
  majorities(values, side, facts);
}

/** The first man in the way of a lever's pawn, its strike square included. */
export function blockerOf(values: ReadingValues, lever: Lever): Square | null {
  if (lever.moves === 0) return null;
  for (let square = ahead(lever.from, lever.side); square !== undefined; square = ahead(square, lever.side)) {
    if (values.map.board[square] !== 0) return square;
    if (square === lever.on) return null;
  }
  return null;
}

/** A lever further off is one where a pawn supports it, or within two moves where it strikes at the files c to f. */
function isWorthWaitingFor({ moves, supported, against }: Lever): boolean {
  return supported || (moves === 2 && fileOf(against) >= 2 && fileOf(against) <= 5);
}

/** Levers still to be played: of each pawn the soonest, central and supported ones first, three a side at most. */
function levers(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  const { pawns } = values;
  if (!pawns.levers.some((lever) => lever.side === side && lever.moves > 0)) return;
  const alreadyNow = new Set(pawns.levers.filter((lever) => lever.moves === 0).map((lever) => lever.from));
  const minority = new Set(pawns[side].minorityAttacks.map(({ lever }) => lever.from));
  const coming: LeverFact[] = [];
  const seen = new Set<Square>();
  for (const lever of pawns.levers) {
    if (
      lever.side !== side ||
      lever.moves === 0 ||
      alreadyNow.has(lever.from) ||
      seen.has(lever.from) ||
      minority.has(lever.from)
    )
      continue;
    seen.add(lever.from);
    if (isHeldOffItsFile(values, side, lever.from)) continue;
    const blocker = blockerOf(values, lever);
    if (blocker !== null && lever.moves > 1) continue;
    if (lever.moves > 1 && !isWorthWaitingFor(lever)) continue;
    const [pawn, on, against] = [squareName(lever.from), squareName(lever.on), squareName(lever.against)];
    coming.push({
      id: lever.moves === 1 ? 'lever-ready' : 'lever-coming',
      side,
      pawn,
      on,
      against,
      moves: lever.moves,
      blocker: manAtOrNull(values, blocker),
      supported: lever.supported,
      squares: [pawn, on, against],
      men: blocker === null ? [pawn] : [pawn, squareName(blocker)],
    });
  }
  const worth = (lever: LeverFact) =>
    (lever.supported ? 2 : 0) +
    (lever.blocker ? 0 : 2) -
    lever.moves +
    ('cdef'.includes(lever.against.charAt(0)) ? 2 : 0);
  if (coming.length > 1) coming.sort((a, b) => worth(b) - worth(a) || compareInView(a.pawn, b.pawn, side));
  facts.push(...coming.slice(0, 3));
}

/** First and last file of each wing: a to c, d and e, f to h. */
const WING_FILES = { queenside: [0, 2], centre: [3, 4], kingside: [5, 7] } as const;

function pawnsOnWing(values: ReadingValues, side: Side, wing: keyof typeof WING_FILES): Square[] {
  const [first, last] = WING_FILES[wing];
  return values.pawns[side].pawns.filter((square) => fileOf(square) >= first && fileOf(square) <= last);
}

function minority(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  for (const { wing, lever } of values.pawns[side].minorityAttacks) {
    const [pawn, on, against] = [squareName(lever.from), squareName(lever.on), squareName(lever.against)];
    facts.push({
      id: 'minority-attack',
      side,
      wing,
      own: pawnsOnWing(values, side, wing).length,
      enemy: pawnsOnWing(values, opponent(side), wing).length,
      pawn,
      on,
      against,
      moves: lever.moves,
      blocker: manAtOrNull(values, blockerOf(values, lever)),
      squares: [pawn, on, against],
      men: [pawn],
    });
  }
}

function majorities(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  const { majorities: wings, crippledMajorities, doubled: doubles } = values.pawns[side];
  for (const wing of wings) {
    const own = pawnsOnWing(values, side, wing);
    const crippled = crippledMajorities.includes(wing);
    const squares = namesInView(own, side);
    const fact: Majority = {
      id: crippled ? 'crippled-majority' : 'majority',
      side,
      wing,
      own: own.length,
      enemy: pawnsOnWing(values, opponent(side), wing).length,
      doubled: crippled
        ? namesInView(
            own.filter((square) => doubles.includes(square)),
            side,
          )
        : [],
      squares,
      men: squares,
    };
    if (!crippled || fact.doubled.length > 0) facts.push(fact);
  }
}
