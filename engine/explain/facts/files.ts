/** Facts about files, the seventh rank and diagonals. */
import type { FileName, Side, SquareName } from '../../types';
import type { ManAt } from '../words';
import type { FactBase } from './base';

export interface OwnedFile extends FactBase {
  readonly id: 'file-owned';
  readonly side: Side;
  readonly file: FileName;
  readonly status: 'open' | 'half-open';
  readonly heavy: readonly ManAt[];
  readonly entries: readonly SquareName[];
}

export interface ContestedFile extends FactBase {
  readonly id: 'file-contested';
  readonly file: FileName;
  /** Heavy men of both sides on it, those of the side to move first. */
  readonly heavy: readonly ManAt[];
}

export interface IdleFile extends FactBase {
  readonly id: 'file-open-no-entry';
  readonly file: FileName;
}

export interface HalfOpenTarget extends FactBase {
  readonly id: 'half-open-target';
  readonly side: Side;
  readonly file: FileName;
  readonly target: SquareName;
  readonly why: 'isolated' | 'backward' | 'unguarded';
  /** Heavy men of the side on the file. */
  readonly heavy: readonly ManAt[];
}

export interface HalfOpenNothing extends FactBase {
  readonly id: 'half-open-nothing';
  readonly side: Side;
  readonly file: FileName;
  readonly pawn: SquareName;
  /** Pawns that guard it. */
  readonly guards: readonly SquareName[];
}

export interface RookToFile extends FactBase {
  readonly id: 'rook-to-file';
  readonly side: Side;
  readonly rook: SquareName;
  readonly to: SquareName;
  readonly moves: number;
  readonly file: FileName;
  readonly status: 'open' | 'half-open';
}

export interface DoubledHeavy extends FactBase {
  readonly id: 'heavy-doubled';
  readonly side: Side;
  readonly file: FileName;
  readonly heavy: readonly ManAt[];
}

export interface ManOnFile extends FactBase {
  readonly id: 'file-man-target';
  /** The side whose heavy men press. */
  readonly side: Side;
  readonly file: FileName;
  /** The enemy knight or bishop that no pawn guards, next on the file after the foremost heavy man. */
  readonly target: ManAt;
  readonly heavy: readonly ManAt[];
}

export interface OnSeventh extends FactBase {
  readonly id: 'on-seventh';
  readonly side: Side;
  readonly men: readonly SquareName[];
  readonly heavy: readonly ManAt[];
  /** Enemy pawns on that rank. */
  readonly pawns: readonly SquareName[];
}

export interface ToSeventh extends FactBase {
  readonly id: 'to-seventh';
  readonly side: Side;
  readonly man: ManAt;
  readonly to: SquareName;
  readonly moves: number;
}

export interface LongDiagonal extends FactBase {
  readonly id: 'long-diagonal-open';
  readonly side: Side;
  readonly man: ManAt;
  readonly last: SquareName;
  readonly seen: number;
}

export interface ShutDiagonal extends FactBase {
  readonly id: 'diagonal-shut';
  readonly side: Side;
  readonly man: ManAt;
  readonly stopper: SquareName;
  readonly stopperSide: Side;
}

export type FilesFact =
  | OwnedFile
  | ContestedFile
  | IdleFile
  | HalfOpenTarget
  | HalfOpenNothing
  | RookToFile
  | DoubledHeavy
  | ManOnFile
  | OnSeventh
  | ToSeventh
  | LongDiagonal
  | ShutDiagonal;
