/** From two readings and what differs to facts. */
import type { Reading } from '../reading/schema';
import { opponent, SIDES, type Side, type SquareName } from '../types';
import type { ManDifference, SquareDifference } from './difference';
import type { DifferenceFact, LastGuard } from './facts';

interface Given {
  readonly a: Reading;
  readonly b: Reading;
  readonly squares: readonly SquareDifference[];
  readonly men: readonly ManDifference[];
}

/** All facts of a difference. */
export function differenceFacts(given: Given): DifferenceFact[] {
  return [
    ...given.men.flatMap((man) => manFacts(man)),
    ...given.squares.flatMap((square) => squareFacts(square, given)),
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

/** The wider centre: c3 to f6. */
function isCentral(square: SquareName): boolean {
  return square >= 'c' && square < 'g' && square.charAt(1) >= '3' && square.charAt(1) <= '6';
}

function squareFacts(
  { square, attackers, command, weakFor, outpostFor }: SquareDifference,
  given: Given,
): DifferenceFact[] {
  const facts: DifferenceFact[] = [];
  for (const side of SIDES) {
    const weak = weakFor[side];
    if (weak.a === null && weak.b !== null)
      facts.push({ id: 'weak-square-made', side, good: false, squares: [square], square, hold: weak.b });
    if (weak.a !== null && weak.b === null)
      facts.push({ id: 'weak-square-mended', side, good: true, squares: [square], square, hold: weak.a });
    const post = outpostFor[side];
    if (post.a !== post.b)
      facts.push({ id: post.b ? 'outpost-made' : 'outpost-gone', side, good: post.b, squares: [square], square });
    const lost = attackers[side].a > 0 && attackers[side].b === 0;
    if (lost && (weak.b !== null || isCentral(square)) && attackers[opponent(side)].b > 0)
      facts.push(lastGuardFact(square, side, attackers[side].a, given));
    if (command.b === side && command.a !== side && isCentral(square)) {
      const now = { white: attackers.white.b, black: attackers.black.b };
      facts.push({ id: 'command-taken', side, good: true, squares: [square], square, command, attackers: now });
    }
  }
  return facts;
}

function lastGuardFact(square: SquareName, side: Side, before: number, { b, men }: Given): LastGuard {
  const enemy = opponent(side);
  const users =
    b.weakSquares.find((weak) => weak.square === square && weak.side === side)?.users ??
    b.outposts.find((post) => post.square === square && post.side === enemy)?.users ??
    [];
  const gone = men.flatMap(({ side: owner, kind, squares }) =>
    squares.a !== null && squares.b === null ? [{ side: owner, kind, square: squares.a }] : [],
  );
  return { id: 'last-guard-gone', side, good: false, squares: [square], square, before, user: users[0] ?? null, gone };
}

function fileFacts({ a, b }: Given): DifferenceFact[] {
  return a.files.flatMap((before, place): DifferenceFact[] => {
    const after = b.files[place]!;
    const { file } = before;
    const status = { a: before.status, b: after.status };
    const control = { a: before.control, b: after.control };
    const facts: DifferenceFact[] = [];
    const squares = [...after.heavy.white, ...after.heavy.black];
    if (status.a !== status.b) {
      const side = after.halfOpenFor ?? before.halfOpenFor ?? (control.b === 'black' ? 'black' : 'white');
      const good = ORDER[status.b] > ORDER[status.a];
      facts.push({ id: 'file-opened', side, good, squares, file, status, control });
    }
    for (const side of SIDES) {
      if ((control.a === side) === (control.b === side)) continue;
      facts.push({ id: 'file-taken', side, good: control.b === side, squares, file, status, control });
    }
    return facts;
  });
}

const ORDER = { closed: 0, 'half-open': 1, open: 2 } as const;

const TRAITS = ['isolated', 'doubled', 'backward', 'passed'] as const;

function sideFacts(given: Given, side: Side): DifferenceFact[] {
  return [...traitFacts(given, side), ...bishopFacts(given, side), ...kingFacts(given, side)];
}

/** Pawns that stand in both readings on the same square, so that a pawn that is merely gone or moved says nothing. */
function traitFacts({ a, b }: Given, side: Side): DifferenceFact[] {
  const pawnsOf = ({ men }: Reading) =>
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

function bishopFacts({ a, b }: Given, side: Side): DifferenceFact[] {
  const problems = ({ men }: Reading): SquareName[] =>
    men.filter((man) => man.side === side && man.notes.includes('bad-bishop')).map(({ square }) => square);
  const [had, has] = [problems(a), problems(b)];
  const bishops = ({ men }: Reading, owner: Side): SquareName[] =>
    men.filter((man) => man.side === owner && man.kind === 'bishop').map(({ square }) => square);
  const facts: DifferenceFact[] = [];
  for (const square of has)
    if (!had.includes(square) && bishops(a, side).includes(square))
      facts.push({ id: 'problem-bishop-made', side, good: false, squares: [square], square, traded: false });
  for (const square of had) {
    const traded = bishops(b, side).length < bishops(a, side).length && !bishops(b, side).includes(square);
    if (!has.includes(square) && (traded || bishops(b, side).includes(square)))
      facts.push({ id: 'problem-bishop-gone', side, good: true, squares: traded ? [] : [square], square, traded });
  }
  const alone = (reading: Reading): boolean =>
    bishops(reading, side).length === 2 && bishops(reading, opponent(side)).length < 2;
  const [before, after] = [alone(a), alone(b)];
  if (before !== after)
    facts.push({ id: after ? 'bishop-pair-won' : 'bishop-pair-given', side, good: after, squares: bishops(b, side) });
  return facts;
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

function structureFacts({ a, b }: Given): DifferenceFact[] {
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
