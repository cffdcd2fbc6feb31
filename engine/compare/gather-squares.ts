/** Facts of squares: weak squares and outposts that came or went, guards that are gone, command of the wider centre. */
import { opponent, SIDES, type Side, type SquareName } from '../types';
import { colourOf } from './counts';
import type { SquareDifference } from './difference';
import type { DifferenceFact, LastGuard } from './facts';
import type { Board, Given } from './given';

/** The wider centre: c3 to f6. */
function isCentral(square: SquareName): boolean {
  return square >= 'c' && square < 'g' && square.charAt(1) >= '3' && square.charAt(1) <= '6';
}

/** What is said of one square that differs. */
export function squareFacts(difference: SquareDifference, given: Given): DifferenceFact[] {
  return SIDES.flatMap((side) => [
    ...weakFacts(difference, side, given),
    ...guardFacts(difference, side, given),
    ...commandFacts(difference, side),
  ]);
}

function weakFacts({ square, weakFor, outpostFor }: SquareDifference, side: Side, { a, b }: Given): DifferenceFact[] {
  const facts: DifferenceFact[] = [];
  const base = { side, squares: [square], square };
  const { a: before, b: after } = weakFor[side];
  if (before === null && after !== null)
    facts.push({ ...base, id: 'weak-square-made', good: false, hold: after, matters: doesMatter(b, square, side) });
  if (before !== null && after === null)
    facts.push({ ...base, id: 'weak-square-mended', good: true, hold: before, matters: doesMatter(a, square, side) });
  const post = outpostFor[side];
  if (post.a !== post.b) facts.push({ ...base, id: post.b ? 'outpost-made' : 'outpost-gone', good: post.b });
  return facts;
}

function doesMatter({ weakSquares }: Board, square: SquareName, side: Side): boolean {
  return weakSquares.some((weak) => weak.square === square && weak.side === side && weak.matters);
}

function guardFacts({ square, attackers, occupant, weakFor }: SquareDifference, side: Side, given: Given): LastGuard[] {
  const isWeak = weakFor[side].b !== null;
  const isLost = attackers[side].a > 0 && attackers[side].b === 0 && attackers[opponent(side)].b > 0;
  if (!isLost || !(isWeak || isCentral(square)) || occupant.b?.kind === 'king') return [];
  return [
    {
      id: 'last-guard-gone',
      side,
      good: false,
      squares: [square],
      square,
      before: attackers[side].a,
      on: occupant.b,
      user: userOf(given.b, square, side),
      ...goneGuards(square, side, given),
    },
  ];
}

/** Who of the enemy gets to a square that is weak, or an outpost, soonest. */
function userOf({ weakSquares, outposts }: Board, square: SquareName, side: Side): LastGuard['user'] {
  const weak = weakSquares.find((each) => each.square === square && each.side === side);
  const post = outposts.find((each) => each.square === square && each.side !== side);
  return weak?.users[0] ?? post?.users[0] ?? null;
}

/** The guards where all of them are off the board, and whether they went in a trade of like men. */
function goneGuards(square: SquareName, side: Side, { a, men }: Given): Pick<LastGuard, 'gone' | 'pair'> {
  const off = men.flatMap(({ side: owner, kind, squares }) =>
    squares.a !== null && squares.b === null ? [{ owner, kind, square: squares.a }] : [],
  );
  const guards = a.squares.find((each) => each.square === square)?.attackers[side] ?? [];
  const gone = off.filter((man) => man.owner === side && guards.includes(man.square));
  if (gone.length < guards.length) return { gone: [], pair: null };
  const [one, two] = off;
  const isTrade = off.length === 2 && one?.kind === two?.kind && one?.owner !== two?.owner;
  const isOneColour = one?.kind === 'bishop' && two && colourOf(one.square) === colourOf(two.square);
  return {
    gone: gone.map(({ kind, square: at }) => ({ kind, square: at })),
    pair: isTrade && one ? { kind: one.kind, colour: isOneColour ? colourOf(one.square) : null } : null,
  };
}

function commandFacts({ square, attackers, command }: SquareDifference, side: Side): DifferenceFact[] {
  if (command.b !== side || command.a === side || !isCentral(square)) return [];
  const now = { white: attackers.white.b, black: attackers.black.b };
  return [{ id: 'command-taken', side, good: true, squares: [square], square, command, attackers: now }];
}
