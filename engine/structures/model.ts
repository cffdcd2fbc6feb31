/**
 * How a named structure is written down, and how it is made ready for matching.
 *
 * A list of pawns is text, as one would note it: `d4` a pawn on d4, `e2|e3` one on either, `f` one anywhere on
 * the f-file. What is in `core` must be there, and no other pawn of that side on those files; files and squares
 * in `bare` must hold no pawn of that side; pawns of `usual` may be missing or stand elsewhere, and are counted.
 * Core and usual pawns together are the whole set of the model.
 */
import { mirrored, sq, squareNamed } from '../board';
import { type FileName, FILES, RANKS, type Side, type Square } from '../types';

export interface StructureSide {
  readonly core?: string;
  readonly bare?: string;
  readonly usual: string;
}

export interface StructureModel {
  /** Kebab-case, stable: part of the JSON promise. */
  readonly id: string;
  readonly name: string;
  /** The side that has the leading part in the model as written. With colours exchanged it is the other. */
  readonly leader: Side;
  readonly white: StructureSide;
  readonly black: StructureSide;
  /**
   * What the structure means, as a clause that core and bare files alone make true. `{side}` is the leader, `{enemy}` the
   * other, `{c6}` a square of the model: turned over when the colours are exchanged.
   */
  readonly lead: string;
  /** The books that name it; 'from memory' where no page was looked up. */
  readonly source: string;
}

/** Pawns of one side as two words, a1 to h4 and a5 to h8, one bit a square. */
export interface PawnWords {
  low: number;
  high: number;
}

/**
 * Demands on one side: all of `core`, none of `bare` (the other squares of core files included), one square each
 * of `either`; `usual` is counted.
 */
export interface SideDemands {
  readonly core: PawnWords;
  readonly bare: PawnWords;
  readonly either: readonly PawnWords[];
  readonly usual: readonly PawnWords[];
  /** Pawns of the whole model. */
  readonly men: number;
}

/** A model for one assignment of colours, ready to match. */
export interface PreparedStructure {
  readonly model: StructureModel;
  readonly leader: Side;
  readonly reversed: boolean;
  /** Equal to itself with colours exchanged: then neither side leads. */
  readonly symmetric: boolean;
  /** Demands that must be met: the more, the more telling the name. The same for both assignments of colours. */
  readonly specificity: number;
  readonly white: SideDemands;
  readonly black: SideDemands;
}

/** The model as written and, unless that is the same, with colours exchanged. Throws on a misspelt square. */
export function prepared(model: StructureModel): PreparedStructure[] {
  const white = demands(model.white, (square) => square);
  const black = demands(model.black, (square) => square);
  const turnedWhite = demands(model.black, mirrored);
  const turnedBlack = demands(model.white, mirrored);
  const symmetric = sameDemands(white, turnedWhite) && sameDemands(black, turnedBlack);
  const specificity = demandsOf(model.white) + demandsOf(model.black);
  const written = { model, leader: model.leader, reversed: false, symmetric, specificity, white, black };
  if (symmetric) return [written];
  const leader: Side = model.leader === 'white' ? 'black' : 'white';
  return [written, { ...written, leader, reversed: true, white: turnedWhite, black: turnedBlack }];
}

function demandsOf(side: StructureSide): number {
  return tokens(side.core).length + tokens(side.bare).length;
}

function tokens(text = ''): string[] {
  return text.split(' ').filter((token) => token !== '');
}

type Turn = (square: Square) => Square;

function demands(side: StructureSide, turn: Turn): SideDemands {
  const core = tokens(side.core);
  const usual = tokens(side.usual);
  const coreSquares = core.flatMap((token) => squares(token, turn));
  const coreFiles = core.flatMap((token) => squares(token.charAt(0), turn));
  const besideCore = coreFiles.filter((square) => !coreSquares.includes(square));
  return {
    core: words(core.filter((token) => !token.includes('|')).flatMap((token) => squares(token, turn))),
    bare: words([...tokens(side.bare).flatMap((token) => squares(token, turn)), ...besideCore]),
    either: core.filter((token) => token.includes('|')).map((token) => words(squares(token, turn))),
    usual: usual.map((token) => words(squares(token, turn))),
    men: core.length + usual.length,
  };
}

/** The squares of a token: a file letter, a square, or squares joined by bars. */
function squares(token: string, turn: Turn): Square[] {
  return token.split('|').flatMap((part) => {
    if (part.length === 1) return RANKS.map((rank) => turn(sq(`${fileNamed(part)}${rank}`)));
    const square = squareNamed(part);
    if (square === undefined) throw new Error(`not a square in the table of structures: ${part}`);
    return [turn(square)];
  });
}

function fileNamed(part: string): FileName {
  const file = FILES.find((name) => name === part);
  if (file === undefined) throw new Error(`not a file in the table of structures: ${part}`);
  return file;
}

function words(list: readonly Square[]): PawnWords {
  let low = 0;
  let high = 0;
  for (const square of list) {
    if (square < 32) low |= 1 << square;
    else high |= 1 << (square - 32);
  }
  return { low, high };
}

function sameDemands(a: SideDemands, b: SideDemands): boolean {
  const text = (side: SideDemands) =>
    JSON.stringify([side.core, side.bare, side.either.map(wordsText).sort(), side.usual.map(wordsText).sort()]);
  return text(a) === text(b);
}

function wordsText({ low, high }: PawnWords): string {
  return `${low}:${high}`;
}
