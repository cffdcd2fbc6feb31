/** Facts about men that hold in a position. */
import { attackerMask, attackersOf, firstMen, isPinned } from '../../attacks';
import { bitCount, colourOf, DIRECTION_TO, fileOf, relativeRank, squareName } from '../../board';
import { type BishopValue, fillAttacked, type ManValue, newWords, squaresOfWords } from '../../men';
import { type Kind, opponent, type Side, SIDES, type Square } from '../../types';
import type { MenFact, PlacedMan } from '../facts/men';
import type { ReadingValues } from '../values';
import { compareInView, inView } from '../words';
import { countOf, manAt } from './names';
import { blockerOf } from './pawn-plans';

/** Most moves of each kind on an empty board: the handbooks' table. */
const MOST: Partial<Record<Kind, number>> = { knight: 8, bishop: 13, rook: 14, queen: 27 };

/** Everything worth saying about men. */
export function menFacts(values: ReadingValues): MenFact[] {
  const facts: MenFact[] = [];
  for (const man of values.men) oneMan(values, man, facts);
  for (const bishop of values.bishops) oneBishop(values, bishop, facts);
  for (const side of SIDES) {
    placed(values, side, facts);
    pair(values, side, facts);
    blockedIn(values, side, facts);
  }
  bishopAgainstKnight(values, facts);
  return facts;
}

function oneMan(values: ReadingValues, value: ManValue, facts: MenFact[]): void {
  const { side, square, kind, notes, duties } = value;
  if (notes.length === 0 && duties.length === 0) return;
  const man = manAt(values, square);
  const base = { side, man, squares: [man.square], men: [man.square] };
  const isPiece = kind !== 'pawn' && kind !== 'king';
  if (value.enPrise > 0)
    facts.push({ ...base, id: 'en-prise', gain: value.enPrise, guards: bitCount(value.defenders) });
  if (value.trapped) facts.push({ ...base, id: 'trapped', attacked: value.attackers !== 0 });
  if (notes.includes('out-of-play')) {
    facts.push({ ...base, id: 'out-of-play', safeMoves: value.safeMoves.length, toCentre: value.movesToCentre });
  } else if (notes.includes('rim')) {
    facts.push({ ...base, id: 'knight-on-rim', square: man.square, sees: value.sees });
  }
  if (value.pinned) pinned(values, value, facts);
  const load = notes.includes('overloaded') ? overloaded(values, value) : null;
  if (load) facts.push(load);
  else if (isPiece && duties.length > 0) tied(values, value, facts);
  const loose = isPiece && value.defenders === 0 && value.enPrise === 0;
  if (loose && relativeRank(square, side) >= 4) facts.push({ ...base, id: 'loose' });
}

/** Two men that it guards itself and that different enemy men attack, the first such pair in its side's view. */
function overloaded(values: ReadingValues, { side, square, duties }: ManValue): MenFact | null {
  const { map } = values;
  const attackers = (ward: Square) => attackerMask(map, opponent(side), ward);
  const wards = duties
    .filter((duty) => duty.by === 'guard' && attackersOf(map, side, duty.square).includes(square))
    .map((duty) => duty.square)
    .filter((ward) => attackers(ward) !== 0)
    .sort((a, b) => compareInView(squareName(a), squareName(b), side));
  for (const [index, first] of wards.entries()) {
    const second = wards.slice(index + 1).find((ward) => bitCount(attackers(first) | attackers(ward)) > 1);
    if (second === undefined) continue;
    const guards = [manAt(values, first), manAt(values, second)];
    const man = manAt(values, square);
    return { id: 'overloaded', side, man, guards, squares: guards.map((ward) => ward.square), men: [man.square] };
  }
  return null;
}

