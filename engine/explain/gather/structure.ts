/** Facts about pawns that hold in a position. */
import { ahead, colourOf, fileName, fileOf, relativeRank, squareName } from '../../board';
import { type Lever, type PawnReading, type PawnSideValue, pawnOn, type Ram } from '../../pawns';
import { commandOf } from '../../squares';
import { structureLead } from '../../structures';
import { opponent, type Side, SIDES, type Square, type SquareName } from '../../types';
import type { LeverFact, Majority, StructureFact } from '../facts/structure';
import type { ReadingValues } from '../values';
import { inView } from '../words';
import { manAtOrNull, namesInView } from './names';

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
    levers(values, side, facts);
    minority(values, side, facts);
    majorities(values, side, facts);
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
  return list.map((pair) => [squareName(pair[mine]), squareName(pair[opponent(mine)])] as const);
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
    const pairs = tense.map((lever) => [squareName(lever.from), squareName(lever.against)] as const);
    pairs.sort((a, b) => (a.join() < b.join() ? -1 : 1));
    facts.push({ id: 'centre-tension', side: null, pairs, squares: [...new Set(pairs.flat())], men: [] });
    return;
  }
  const locked = pawns.rams.filter(({ white }) => inCentre(white));
  if (locked.length === 0 || central.some((pawn) => !pawn.fixed)) return;
  const pairs = pairsOf(values, locked);
  facts.push({ id: 'centre-fixed', side: null, pairs, squares: pairs.flat(), men: [] });
}

function onePawn(values: ReadingValues, pawn: PawnReading, facts: StructureFact[]): void {
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
  const own = values.pawns.pawns.filter((pawn) => pawn.side === side);
  const at = new Map(own.map((pawn) => [pawn.square, pawn]));
  const longest = (from: Square): Square[] => {
    const next = [-1, 1]
      .map((files) =>
        ahead(from, side) !== undefined && fileOf(from) + files >= 0 && fileOf(from) + files < 8
          ? (((ahead(from, side) ?? 0) + files) as Square)
          : undefined,
      )
      .filter((square): square is Square => square !== undefined && at.has(square))
      .map(longest);
    next.sort((a, b) => b.length - a.length || ((a[0] ?? 0) % 8) - ((b[0] ?? 0) % 8));
    return [from, ...(next[0] ?? [])];
  };
  const found = own.filter((pawn) => pawn.chain === 'base').map((pawn) => longest(pawn.square));
  found.sort((a, b) => b.length - a.length || fileOf(a[0] ?? (0 as Square)) - fileOf(b[0] ?? (0 as Square)));
  const [best] = found;
  if (!best || best.length < 3) return;
  const names = best.map(squareName);
  facts.push({ id: 'pawn-chain', side, pawns: names, squares: names, men: names });
}

/** The first man in the way of a lever's pawn, its strike square included. */
function blockerOf(values: ReadingValues, lever: Lever): Square | null {
  for (let square = ahead(lever.from, lever.side); square !== undefined; square = ahead(square, lever.side)) {
    if (values.map.board[square] !== 0) return square;
    if (square === lever.on) return null;
  }
  return null;
}

/** Levers still to be played: of each pawn the soonest, central and supported ones first, three a side at most. */
function levers(values: ReadingValues, side: Side, facts: StructureFact[]): void {
  const { pawns } = values;
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
    const blocker = blockerOf(values, lever);
    if (blocker !== null && lever.moves > 1) continue;
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
  coming.sort((a, b) => worth(b) - worth(a) || (a.pawn < b.pawn ? -1 : 1));
  facts.push(...coming.slice(0, 3));
}

const WING_FILES = { queenside: 'abc', centre: 'de', kingside: 'fgh' } as const;

function pawnsOnWing(values: ReadingValues, side: Side, wing: keyof typeof WING_FILES): Square[] {
  return values.pawns[side].pawns.filter((square) => WING_FILES[wing].includes(fileName(fileOf(square))));
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
  const pairs = pairsOf(values, values.pawns.rams).sort((a, b) => (a[0] < b[0] ? -1 : 1));
  const squares = inView(pairs.flat(), values.position.sideToMove);
  facts.push({ id: 'rams', side: null, pairs, squares, men: squares });
}
