/**
 * What of a structure sheet holds in a position: key squares by who holds them, posts by who stands there and who can
 * come, levers by the pawn moves they need, trades by the men that are left.
 */
import { attackersOf, attackMap, kindOn } from '../../attacks';
import { colourOf, KNIGHT, manOn, type Position, SQUARES } from '../../board';
import { isSafeHere, safetyOf } from '../../exchange';
import { type Reach, REACH_MOVES_MAX, reachOf, type User, usersOf } from '../../reach';
import { bySide, type BySide, type Kind, KINDS, type Man, opponent, type Side, type Square } from '../../types';
import { nameStructure, type StructureMatch } from '../name-structure';
import { type LeverValue, leverValue } from './sheet-lever';
import { type SheetPost, type SheetSide, type SheetTrade, sheetSides, type TradeMan } from './sides';
import { BOOKS, type Book } from './books';
import { SHEETS } from './table';

export interface KeySquareValue {
  readonly square: Square;
  readonly occupant: Man | null;
  /** Men that attack it, cheapest first. */
  readonly attackers: BySide<readonly Square[]>;
  /** The one side whose knight would be safe there; null where both sides' would, or neither's. */
  readonly controller: Side | null;
}

/** Who stands on a post: a man of that kind, another own man, an enemy man, or nobody. */
export const POST_STATES = ['held', 'own-man', 'enemy-man', 'free'] as const;
export type PostState = (typeof POST_STATES)[number];

export interface PostValue extends SheetPost {
  readonly state: PostState;
  readonly occupant: Man | null;
  /** A man of that kind would not be lost there by exchange. */
  readonly safe: boolean;
  /** Men of that kind that can come safely, soonest first, within REACH_MOVES_MAX moves; none where own men stand. */
  readonly users: readonly User[];
}

/** Whether a trade can still come: both such men are there, one of the two, or none. */
export const TRADE_STATES = ['available', 'one-left', 'done'] as const;
export type TradeState = (typeof TRADE_STATES)[number];

export interface TradeValue extends SheetTrade {
  readonly state: TradeState;
  readonly ownMen: readonly Square[];
  readonly enemyMen: readonly Square[];
}

export interface SheetSideValue {
  readonly keys: readonly KeySquareValue[];
  readonly posts: readonly PostValue[];
  readonly levers: readonly LeverValue[];
  readonly wanted: readonly TradeValue[];
  readonly unwanted: readonly TradeValue[];
  readonly plan: string;
}

export interface SheetValue {
  readonly structure: StructureMatch;
  readonly sides: BySide<SheetSideValue>;
  readonly books: readonly Book[];
}

/** The sheet of the position's named structure and what of it holds; null where the pawns have no name. */
export function sheetOf(position: Position, reach: Reach = reachIn(position)): SheetValue | null {
  const structure = nameStructure(position);
  const sheet = SHEETS.find(({ id }) => id === structure?.id);
  if (!structure || !sheet) return null;
  const written = sheetSides(sheet, structure.reversed);
  return {
    structure,
    sides: bySide((side) => sideValue(position, reach, side, written[side])),
    books: sheet.books.map((name) => BOOKS[name]),
  };
}

function reachIn(position: Position): Reach {
  return reachOf(safetyOf(attackMap(position)), REACH_MOVES_MAX);
}

function sideValue(position: Position, reach: Reach, side: Side, written: SheetSide): SheetSideValue {
  return {
    keys: written.keys.map((square) => keyValue(position, reach, square)),
    posts: written.posts.map((post) => postValue(position, reach, side, post)),
    levers: written.levers.map((lever) => leverValue(position, side, lever)),
    wanted: written.wanted.map((trade) => tradeValue(position, side, trade)),
    unwanted: written.unwanted.map((trade) => tradeValue(position, side, trade)),
    plan: written.plan,
  };
}

function keyValue(position: Position, { safety }: Reach, square: Square): KeySquareValue {
  const white = isSafeHere(safety, 0, KNIGHT, square);
  const black = isSafeHere(safety, 1, KNIGHT, square);
  return {
    square,
    occupant: manOn(position, square),
    attackers: bySide((side) => attackersOf(safety.map, side, square)),
    controller: white === black ? null : white ? 'white' : 'black',
  };
}

function postValue(position: Position, reach: Reach, side: Side, { kind, square }: SheetPost): PostValue {
  const occupant = manOn(position, square);
  const { safety } = reach;
  const own = occupant?.side === side;
  return {
    kind,
    square,
    state: occupant === null ? 'free' : !own ? 'enemy-man' : occupant.kind === kind ? 'held' : 'own-man',
    occupant,
    safe: isSafeHere(safety, side === 'white' ? 0 : 1, KINDS.indexOf(kind) + 1, square),
    users: own ? [] : usersOfKind(reach, side, kind, square),
  };
}

function usersOfKind(reach: Reach, side: Side, kind: Kind, square: Square): readonly User[] {
  return usersOf(reach, side, square).filter(({ from }) => kindOn(reach.safety.map, from) === kind);
}

function tradeValue(position: Position, side: Side, { own, enemy }: SheetTrade): TradeValue {
  const ownMen = menLike(position, side, own);
  const enemyMen = menLike(position, opponent(side), enemy);
  const missing = Number(ownMen.length === 0) + Number(enemyMen.length === 0);
  return { own, enemy, state: TRADE_STATES[missing]!, ownMen, enemyMen };
}

function menLike(position: Position, side: Side, { kind, colour }: TradeMan): Square[] {
  return SQUARES.filter((square) => {
    const man = manOn(position, square);
    return man?.side === side && man.kind === kind && (colour === null || colourOf(square) === colour);
  });
}
