/** Facts about men that hold in a position. */
import { attackerMask, attackersOf, firstMen, isPinned } from '../../attacks';
import { bitCount, DIRECTION_TO, fileOf, relativeRank, squareName } from '../../board';
import { fillAttacked, type ManValue, newWords, squaresOfWords } from '../../men';
import { opponent, type Side, SIDES, type Square } from '../../types';
import type { MenFact } from '../facts/men';
import type { ReadingValues } from '../values';
import { compareInView } from '../words';
import { bishopFacts } from './bishops';
import { manAt, menInView } from './names';
import { isOutOfPlay, placementFacts } from './placement';

/** Everything worth saying about men. */
export function menFacts(values: ReadingValues): MenFact[] {
  const facts: MenFact[] = [];
  for (const man of values.men) oneMan(values, man, facts);
  facts.push(...bishopFacts(values));
  for (const side of SIDES) {
    facts.push(...placementFacts(values, side));
    blockedIn(values, side, facts);
  }
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
  if (isOutOfPlay(values, value)) {
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

const words = newWords();

/** Pieces shut in by their own men, where these are exceptions: at most two a side. */
function blockedIn(values: ReadingValues, side: Side, facts: MenFact[]): void {
  const shut = values.men.filter((man) => man.side === side && man.notes.includes('blocked-in'));
  if (shut.length === 0 || shut.length > 2) return;
  for (const { square } of shut) {
    const man = manAt(values, square);
    fillAttacked(values.map.board, values.map.board[square]!, square, square, words);
    const blockers = squaresOfWords(words);
    const by = menInView(values, blockers, side);
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
