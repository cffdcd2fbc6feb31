/** From two readings and what differs to facts. */
import { SIDES } from '../types';
import type { ManDifference } from './difference';
import type { DifferenceFact } from './facts';
import { fileFacts } from './gather-files';
import { sideFacts, structureFacts } from './gather-sides';
import { squareFacts } from './gather-squares';
import { targetFacts } from './gather-targets';
import type { Given } from './given';

/** All facts of a difference. */
export function differenceFacts(given: Given): DifferenceFact[] {
  return [
    ...given.men.flatMap((man) => manFacts(man)),
    ...given.squares.flatMap((square) => squareFacts(square, given)),
    ...targetFacts(given),
    ...fileFacts(given),
    ...SIDES.flatMap((side) => sideFacts(given, side)),
    ...structureFacts(given),
  ];
}

/** So many safe moves more or fewer are worth a word. */
const ROOM_MIN = 2;

function manFacts({ side, kind, squares, counts }: ManDifference): DifferenceFact[] {
  const { a: from, b: to } = squares;
  if (from === null || to === null || counts.a === null || counts.b === null) return [];
  const safeMoves = { a: counts.a.safeMoves, b: counts.b.safeMoves };
  const facts: DifferenceFact[] = [];
  const man = { kind, square: to };
  const isPiece = kind !== 'pawn' && kind !== 'king';
  if (from !== to && isPiece) {
    const enemyHalf = { a: counts.a.enemyHalf, b: counts.b.enemyHalf };
    const good = safeMoves.b + enemyHalf.b >= safeMoves.a + enemyHalf.a;
    facts.push({ id: 'man-placed', side, good, squares: [to], kind, at: { a: from, b: to }, safeMoves, enemyHalf });
  } else if (from === to && isPiece && Math.abs(safeMoves.b - safeMoves.a) >= ROOM_MIN) {
    const good = safeMoves.b > safeMoves.a;
    facts.push({ id: good ? 'man-freed' : 'man-shut-in', side, good, squares: [to], man, safeMoves });
  }
  if (counts.a.enPrise === 0 && counts.b.enPrise > 0)
    facts.push({ id: 'now-en-prise', side, good: false, squares: [to], man, loses: counts.b.enPrise });
  if (counts.a.enPrise > 0 && counts.b.enPrise === 0)
    facts.push({ id: 'en-prise-no-more', side, good: true, squares: [to], man, loses: counts.a.enPrise });
  return facts;
}
