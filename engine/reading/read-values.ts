/** The pipeline: from a position to all engine values. Start reading here. */
import { attackMap, newAttackMap } from '../attacks';
import type { Position } from '../board';
import { safetyOf } from '../exchange';
import type { ReadingValues } from '../explain';
import { diagonalValues, fileValues, seventhRank } from '../files';
import { bishopNotes, bishopValues, kingValue, manValues, safeMovesOf } from '../men';
import { newPawnMap, pawnMap, pawnValues } from '../pawns';
import { newReachTables, reachOf } from '../reach';
import { colourComplexes, newSquareTable, outposts, squareTable, squareTotals, weakSquares } from '../squares';
import { nameStructure } from '../structures';
import { bySide } from '../types';

/** How far users of weak squares and outposts are looked for, in own moves. */
export const REACH_MOVES = 3;

/** Tables that one reading after another may use. Values read with a desk hold only until the next reading on it. */
export type Desk = ReturnType<typeof newDesk>;

/** A fresh set of tables. */
export function newDesk() {
  const map = newAttackMap();
  return { map, safety: safetyOf(map), reach: newReachTables(), pawns: newPawnMap(), table: newSquareTable() };
}

/**
 * All engine values of a position. Bulk work hands in a desk, so that the large tables are made once; without one
 * the values stand on tables of their own.
 */
export function readValues(position: Position, desk: Desk = newDesk()): ReadingValues {
  const map = attackMap(position, desk.map);
  const safety = safetyOf(map, desk.safety);
  const reach = reachOf(safety, REACH_MOVES, desk.reach);
  const lanes = pawnMap(position, desk.pawns);
  const pawns = pawnValues(position, lanes);
  const table = squareTable(safety, desk.table);
  const weak = weakSquares(lanes, position.board, table, reach);
  const posts = outposts(lanes, reach);
  const context = { position, map, safety, table, pawns: lanes, reach, outposts: posts };
  const bishops = bishopValues(context, pawns);
  const men = manValues(context, bishopNotes(bishops));
  return {
    position,
    map,
    safety,
    reach,
    pawnMap: lanes,
    pawns,
    structure: nameStructure(position),
    table,
    weakSquares: weak,
    outposts: posts,
    complexes: colourComplexes(weak, position.board),
    files: fileValues(safety, pawns, reach),
    sevenths: bySide((side) => seventhRank(map, reach, side)),
    diagonals: diagonalValues(map, pawns),
    men,
    bishops,
    kings: bySide((side) => kingValue(safety, side)),
    totals: bySide((side) => squareTotals(map, table, side, safeMovesOf(men, side))),
  };
}
