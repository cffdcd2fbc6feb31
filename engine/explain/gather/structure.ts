/** Facts about pawns that hold in a position. */
import { ahead, colourOf, fileName, fileOf, relativeRank, squareName, step, viewOrder } from '../../board';
import { type PawnReading, type PawnSideValue, pawnOn, type Ram } from '../../pawns';
import { commandOf } from '../../squares';
import { structureLead } from '../../structures';
import { opponent, type Side, SIDES, type Square, type SquareName } from '../../types';
import type { StructureFact } from '../facts/structure';
import type { ReadingValues } from '../values';
import { inView } from '../words';
import { manAtOrNull, namesInView } from './names';
import { planFacts } from './pawn-plans';

/** Everything worth saying about the pawns. */
export function structureFacts(values: ReadingValues): StructureFact[] {
  const facts: StructureFact[] = [];
  named(values, facts);
  centre(values, facts);
  for (const side of SIDES) {
    for (const pawn of values.pawns.pawns) if (pawn.side === side) onePawn(values, pawn, facts);
    const pawns = values.pawns[side];
    doubled(pawns, values, facts);
    chains(values, side, facts);
    planFacts(values, side, facts);
    hanging(pawns, facts);
    onColour(pawns, facts);
  }
  islands(values, facts);
  rams(values, facts);
  return facts;
}

function named(values: ReadingValues, facts: StructureFact[]): void {
  const match = values.structure;
  if (!match) return;
  const pawns = [...values.pawns.white.pawns, ...values.pawns.black.pawns];
  facts.push({
    id: 'named-structure',
    side: null,
    name: match.name,
    leader: match.side,
    differs: match.differs,
    lead: structureLead(match),
    squares: namesInView(
      pawns.filter((square) => fileOf(square) >= 2 && fileOf(square) <= 4),
      match.side,
    ),
    men: [],
  });
}

/** The pairs of white and black pawns as names, the side to move first, by file. */
function pairsOf({ position }: ReadingValues, list: readonly Ram[]): (readonly [SquareName, SquareName])[] {
  const mine = position.sideToMove;
  return [...list]
    .sort((a, b) => viewOrder(a[mine], mine) - viewOrder(b[mine], mine))
    .map((pair) => [squareName(pair[mine]), squareName(pair[opponent(mine)])] as const);
}

function centre(values: ReadingValues, facts: StructureFact[]): void {
  const { pawns } = values;
  const inCentre = (square: Square) => fileOf(square) === 3 || fileOf(square) === 4;
  const central = pawns.pawns.filter((pawn) => inCentre(pawn.square));
  if (central.length === 0) {
    if (pawns.pawns.length > 0) facts.push({ id: 'centre-open', side: null, pairs: [], squares: [], men: [] });
    return;
  }
  const tense = pawns.levers.filter(
    (lever) =>
      lever.moves === 0 &&
      lever.side === values.position.sideToMove &&
      (inCentre(lever.from) || inCentre(lever.against)),
  );
  if (tense.length > 0) {
    tense.sort(
      (a, b) => viewOrder(a.from, a.side) - viewOrder(b.from, b.side) || fileOf(a.against) - fileOf(b.against),
    );
    const pairs = tense.map((lever) => [squareName(lever.from), squareName(lever.against)] as const);
    facts.push({ id: 'centre-tension', side: null, pairs, squares: [...new Set(pairs.flat())], men: [] });
    return;
  }
  const locked = pawns.rams.filter(({ white }) => inCentre(white));
  if (locked.length === 0 || central.some((pawn) => !pawn.fixed)) return;
  const pairs = pairsOf(values, locked);
  facts.push({ id: 'centre-fixed', side: null, pairs, squares: pairs.flat(), men: [] });
}

function onePawn(values: ReadingValues, pawn: PawnReading, facts: StructureFact[]): void {
  if (!pawn.isolated && !pawn.backward && !pawn.passed && !pawn.candidate) return;
  const { side } = pawn;
  const at = squareName(pawn.square);
  const file = fileName(fileOf(pawn.square));
  const base = { side, pawn: at, squares: [at], men: [at] };
  if (pawn.isolated && !pawn.doubled) {
    const neighbours = [fileOf(pawn.square) - 1, fileOf(pawn.square) + 1]
      .filter((each) => each >= 0 && each < 8)
      .map(fileName);
    facts.push({ ...base, id: 'isolated-pawn', neighbours, halfOpen: pawn.halfOpen });
  }
  if (pawn.backward && pawn.stop !== null) {
    const stopHeldBy = pawn.stopAttacked
      ? 'pawn'
      : commandOf(values.table, pawn.stop) === opponent(side)
        ? 'command'
        : null;
    const stop = squareName(pawn.stop);
    facts.push({ ...base, id: 'backward-pawn', file, stop, stopHeldBy, halfOpen: pawn.halfOpen, squares: [at, stop] });
  }
  if (pawn.passed && !hasOwnPawnAhead(values, pawn)) {
    const rank = relativeRank(pawn.square, side);
    const blocker = manAtOrNull(values, pawn.blockedBy);
    const guards = pawn.protectedPassed ? namesInView(guardsOf(values, pawn), side) : [];
    facts.push({
      ...base,
      id: pawn.protectedPassed ? 'protected-passed-pawn' : 'passed-pawn',
      moves: rank === 2 ? 5 : 8 - rank,
      blocker,
      guards,
      squares: [at, ...guards, ...(blocker ? [blocker.square] : [])],
    });
  }
  if (pawn.candidate && !pawn.doubled && relativeRank(pawn.square, side) >= 4) {
    facts.push({ ...base, id: 'candidate-pawn', file });
  }
}

