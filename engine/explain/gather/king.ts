/** Facts about kings that hold in a position. */
import { attackersOf, isAttacked } from '../../attacks';
import { fileName, fileOf, relativeRank, squareName, viewOrder } from '../../board';
import type { KingValue } from '../../men';
import { opponent, SIDES, type Square } from '../../types';
import type { KingFact } from '../facts/king';
import type { ReadingValues } from '../values';
import type { ManAt } from '../words';
import { countOf, manAt, menInView, namesInView } from './names';

/** Everything worth saying about the kings. */
export function kingFacts(values: ReadingValues): KingFact[] {
  const facts: KingFact[] = [];
  for (const side of SIDES) {
    const king = values.kings[side];
    if (king) oneKing(values, king, facts);
  }
  return facts;
}

function oneKing(values: ReadingValues, king: KingValue, facts: KingFact[]): void {
  const { side } = king;
  const enemy = opponent(side);
  const at = squareName(king.square);
  const base = { side, king: at, squares: [at], men: [at] };
  if (isAttacked(values.map, enemy, king.square)) {
    const checkers = attackersOf(values.map, enemy, king.square).map((square) => manAt(values, square));
    facts.push({ ...base, id: 'in-check', checkers, squares: [at, ...checkers.map(({ square }) => square)] });
  }
  luft(values, king, base, facts);
  // A king's cover, the lines beside it and the men that aim at it matter while the enemy has a queen or two rooks.
  const isExposed = countOf(values, enemy, 'queen') > 0 || countOf(values, enemy, 'rook') > 1;
  if (isExposed) {
    openLines(values, king, base, facts, shelter(king, base, facts));
  }
  if (isExposed && king.reachedBy.length >= 3) {
    const attackers = menInView(values, king.reachedBy, enemy);
    const from = attackers.map(({ square }) => square);
    facts.push({ ...base, id: 'king-zone', attackers, guards: king.guardedBy.length, men: [at, ...from] });
  }
  if (king.weakBackRank) facts.push({ ...base, id: 'weak-back-rank' });
}

type KingBase = Pick<KingFact, 'squares' | 'men'> & {
  readonly side: KingValue['side'];
  readonly king: ReturnType<typeof squareName>;
};

/**
 * Shelter is spoken of where the king has castled or gone to a wing: on its first two ranks, files a to c or f to h.
 * Answers the files that the sentence calls bare.
 */
function shelter({ square, side, shelter: files }: KingValue, base: KingBase, facts: KingFact[]): number[] {
  const onWing = fileOf(square) <= 2 || fileOf(square) >= 5;
  if (!onWing || relativeRank(square, side) > 2) return [];
  if (files.every(({ pawn, advanced }) => pawn !== null && advanced === 0)) {
    const names = namesInView(pawnsOf(files, 0), side);
    facts.push({ ...base, id: 'shelter-whole', pawns: names, squares: [base.king, ...names] });
    return [];
  }
  const gone = namesInView(pawnsOf(files, 2), side);
  const gaps = files.filter(({ pawn }) => pawn === null).map(({ file }) => file);
  if (gaps.length + gone.length > 0) {
    const bare = gaps.map(fileName);
    facts.push({ ...base, id: 'shelter-broken', bare, advanced: gone, squares: [base.king, ...gone] });
  }
  return gaps;
}

/** The shelter's pawns that have left their first square that many ranks behind or more. */
function pawnsOf(files: KingValue['shelter'], advancedLeast: number): Square[] {
  const pawns: Square[] = [];
  for (const { pawn, advanced } of files) if (pawn !== null && advanced >= advancedLeast) pawns.push(pawn);
  return pawns;
}

/**
 * Lines are spoken of while the king keeps to its first three ranks: open files together, half-open ones together. Files
 * that nobody uses and that a sentence calls bare already are left out.
 */
function openLines(
  values: ReadingValues,
  king: KingValue,
  base: KingBase,
  facts: KingFact[],
  bare: readonly number[],
): void {
  if (king.openBeside.length === 0 || relativeRank(king.square, king.side) > 3) return;
  const enemy = opponent(king.side);
  for (const status of ['open', 'half-open'] as const) {
    const lines = values.files.filter((each) => king.openBeside.includes(each.file) && each.status === status);
    if (lines.length === 0) continue;
    const heavy: ManAt[] = [];
    for (const line of lines) for (const square of line.heavy[enemy]) heavy.push(manAt(values, square));
    if (heavy.length === 0 && lines.every(({ file }) => bare.includes(file))) continue;
    // The squares of the files level with the king, so that it shows which are meant.
    const beside = lines
      .map(({ file }) => squareName((king.square - fileOf(king.square) + file) as Square))
      .filter((name) => name !== base.king);
    facts.push({
      ...base,
      id: 'open-line-beside-king',
      files: lines.map(({ file }) => fileName(file)),
      status,
      heavy,
      squares: [base.king, ...beside, ...heavy.map(({ square }) => square)],
    });
  }
}

function luft(values: ReadingValues, king: KingValue, base: KingBase, facts: KingFact[]): void {
  const { side, square, flights, luft: free, luftMoves } = king;
  if (relativeRank(square, side) !== 1) {
    if (flights.length === 0) facts.push({ ...base, id: 'no-flight' });
    return;
  }
  const onWing = fileOf(square) <= 2 || fileOf(square) >= 5;
  if (free.length > 0 || !onWing) return;
  const enemy = opponent(side);
  if (countOf(values, enemy, 'rook') + countOf(values, enemy, 'queen') === 0) return;
  const gives = luftMoves
    .filter(({ from, to }) => Math.abs(to - from) === 8)
    .sort((a, b) => viewOrder(a.from, side) - viewOrder(b.from, side))
    .map(({ from, to }) => ({ from: squareName(from), to: squareName(to) }));
  facts.push({
    ...base,
    id: 'no-luft',
    noFlight: flights.length === 0,
    gives,
    squares: [base.king, ...gives.map(({ from }) => from)],
  });
}
