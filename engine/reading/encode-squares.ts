/** Squares, weak squares, outposts and pawns as JSON: numbers become names. */
import { type AttackMap, attackersOf, heldFrom, kindOn, pinnedMask } from '../attacks';
import { manOn, type Position, SQUARES, squareName } from '../board';
import type { PawnSideValue, PawnValues } from '../pawns';
import type { User } from '../reach';
import {
  behind,
  type ColourComplex,
  commandOf,
  exchangeGain,
  type OutpostValue,
  type SquareTable,
  type WeakSquareValue,
} from '../squares';
import type { StructureMatch } from '../structures';
import type { BySide, Side, Square, SquareName } from '../types';
import type { Reading } from './schema';

/** Names of squares, in the order given. */
export function names(squares: readonly Square[]): SquareName[] {
  return squares.map(squareName);
}

/** Names of squares per side. */
export function namesBySide(squares: BySide<readonly Square[]>): { white: SquareName[]; black: SquareName[] } {
  return { white: names(squares.white), black: names(squares.black) };
}

/** The 64 squares of a reading, a1 first. */
export function encodeSquares(position: Position, map: AttackMap, table: SquareTable): Reading['squares'] {
  const anyPinned = pinnedMask(map, 0) !== 0 || pinnedMask(map, 1) !== 0;
  const held = (side: Side, square: Square) => (anyPinned ? names(heldFrom(map, side, square)) : []);
  return SQUARES.map((square) => {
    const man = manOn(position, square);
    return {
      square: squareName(square),
      occupant: man ? { side: man.side, kind: man.kind } : null,
      attackers: { white: names(attackersOf(map, 'white', square)), black: names(attackersOf(map, 'black', square)) },
      held: { white: held('white', square), black: held('black', square) },
      behind: { white: names(behind(map, table, 'white', square)), black: names(behind(map, table, 'black', square)) },
      command: commandOf(table, square),
      exchange: { white: exchangeGain(table, 'white', square), black: exchangeGain(table, 'black', square) },
    };
  });
}

function encodeUsers(map: AttackMap, users: readonly User[]): Reading['weakSquares'][number]['users'] {
  return users.map(({ from, moves }) => ({ from: squareName(from), kind: kindOn(map, from), moves }));
}

/** Weak squares of both sides. */
export function encodeWeakSquares(map: AttackMap, weak: readonly WeakSquareValue[]): Reading['weakSquares'] {
  return weak.map(({ square, side, hold, matters, commandedByEnemy, users, complex }) => ({
    square: squareName(square),
    side,
    hold,
    matters,
    commandedByEnemy,
    users: encodeUsers(map, users),
    complex,
  }));
}

/** Outposts and advanced posts of both sides. */
export function encodeOutposts(map: AttackMap, posts: readonly OutpostValue[]): Reading['outposts'] {
  return posts.map(({ square, side, rank, deep, hold, challenge, support, occupant, users, tradable }) => ({
    square: squareName(square),
    side,
    rank,
    deep,
    hold,
    challenge: challenge && { from: squareName(challenge.from), moves: challenge.moves },
    support: support && { pawn: squareName(support.pawn), moves: support.moves },
    occupant: occupant === null ? null : squareName(occupant),
    users: encodeUsers(map, users),
    tradable,
  }));
}

/** Colour complexes of both sides. */
export function encodeComplexes(complexes: readonly ColourComplex[]): Reading['colourComplexes'] {
  return complexes.map(({ side, colour, squares, ownBishop, enemyBishop }) => ({
    side,
    colour,
    squares: names(squares),
    ownBishop,
    enemyBishop,
  }));
}

/** The pawns of both sides and what holds between them. */
export function encodePawns(pawns: PawnValues, structure: StructureMatch | null): Reading['pawns'] {
  return {
    white: encodePawnSide(pawns.white),
    black: encodePawnSide(pawns.black),
    rams: pawns.rams.map(({ white, black }) => ({ white: squareName(white), black: squareName(black) })),
    levers: pawns.levers.map(({ from, against, side, moves, supported }) => ({
      from: squareName(from),
      against: squareName(against),
      side,
      moves,
      supported,
    })),
    fixedness: { all: pawns.fixedness.all, centre: pawns.fixedness.centre },
    structure: structure && {
      id: structure.id,
      name: structure.name,
      side: structure.side,
      differs: structure.differs,
    },
  };
}

function encodePawnSide(side: PawnSideValue): Reading['pawns']['white'] {
  return {
    islands: side.islands.length,
    isolated: names(side.isolated),
    doubled: names(side.doubled),
    backward: names(side.backward),
    passed: names(side.passed),
    protectedPassed: names(side.protectedPassed),
    candidates: names(side.candidates),
    onLight: side.onLight,
    onDark: side.onDark,
    majorities: [...side.majorities],
  };
}