function hasOwnPawnAhead({ pawns }: ReadingValues, pawn: PawnReading): boolean {
  return pawns[pawn.side].pawns.some(
    (other) =>
      fileOf(other) === fileOf(pawn.square) && relativeRank(other, pawn.side) > relativeRank(pawn.square, pawn.side),
  );
}

function guardsOf({ pawns }: ReadingValues, pawn: PawnReading): Square[] {
  return pawns[pawn.side].pawns.filter(
    (other) =>
      Math.abs(fileOf(other) - fileOf(pawn.square)) === 1 &&
      relativeRank(other, pawn.side) === relativeRank(pawn.square, pawn.side) - 1,
  );
}

function doubled(pawns: PawnSideValue, values: ReadingValues, facts: StructureFact[]): void {
  if (pawns.doubled.length === 0) return;
  for (let file = 0; file < 8; file++) {
    const list = pawns.doubled.filter((square) => fileOf(square) === file);
    if (list.length < 2) continue;
    const names = namesInView(list, pawns.side);
    const isolated = list.every((square) => pawnOn(values.pawns, square)?.isolated);
    facts.push({ id: 'doubled-pawns', side: pawns.side, pawns: names, isolated, squares: names, men: names });
  }
}

/** The longest chain of three or more pawns that guard one another, from a base that no pawn guards. */
function chains(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  const bases = values.pawns.pawns.filter((pawn) => pawn.side === side && pawn.chain === 'base');
  if (bases.length === 0) return;
  const found = bases.map((pawn) => longestChain(values, side, pawn.square));
  found.sort((a, b) => b.length - a.length || fileOf(a[0] ?? (0 as Square)) - fileOf(b[0] ?? (0 as Square)));
  const [best] = found;
  if (!best || best.length < 3) return;
  const names = best.map(squareName);
  facts.push({ id: 'pawn-chain', side, pawns: names, squares: names, men: names });
}

/** The longest chain from a pawn on; of two equally long the one to the lower file. */
function longestChain(values: ReadingValues, side: Side, from: Square): Square[] {
  const next = ahead(from, side);
  let best: Square[] = [];
  for (const files of [-1, 1]) {
    const to = next === undefined ? undefined : step(next, files, 0);
    if (to === undefined || pawnOn(values.pawns, to)?.side !== side) continue;
    const chain = longestChain(values, side, to);
    if (chain.length > best.length) best = chain;
  }
  return [from, ...best];
}

function hanging({ side, hangingPawns }: PawnSideValue, facts: StructureFact[]): void {
  if (!hangingPawns) return;
  const names = namesInView(hangingPawns, side);
  facts.push({ id: 'hanging-pawns', side, pawns: names, squares: names, men: names });
}

function onColour({ side, pawns, onLight, onDark }: PawnSideValue, facts: StructureFact[]): void {
  const count = Math.max(onLight, onDark);
  if (pawns.length < 5 || count * 4 < pawns.length * 3) return;
  const colour = onLight > onDark ? 'light' : 'dark';
  const squares = namesInView(
    pawns.filter((square) => colourOf(square) === colour),
    side,
  );
  facts.push({ id: 'pawns-on-colour', side, colour, count, total: pawns.length, squares, men: squares });
}

function islands({ pawns }: ReadingValues, facts: StructureFact[]): void {
  const white = pawns.white.islands.length;
  const black = pawns.black.islands.length;
  if (white === black || white === 0 || black === 0) return;
  const fewer = white < black ? 'white' : 'black';
  facts.push({
    id: 'islands',
    side: null,
    fewer,
    fewest: Math.min(white, black),
    most: Math.max(white, black),
    squares: [],
    men: [],
  });
}

function rams(values: ReadingValues, facts: StructureFact[]): void {
  if (values.pawns.rams.length < 2) return;
  const pairs = pairsOf(values, values.pawns.rams);
  const squares = inView(pairs.flat(), values.position.sideToMove);
  facts.push({ id: 'rams', side: null, pairs, squares, men: squares });
}
