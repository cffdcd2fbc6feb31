/** Squares, weak squares, outposts and pawns as the text of their JSON. */
import { type AttackMap, heldFrom, kindOn, pinnedMask } from '../attacks';
import { SQUARES } from '../board';
import type { ReadingValues } from '../explain';
import type { Lever, PawnSideValue, Ram } from '../pawns';
import type { User } from '../reach';
import {
  type ColourComplex,
  COMMANDS,
  NO_EXCHANGE,
  type OutpostValue,
  type SquareTable,
  type WeakSquareValue,
} from '../squares';
import type { StructureMatch } from '../structures';
import type { Square } from '../types';
import type { Reading } from './schema';
import {
  listText,
  MAN_TEXTS,
  maskText,
  objectText,
  squaresText,
  squareText,
  textOf,
  type Write,
  wordsText,
  wordText,
} from './text';

/** What stands before a square's occupant, and between its behind-men and its exchanges. */
const BEGINNINGS: readonly string[] = SQUARES.map((square) => `{"square":${squareText(square)},"occupant":`);
const COMMAND_TEXTS: readonly string[] = COMMANDS.map((command) => `"command":"${command}","exchange":{"white":`);

/**
 * The 64 squares, a1 first: nearly half of a reading, so they are written out by hand. Most lines of most squares are
 * the same few texts.
 */
export function squaresJson({ map, table }: ReadingValues): string {
  const anyPinned = pinnedMask(map, 0) !== 0 || pinnedMask(map, 1) !== 0;
  let text = '[';
  for (const square of SQUARES) {
    text +=
      (square === 0 ? '' : ',') +
      BEGINNINGS[square]! +
      MAN_TEXTS[map.board[square]!]! +
      masksJson(',"attackers":{"white":', map, map.attackers, square) +
      (anyPinned ? heldJson(map, square) : ',"held":{"white":[],"black":[]}') +
      masksJson(',"behind":{"white":', map, table.behind, square) +
      ',' +
      COMMAND_TEXTS[table.commands[square]!]! +
      gainText(table, square) +
      ',"black":' +
      gainText(table, 64 | square) +
      '}}';
  }
  return `${text}]`;
}

/** The men of both sides' masks; `before` is the field's name and all up to White's list. */
function masksJson(before: string, map: AttackMap, masks: Readonly<Int32Array>, square: Square): string {
  return `${before}${maskText(map, 0, masks[square]!)},"black":${maskText(map, 32, masks[64 | square]!)}}`;
}

function heldJson(map: AttackMap, square: Square): string {
  return `,"held":{"white":${squaresText(heldFrom(map, 'white', square))},"black":${squaresText(heldFrom(map, 'black', square))}}`;
}

/** `entry` is (side << 6 | square). */
function gainText({ exchanges }: SquareTable, entry: number): string {
  const gain = exchanges[entry]!;
  return gain === NO_EXCHANGE ? 'null' : `${gain}`;
}

const usersText: Write<readonly User[]> = (users, map) =>
  listText(
    users,
    map,
    ({ from, moves }) => `{"from":${squareText(from)},"kind":"${kindOn(map, from)}","moves":${moves}}`,
  );

/** A weak square. */
export const weakSquareJson = objectText<WeakSquareValue, Reading['weakSquares'][number]>({
  square: ({ square }) => squareText(square),
  side: ({ side }) => wordText(side),
  hold: ({ hold }) => wordText(hold),
  matters: ({ matters }) => `${matters}`,
  commandedByEnemy: ({ commandedByEnemy }) => `${commandedByEnemy}`,
  users: ({ users }, map) => usersText(users, map),
  complex: ({ complex }) => wordText(complex),
});

/** An outpost or advanced post. */
export const outpostJson = objectText<OutpostValue, Reading['outposts'][number]>({
  square: ({ square }) => squareText(square),
  side: ({ side }) => wordText(side),
  rank: ({ rank }) => wordText(rank),
  deep: ({ deep }) => `${deep}`,
  hold: ({ hold }) => wordText(hold),
  challenge: ({ challenge }) =>
    challenge ? `{"from":${squareText(challenge.from)},"moves":${challenge.moves}}` : 'null',
  support: ({ support }) => (support ? `{"pawn":${squareText(support.pawn)},"moves":${support.moves}}` : 'null'),
  occupant: ({ occupant }) => squareText(occupant),
  users: ({ users }, map) => usersText(users, map),
  tradable: ({ tradable }) => `${tradable}`,
});

/** A colour complex. */
export const complexJson = objectText<ColourComplex, Reading['colourComplexes'][number]>({
  side: ({ side }) => wordText(side),
  colour: ({ colour }) => wordText(colour),
  squares: ({ squares }) => squaresText(squares),
  ownBishop: ({ ownBishop }) => `${ownBishop}`,
  enemyBishop: ({ enemyBishop }) => `${enemyBishop}`,
});

const pawnSideJson = objectText<PawnSideValue, Reading['pawns']['white']>({
  islands: ({ islands }) => `${islands.length}`,
  isolated: ({ isolated }) => squaresText(isolated),
  doubled: ({ doubled }) => squaresText(doubled),
  backward: ({ backward }) => squaresText(backward),
  passed: ({ passed }) => squaresText(passed),
  protectedPassed: ({ protectedPassed }) => squaresText(protectedPassed),
  candidates: ({ candidates }) => squaresText(candidates),
  onLight: ({ onLight }) => `${onLight}`,
  onDark: ({ onDark }) => `${onDark}`,
  majorities: ({ majorities }) => wordsText(majorities),
});

const ramJson: Write<Ram> = ({ white, black }) => `{"white":${squareText(white)},"black":${squareText(black)}}`;

const leverJson = objectText<Lever, Reading['pawns']['levers'][number]>({
  from: ({ from }) => squareText(from),
  against: ({ against }) => squareText(against),
  side: ({ side }) => wordText(side),
  moves: ({ moves }) => `${moves}`,
  supported: ({ supported }) => `${supported}`,
});

const structureJson = objectText<StructureMatch, NonNullable<Reading['pawns']['structure']>>({
  id: ({ id }) => textOf(id),
  name: ({ name }) => textOf(name),
  side: ({ side }) => wordText(side),
  differs: ({ differs }) => `${differs}`,
});

/** The pawns of both sides, what holds between them, and the named structure. */
export const pawnsJson = objectText<Pick<ReadingValues, 'pawns' | 'structure'>, Reading['pawns']>({
  white: ({ pawns }, map) => pawnSideJson(pawns.white, map),
  black: ({ pawns }, map) => pawnSideJson(pawns.black, map),
  rams: ({ pawns }, map) => listText(pawns.rams, map, ramJson),
  levers: ({ pawns }, map) => listText(pawns.levers, map, leverJson),
  fixedness: ({ pawns: { fixedness } }) => `{"all":${fixedness.all},"centre":${fixedness.centre}}`,
  structure: ({ structure }, map) => (structure ? structureJson(structure, map) : 'null'),
});
