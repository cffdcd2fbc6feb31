/** Structure sheets as JSON: numbers become names. */
import { formatFen, type Position, squareName } from '../board';
import {
  BOOKS,
  type SheetSide,
  type SheetSideValue,
  type SheetValue,
  SHEETS,
  sheetSides,
  structureLead,
  STRUCTURES,
  type StructureModel,
} from '../structures';
import { bySide } from '../types';
import { names, namesBySide } from './encode-squares';
import type { SheetAnswer, StructureSheetJson, StructuresAnswer } from './schema/sheets';
import { ENGINE_VERSION } from './version';

/** Every sheet, for the colours as the books draw them. */
export function encodeSheets(): StructuresAnswer {
  return { engine: ENGINE_VERSION, structures: STRUCTURES.flatMap(encodeModel) };
}

function encodeModel(model: StructureModel): StructureSheetJson[] {
  const sheet = SHEETS.find(({ id }) => id === model.id);
  if (!sheet) return [];
  const { id, name, leader } = model;
  const sides = sheetSides(sheet, false);
  return [
    {
      id,
      name,
      leader,
      lead: structureLead({ id, name, side: leader, differs: 0, reversed: false, model }),
      pawns: bySide((side) => ({
        core: model[side].core ?? '',
        bare: model[side].bare ?? '',
        usual: model[side].usual,
      })),
      white: encodeWritten(sides.white),
      black: encodeWritten(sides.black),
      books: sheet.books.map((book) => BOOKS[book]),
    },
  ];
}

function encodeWritten({ keys, posts, levers, wanted, unwanted, plan }: SheetSide) {
  return {
    keySquares: names(keys),
    posts: posts.map(({ kind, square }) => ({ kind, square: squareName(square) })),
    levers: levers.map(({ on, against }) => ({ on: squareName(on), against: squareName(against) })),
    wanted: [...wanted],
    unwanted: [...unwanted],
    plan,
  };
}

/** What of the sheet holds in the position; null for pawns without a name. */
export function encodeSheet(position: Position, value: SheetValue | null): SheetAnswer {
  return { engine: ENGINE_VERSION, fen: formatFen(position), sheet: value && encodeValue(value) };
}

function encodeValue({ structure, sides, books }: SheetValue): SheetAnswer['sheet'] {
  const { id, name, side, differs } = structure;
  return {
    id,
    name,
    side,
    differs,
    lead: structureLead(structure),
    white: encodeHeld(sides.white),
    black: encodeHeld(sides.black),
    books: [...books],
  };
}

function encodeHeld({ keys, posts, levers, wanted, unwanted, plan }: SheetSideValue) {
  const trades = (list: SheetSideValue['wanted']) =>
    list.map(({ ownMen, enemyMen, ...trade }) => ({ ...trade, ownMen: names(ownMen), enemyMen: names(enemyMen) }));
  return {
    keySquares: keys.map(({ square, occupant, attackers, controller }) => ({
      square: squareName(square),
      occupant,
      attackers: namesBySide(attackers),
      controller,
    })),
    posts: posts.map(({ square, users, ...post }) => ({
      ...post,
      square: squareName(square),
      users: users.map(({ from, moves }) => ({ from: squareName(from), moves })),
    })),
    levers: levers.map(({ on, against, from, blockers, ...lever }) => ({
      ...lever,
      on: squareName(on),
      against: squareName(against),
      from: from === null ? null : squareName(from),
      blockers: names(blockers),
    })),
    wanted: trades(wanted),
    unwanted: trades(unwanted),
    plan,
  };
}