/** Of several duties the dearest; of equals the first in its side's view. */
function tied(values: ReadingValues, { side, square, duties }: ManValue, facts: MenFact[]): void {
  let best = duties[0];
  for (const duty of duties) {
    if (!best || duty === best) continue;
    const order = duty.loses - best.loses || fileOf(best.square) - fileOf(duty.square);
    if (order > 0 || (order === 0 && relativeRank(duty.square, side) < relativeRank(best.square, side))) best = duty;
  }
  if (!best) return;
  const man = manAt(values, square);
  const ward = manAt(values, best.square);
  const men = [man.square, ward.square];
  const { loses, by, square: on } = best;
  const already = values.men.find((each) => each.square === on)?.enPrise ?? 0;
  facts.push({ id: 'tied', side, man, ward, loses, already, by, squares: [ward.square], men });
}

function pinned(values: ReadingValues, { square, side }: ManValue, facts: MenFact[]): void {
  const king = values.map.kings[side === 'white' ? 0 : 1] as Square;
  const direction = DIRECTION_TO[(king << 6) | square]!;
  const pinner = firstMen(values.map)[(square << 3) | direction]! as Square;
  if (!isPinned(values.map, square) || pinner < 0) return;
  const man = manAt(values, square);
  const by = manAt(values, pinner);
  facts.push({
    id: 'pinned',
    side,
    man,
    pinner: by,
    king: squareName(king),
    squares: [man.square, by.square, squareName(king)],
    men: [man.square, by.square],
  });
}

function oneBishop(values: ReadingValues, bishop: BishopValue, facts: MenFact[]): void {
  if (!bishop.bad) return;
  const { side, onColour, ownPawns, remedy } = bishop;
  const square = squareName(bishop.square);
  if (bishop.outside) {
    const safeMoves = values.men.find((man) => man.square === bishop.square)?.safeMoves.length ?? 0;
    facts.push({
      id: 'bad-but-active',
      side,
      square,
      onColour: onColour.length,
      pawns: ownPawns,
      safeMoves,
      squares: [square],
      men: [square],
    });
    return;
  }
  const fixed = inView(bishop.fixedCentre.map(squareName), side);
  const lever = remedy?.lever && blockerOf(values, remedy.lever) === null ? remedy.lever : null;
  facts.push({
    id: 'bad-bishop',
    side,
    square,
    colour: colourOf(bishop.square),
    onColour: onColour.length,
    pawns: ownPawns,
    fixed,
    tradeable: remedy?.tradeable ?? false,
    lever: lever && {
      pawn: squareName(lever.from),
      on: squareName(lever.on),
      against: squareName(lever.against),
      moves: lever.moves,
    },
    outside: remedy?.outside ? { square: squareName(remedy.outside.square), moves: remedy.outside.moves } : null,
    squares: [square, ...fixed],
    men: [square],
  });
}

/**
 * Best and worst placed piece of a side by its share of safe moves. Worst is said only of a piece that clearly has fewest,
 * attacks next to nothing in the enemy half and does not stand behind a lever; never of the queen.
 */
function placed(values: ReadingValues, side: Side, facts: MenFact[]): void {
  const ranked = values.men
    .filter((man) => man.side === side && MOST[man.kind] !== undefined && man.enPrise === 0)
    .map((man) => ({ man, share: man.safeMoves.length / (MOST[man.kind] ?? 1) }))
    .sort((a, b) => b.share - a.share);
  const [best, second] = ranked;
  const worst = ranked[ranked.length - 1];
  const nextWorst = ranked[ranked.length - 2];
  if (!best || !second || !worst || !nextWorst) return;
  if (best.share > second.share && best.share >= 0.5) facts.push(placement(values, 'best-placed', best.man));
  if (
    worst.man.kind !== 'queen' &&
    worst.share < nextWorst.share &&
    worst.share <= 0.25 &&
    enemyHalfSeen(values, worst.man.square) <= 1 &&
    !standsBehindLever(values, worst.man)
  )
    facts.push(placement(values, 'worst-placed', worst.man));
}

const words = newWords();

