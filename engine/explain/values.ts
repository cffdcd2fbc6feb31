/** Everything that is computed of one position, as engine values: what sentences are made from. */
import type { AttackMap } from '../attacks';
import type { Position } from '../board';
import type { Safety } from '../exchange';
import type { DiagonalValue, FileValue, SeventhRank } from '../files';
import type { BishopValue, KingValue, ManValue } from '../men';
import type { PawnMap, PawnValues } from '../pawns';
import type { Reach } from '../reach';
import type { ColourComplex, OutpostValue, SquareTable, SquareTotals, WeakSquareValue } from '../squares';
import type { StructureMatch } from '../structures';
import type { BySide } from '../types';

export interface ReadingValues {
  readonly position: Position;
  readonly map: AttackMap;
  readonly safety: Safety;
  /** Safe moves to every square, up to three. */
  readonly reach: Reach;
  readonly pawnMap: PawnMap;
  readonly pawns: PawnValues;
  readonly structure: StructureMatch | null;
  readonly table: SquareTable;
  readonly weakSquares: readonly WeakSquareValue[];
  readonly outposts: readonly OutpostValue[];
  readonly complexes: readonly ColourComplex[];
  readonly files: readonly FileValue[];
  readonly sevenths: BySide<SeventhRank>;
  readonly diagonals: readonly DiagonalValue[];
  readonly men: readonly ManValue[];
  readonly bishops: readonly BishopValue[];
  readonly kings: BySide<KingValue | null>;
  readonly totals: BySide<SquareTotals>;
}
