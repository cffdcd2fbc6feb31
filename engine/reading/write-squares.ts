/** Squares, weak squares, outposts and pawns as JSON on a page. */
import { type AttackMap, heldFrom, kindOn, pinnedMask } from '../attacks';
import { manOf, SQUARES, squareName } from '../board';
import type { ReadingValues } from '../explain';
import type { Lever, PawnSideValue, PawnValues, Ram } from '../pawns';
import type { User } from '../reach';
import { type ColourComplex, COMMANDS, exchangeGain, type OutpostValue, type WeakSquareValue } from '../squares';
import type { StructureMatch } from '../structures';
import type { Square } from '../types';
import type { Reading } from './schema';
import {
  fragment,
  objectWriter,
  type Page,
  put,
  putFlag,
  putList,
  putMask,
  putNumber,
  putSquare,
  putSquares,
  putText,
  putTexts,
} from './page';

/** Squares are nearly half of a reading, so they are put down by hand; what each begins with is made beforehand. */
const BEGINNINGS = SQUARES.map((square) => fragment(`${square === 0 ? '[' : ','}{"square":"${squareName(square)}"`));
/** Men by their code in the mailbox, and what follows them. */
const OCCUPANTS = Array.from({ length: 16 }, (_, code) =>
  fragment(`,"occupant":${JSON.stringify(manOf(code))},"attackers":{"white":`),
);
const BLACK = fragment(',"black":');
const HELD = fragment('},"held":{"white":');
const BEHIND = fragment('},"behind":{"white":');
const NOBODY_HELD = fragment('},"held":{"white":[],"black":[]},"behind":{"white":');
const COMMANDED = COMMANDS.map((command) => fragment(`},"command":"${command}","exchange":{"white":`));
const SQUARE_END = fragment('}}');
const END = fragment(']');

/** The 64 squares, a1 first. */
export function putBoard(page: Page, { map, table }: ReadingValues): void {
  const { attackers, board } = map;
  const anyPinned = pinnedMask(map, 0) !== 0 || pinnedMask(map, 1) !== 0;
  for (const square of SQUARES) {
    put(page, BEGINNINGS[square]!);
    put(page, OCCUPANTS[board[square]!]!);
    putMasks(page, map, attackers, square);
    if (anyPinned) putHeld(page, map, square);
    else put(page, NOBODY_HELD);
    putMasks(page, map, table.behind, square);
    put(page, COMMANDED[table.commands[square]!]!);
    putNumber(page, exchangeGain(table, 'white', square));
    put(page, BLACK);
    putNumber(page, exchangeGain(table, 'black', square));
    put(page, SQUARE_END);
  }
  put(page, END);
}

/** The men of both sides' masks, from White's list on. */
function putMasks(page: Page, map: AttackMap, masks: Readonly<Int32Array>, square: Square): void {
  putMask(page, map, 0, masks[square]!);
  put(page, BLACK);
  putMask(page, map, 32, masks[64 | square]!);
}

function putHeld(page: Page, map: AttackMap, square: Square): void {
  put(page, HELD);
  putSquares(page, heldFrom(map, 'white', square), map);
  put(page, BLACK);
  putSquares(page, heldFrom(map, 'black', square), map);
  put(page, BEHIND);
}

const userJson = objectWriter<User, Reading['weakSquares'][number]['users'][number]>({
  from: (page, { from }) => putSquare(page, from),
  kind: (page, { from }, map) => putText(page, kindOn(map, from)),
  moves: (page, { moves }) => putNumber(page, moves),
});

/** A weak square. */
export const weakSquareJson = objectWriter<WeakSquareValue, Reading['weakSquares'][number]>({
  square: (page, { square }) => putSquare(page, square),
  side: (page, { side }) => putText(page, side),
  hold: (page, { hold }) => putText(page, hold),
  matters: (page, { matters }) => putFlag(page, matters),
  commandedByEnemy: (page, { commandedByEnemy }) => putFlag(page, commandedByEnemy),
  users: (page, { users }, map) => putList(page, users, map, userJson),
  complex: (page, { complex }) => putText(page, complex),
});

type Post = Reading['outposts'][number];

const challengeJson = objectWriter<NonNullable<OutpostValue['challenge']>, NonNullable<Post['challenge']>>({
  from: (page, { from }) => putSquare(page, from),
  moves: (page, { moves }) => putNumber(page, moves),
});

