/** Facts about kings that hold in a position. */
import { attackersOf } from '../../attacks';
import { fileName, fileOf, relativeRank, squareName } from '../../board';
import type { KingValue } from '../../men';
import { opponent, SIDES } from '../../types';
import type { KingFact } from '../facts/king';
import type { ReadingValues } from '../values';
import { inView } from '../words';
import { manAt, namesInView } from './names';

/** Everything worth saying about the kings. */
export function kingFacts(values: ReadingValues): KingFact[] {
  return SIDES.flatMap((side) => {
    const king = values.kings[side];
    return king ? oneKing(values, king) : [];
  });
}

function oneKing(values: ReadingValues, king: KingValue): KingFact[] {
  const facts: KingFact[] = [];
  const { side } = king;
  const enemy = opponent(side);
  const at = squareName(king.square);
  const base = { side, king: at, squares: [at], men: [at] };
  const checkers = attackersOf(values.map, enemy, king.square).map((square) => manAt(values, square));
  if (checkers.length > 0) {
    facts.push({ ...base, id: 'in-check', checkers, squares: [at, ...checkers.map(({ square }) => square)] });
  }
  luft(values, king, base, facts);
  const heavy = values.files
    .filter(({ file }) => king.openBeside.includes(file))
    .flatMap((file) => file.heavy[enemy].map((square) => manAt(values, square)));
  const hasHeavy = values.men.some((man) => man.side === enemy && (man.kind === 'rook' || man.kind === 'queen'));
  // A king's cover matters while the enemy has a rook or a queen.
  if (hasHeavy) shelter(king, base, facts);
  if (king.openBeside.length > 0 && hasHeavy) {
    const files = king.openBeside.map(fileName);
    facts.push({
      ...base,
      id: 'open-line-beside-king',
      files,
      heavy,
      squares: [at, ...heavy.map(({ square }) => square)],
    });
  }
  const attackers = inView(king.reachedBy.map(squareName), enemy).map((name) =>
    manAt(values, king.reachedBy.find((square) => squareName(square) === name) ?? king.square),
  );
  if (attackers.length >= 3) {
    const from = attackers.map(({ square }) => square);
    facts.push({ ...base, id: 'king-zone', attackers, guards: king.guardedBy.length, men: [at, ...from] });
  }
  if (king.weakBackRank) facts.push({ ...base, id: 'weak-back-rank' });
  return facts;
}

type KingBase = Pick<KingFact, 'squares' | 'men'> & {
  readonly side: KingValue['side'];
  readonly king: ReturnType<typeof squareName>;
};

/** Shelter is spoken of where the king has castled or gone to a wing: on its first two ranks, files a to c or f to h. */
function shelter({ square, side, shelter: files }: KingValue, base: KingBase, facts: KingFact[]): void {
  const onWing = fileOf(square) <= 2 || fileOf(square) >= 5;
  if (!onWing || relativeRank(square, side) > 2) return;
  const pawns = files.flatMap(({ pawn }) => (pawn === null ? [] : [pawn]));
  const names = namesInView(pawns, side);
  if (pawns.length === files.length && files.every(({ advanced }) => advanced === 0)) {
    facts.push({ ...base, id: 'shelter-whole', pawns: names, squares: [base.king, ...names] });
    return;
  }
  const gone = namesInView(
    files.flatMap(({ pawn, advanced }) => (pawn !== null && advanced >= 2 ? [pawn] : [])),
    side,
  );
  const gaps = files.filter(({ pawn }) => pawn === null).map(({ file }) => fileName(file));
  if (gaps.length + gone.length > 0) {
    facts.push({ ...base, id: 'shelter-broken', bare: gaps, advanced: gone, squares: [base.king, ...gone] });
  }
}

function luft(values: ReadingValues, king: KingValue, base: KingBase, facts: KingFact[]): void {
  const { side, square, flights, luft: free, luftMoves } = king;
  if (relativeRank(square, side) !== 1) {
    if (flights.length === 0) facts.push({ ...base, id: 'no-flight' });
    return;
  }
  const developed = values.men.some((man) => man.side !== side && (man.kind === 'rook' || man.kind === 'queen'));
  const onWing = fileOf(square) <= 2 || fileOf(square) >= 5;
  if (free.length > 0 || !developed || !onWing) return;
  const singles = luftMoves.filter(({ from, to }) => Math.abs(to - from) === 8);
  const order = inView(
    singles.map(({ from }) => squareName(from)),
    side,
  );
  const gives = order.flatMap((name) =>
    singles
      .filter(({ from }) => squareName(from) === name)
      .map(({ from, to }) => ({ from: squareName(from), to: squareName(to) })),
  );
  facts.push({
    ...base,
    id: 'no-luft',
    noFlight: flights.length === 0,
    gives,
    squares: [base.king, ...gives.map(({ from }) => from)],
  });
}