/** Squares of the enemy half that the man attacks. */
function enemyHalfSeen({ map }: ReadingValues, square: Square): number {
  const code = map.board[square]!;
  fillAttacked(map.board, code, square, square, words);
  return squaresOfWords(words).filter((to) => relativeRank(to, code >> 3 ? 'black' : 'white') >= 5).length;
}

/** A rook behind an own pawn that has a lever within two moves works through it, however few its moves. */
function standsBehindLever({ pawns }: ReadingValues, { square, side, kind }: ManValue): boolean {
  return (
    kind === 'rook' &&
    pawns.levers.some((lever) => lever.side === side && lever.moves <= 2 && fileOf(lever.from) === fileOf(square))
  );
}

function placement(
  values: ReadingValues,
  id: PlacedMan['id'],
  { square, side, kind, safeMoves, movesToCentre }: ManValue,
): MenFact {
  const enemyHalf = enemyHalfSeen(values, square);
  const man = manAt(values, square);
  return {
    id,
    side,
    man,
    safeMoves: safeMoves.length,
    most: MOST[kind] ?? 0,
    enemyHalf,
    toCentre: movesToCentre,
    squares: [man.square],
    men: [man.square],
  };
}

function bishopsOf(values: ReadingValues, side: Side): BishopValue[] {
  return values.bishops.filter((bishop) => bishop.side === side);
}

function hasPair(values: ReadingValues, side: Side): boolean {
  return new Set(bishopsOf(values, side).map(({ square }) => colourOf(square))).size === 2;
}

function pair(values: ReadingValues, side: Side, facts: MenFact[]): void {
  if (!hasPair(values, side) || hasPair(values, opponent(side))) return;
  const men = inView(
    bishopsOf(values, side).map(({ square }) => squareName(square)),
    side,
  );
  facts.push({ id: 'bishop-pair', side, squares: men, men });
}

/** The only minor pieces left are a bishop and a knight of different sides, and the pawns suit one of them. */
function bishopAgainstKnight(values: ReadingValues, facts: MenFact[]): void {
  for (const side of SIDES) {
    const enemy = opponent(side);
    const [bishop] = bishopsOf(values, side);
    const knight = values.men.find((man) => man.side === enemy && man.kind === 'knight');
    const minors = (of: Side) => countOf(values, of, 'bishop') + countOf(values, of, 'knight');
    if (!bishop || !knight || minors(side) !== 1 || minors(enemy) !== 1) continue;
    const rams = values.pawns.rams.length;
    const all = values.pawns.pawns.map((pawn) => fileOf(pawn.square));
    const bothWings = all.some((file) => file <= 2) && all.some((file) => file >= 5);
    const onColour = bishop.onColour.length;
    const favours =
      bishop.bad && rams > 0 ? 'knight' : bothWings && rams === 0 && onColour * 2 < bishop.ownPawns ? 'bishop' : null;
    if (!favours) continue;
    const [at, against] = [squareName(bishop.square), squareName(knight.square)];
    facts.push({
      id: 'bishop-against-knight',
      side,
      bishop: at,
      knight: against,
      favours,
      onColour,
      pawns: bishop.ownPawns,
      rams,
      squares: [at, against],
      men: [at, against],
    });
  }
}

/** Pieces shut in by their own men, where these are exceptions: at most two a side. */
function blockedIn(values: ReadingValues, side: Side, facts: MenFact[]): void {
  const shut = values.men.filter((man) => man.side === side && man.notes.includes('blocked-in'));
  if (shut.length > 2) return;
  for (const { square } of shut) {
    const man = manAt(values, square);
    fillAttacked(values.map.board, values.map.board[square]!, square, square, words);
    const blockers = squaresOfWords(words);
    const by = inView(blockers.map(squareName), side).map((name) =>
      manAt(values, blockers.find((each) => squareName(each) === name) ?? square),
    );
    facts.push({
      id: 'blocked-in',
      side,
      man,
      by,
      squares: [man.square, ...by.map((each) => each.square)],
      men: [man.square],
    });
  }
}