const supportJson = objectWriter<NonNullable<OutpostValue['support']>, NonNullable<Post['support']>>({
  pawn: (page, { pawn }) => putSquare(page, pawn),
  moves: (page, { moves }) => putNumber(page, moves),
});

/** An outpost or advanced post. */
export const outpostJson = objectWriter<OutpostValue, Post>({
  square: (page, { square }) => putSquare(page, square),
  side: (page, { side }) => putText(page, side),
  rank: (page, { rank }) => putText(page, rank),
  deep: (page, { deep }) => putFlag(page, deep),
  hold: (page, { hold }) => putText(page, hold),
  challenge: (page, { challenge }, map) => (challenge ? challengeJson(page, challenge, map) : putText(page, null)),
  support: (page, { support }, map) => (support ? supportJson(page, support, map) : putText(page, null)),
  occupant: (page, { occupant }) => putSquare(page, occupant),
  users: (page, { users }, map) => putList(page, users, map, userJson),
  tradable: (page, { tradable }) => putFlag(page, tradable),
});

/** A colour complex. */
export const complexJson = objectWriter<ColourComplex, Reading['colourComplexes'][number]>({
  side: (page, { side }) => putText(page, side),
  colour: (page, { colour }) => putText(page, colour),
  squares: (page, { squares }, map) => putSquares(page, squares, map),
  ownBishop: (page, { ownBishop }) => putFlag(page, ownBishop),
  enemyBishop: (page, { enemyBishop }) => putFlag(page, enemyBishop),
});

const pawnSideJson = objectWriter<PawnSideValue, Reading['pawns']['white']>({
  islands: (page, { islands }) => putNumber(page, islands.length),
  isolated: (page, { isolated }, map) => putSquares(page, isolated, map),
  doubled: (page, { doubled }, map) => putSquares(page, doubled, map),
  backward: (page, { backward }, map) => putSquares(page, backward, map),
  passed: (page, { passed }, map) => putSquares(page, passed, map),
  protectedPassed: (page, { protectedPassed }, map) => putSquares(page, protectedPassed, map),
  candidates: (page, { candidates }, map) => putSquares(page, candidates, map),
  onLight: (page, { onLight }) => putNumber(page, onLight),
  onDark: (page, { onDark }) => putNumber(page, onDark),
  majorities: (page, { majorities }) => putTexts(page, majorities),
});

const ramJson = objectWriter<Ram, Reading['pawns']['rams'][number]>({
  white: (page, { white }) => putSquare(page, white),
  black: (page, { black }) => putSquare(page, black),
});

const leverJson = objectWriter<Lever, Reading['pawns']['levers'][number]>({
  from: (page, { from }) => putSquare(page, from),
  against: (page, { against }) => putSquare(page, against),
  side: (page, { side }) => putText(page, side),
  moves: (page, { moves }) => putNumber(page, moves),
  supported: (page, { supported }) => putFlag(page, supported),
});

const structureJson = objectWriter<StructureMatch, NonNullable<Reading['pawns']['structure']>>({
  id: (page, { id }) => putText(page, id),
  name: (page, { name }) => putText(page, name),
  side: (page, { side }) => putText(page, side),
  differs: (page, { differs }) => putNumber(page, differs),
});

const fixednessJson = objectWriter<PawnValues['fixedness'], Reading['pawns']['fixedness']>({
  all: (page, { all }) => putNumber(page, all),
  centre: (page, { centre }) => putNumber(page, centre),
});

/** The pawns of both sides, what holds between them, and the named structure. */
export const pawnsJson = objectWriter<Pick<ReadingValues, 'pawns' | 'structure'>, Reading['pawns']>({
  white: (page, { pawns }, map) => pawnSideJson(page, pawns.white, map),
  black: (page, { pawns }, map) => pawnSideJson(page, pawns.black, map),
  rams: (page, { pawns }, map) => putList(page, pawns.rams, map, ramJson),
  levers: (page, { pawns }, map) => putList(page, pawns.levers, map, leverJson),
  fixedness: (page, { pawns }, map) => fixednessJson(page, pawns.fixedness, map),
  structure: (page, { structure }, map) => (structure ? structureJson(page, structure, map) : putText(page, null)),
});
