/** Facts of a side: traits of its pawns, problem bishops, the bishop pair, the king's flight squares; the structure's name. */
import { opponent, type Side, type SquareName } from '../types';
import { colourOf } from './counts';
import type { DifferenceFact } from './facts';
import type { Board, Given } from './given';

const TRAITS = ['isolated', 'doubled', 'backward', 'passed'] as const;

/** What is said of a side: its pawns, its bishops, its king. */
export function sideFacts(given: Given, side: Side): DifferenceFact[] {
  return [...traitFacts(given, side), ...bishopFacts(given, side), ...kingFacts(given, side)];
}

/** Pawns that stand in both readings on the same square, so that a pawn that is merely gone or moved says nothing. */
function traitFacts({ a, b }: Given, side: Side): DifferenceFact[] {
  const pawnsOf = ({ men }: Board) =>
    new Set(men.filter((man) => man.side === side && man.kind === 'pawn').map(({ square }) => square));
  const [pawnsA, pawnsB] = [pawnsOf(a), pawnsOf(b)];
  return TRAITS.flatMap((trait): DifferenceFact[] => {
    const [had, has] = [a.pawns[side][trait], b.pawns[side][trait]];
    const made = has.filter((square) => !had.includes(square) && pawnsA.has(square));
    const gone = had.filter((square) => !has.includes(square) && pawnsB.has(square));
    const isGood = trait === 'passed';
    return [
      ...(made.length > 0 ? [{ id: 'pawn-trait-made', side, good: isGood, squares: made, trait } as const] : []),
      ...(gone.length > 0 ? [{ id: 'pawn-trait-gone', side, good: !isGood, squares: gone, trait } as const] : []),
    ];
  });
}

function bishopsOf({ men }: Board, side: Side): SquareName[] {
  return men.filter((man) => man.side === side && man.kind === 'bishop').map(({ square }) => square);
}

function problemsOf({ men }: Board, side: Side): SquareName[] {
  return men.filter((man) => man.side === side && man.notes.includes('bad-bishop')).map(({ square }) => square);
}

function bishopFacts({ a, b }: Given, side: Side): DifferenceFact[] {
  const [bishopsA, bishopsB] = [bishopsOf(a, side), bishopsOf(b, side)];
  const [had, has] = [problemsOf(a, side), problemsOf(b, side)];
  const made = has.filter((square) => !had.includes(square) && bishopsA.includes(square));
  const facts: DifferenceFact[] = made.map((square) => ({
    id: 'problem-bishop-made',
    side,
    good: false,
    squares: [square],
    square,
    traded: false,
  }));
  for (const square of had) {
    const isThere = bishopsB.includes(square);
    const traded = !bishopsB.some((each) => colourOf(each) === colourOf(square));
    if (!has.includes(square) && (traded || isThere))
      facts.push({ id: 'problem-bishop-gone', side, good: true, squares: [square], square, traded });
  }
  const [before, after] = [hasPairAlone(a, side), hasPairAlone(b, side)];
  if (before !== after)
    facts.push({ id: after ? 'bishop-pair-won' : 'bishop-pair-given', side, good: after, squares: bishopsB });
  return facts;
}

/** Whether a side has a bishop of each colour, and the other has not. */
function hasPairAlone(board: Board, side: Side): boolean {
  const hasPair = (owner: Side): boolean => new Set(bishopsOf(board, owner).map(colourOf)).size === 2;
  return hasPair(side) && !hasPair(opponent(side));
}

function kingFacts({ a, b }: Given, side: Side): DifferenceFact[] {
  const [before, after] = [a.kings[side], b.kings[side]];
  if (!before || !after || before.square !== after.square) return [];
  const king = after.square;
  const squares = [king];
  if (before.flights.length === 0 && after.flights.length > 0)
    return [
      { id: 'flight-gained', side, good: true, squares: [...squares, ...after.flights], king, flights: after.flights },
    ];
  if (before.flights.length > 0 && after.flights.length === 0)
    return [{ id: 'flight-lost', side, good: false, squares, king, flights: before.flights }];
  return [];
}

/** The pawns' name, where it changes. */
export function structureFacts({ a, b }: Given): DifferenceFact[] {
  const [before, after] = [a.pawns.structure, b.pawns.structure];
  if (before?.id === after?.id) return [];
  const side = after?.side ?? before?.side ?? 'white';
  return [
    {
      id: 'structure-changed',
      side,
      good: true,
      squares: [],
      name: { a: before?.name ?? null, b: after?.name ?? null },
    },
  ];
}
