/** Facts about bishops that hold in a position: bad ones, the pair, a bishop against a knight. */
import { colourOf, fileOf, squareName } from '../../board';
import type { BishopValue } from '../../men';
import { opponent, type Side, SIDES } from '../../types';
import type { MenFact } from '../facts/men';
import type { ReadingValues } from '../values';
import { inView } from '../words';
import { countOf } from './names';
import { blockerOf } from './pawn-plans';

/** A bad bishop outside its chain is called active from as many safe moves on. Picked by eye. */
const ACTIVE_FROM = 4;

/** Everything worth saying about bishops as bishops. */
export function bishopFacts(values: ReadingValues): MenFact[] {
  const facts: MenFact[] = [];
  for (const bishop of values.bishops) oneBishop(values, bishop, facts);
  for (const side of SIDES) pair(values, side, facts);
  bishopAgainstKnight(values, facts);
  return facts;
}

function oneBishop(values: ReadingValues, bishop: BishopValue, facts: MenFact[]): void {
  if (!bishop.bad) return;
  const { side, onColour, ownPawns, remedy } = bishop;
  const square = squareName(bishop.square);
  if (bishop.outside) {
    const safeMoves = values.men.find((man) => man.square === bishop.square)?.safeMoves.length ?? 0;
    if (safeMoves < ACTIVE_FROM) return;
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
