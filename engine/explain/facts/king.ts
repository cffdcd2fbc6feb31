/** Facts about kings. */
import type { FileName, Side, SquareName } from '../../types';
import type { ManAt } from '../words';
import type { FactBase } from './base';

export interface InCheck extends FactBase {
  readonly id: 'in-check';
  readonly side: Side;
  readonly king: SquareName;
  readonly checkers: readonly ManAt[];
}

export interface WholeShelter extends FactBase {
  readonly id: 'shelter-whole';
  readonly side: Side;
  readonly king: SquareName;
  readonly pawns: readonly SquareName[];
}

export interface BrokenShelter extends FactBase {
  readonly id: 'shelter-broken';
  readonly side: Side;
  readonly king: SquareName;
  /** Files of the king and beside it without an own pawn level with it or ahead. */
  readonly bare: readonly FileName[];
  /** Shelter pawns that have advanced two ranks or more. */
  readonly advanced: readonly SquareName[];
}

export interface NoLuft extends FactBase {
  readonly id: 'no-luft';
  readonly side: Side;
  readonly king: SquareName;
  /** The king has no flight at all, not even along its rank. */
  readonly noFlight: boolean;
  readonly gives: readonly { readonly from: SquareName; readonly to: SquareName }[];
}

export interface NoFlight extends FactBase {
  readonly id: 'no-flight';
  readonly side: Side;
  readonly king: SquareName;
}

export interface OpenLineBeside extends FactBase {
  readonly id: 'open-line-beside-king';
  readonly side: Side;
  readonly king: SquareName;
  /** Its file and those beside it that have no enemy pawn, all of one status: open, or half-open for the enemy. */
  readonly files: readonly FileName[];
  readonly status: 'open' | 'half-open';
  /** Enemy rooks and queens on them. */
  readonly heavy: readonly ManAt[];
}

export interface KingZone extends FactBase {
  readonly id: 'king-zone';
  readonly side: Side;
  readonly king: SquareName;
  readonly attackers: readonly ManAt[];
  readonly guards: number;
}

export interface WeakBackRank extends FactBase {
  readonly id: 'weak-back-rank';
  readonly side: Side;
  readonly king: SquareName;
}

export type KingFact =
  | InCheck
  | WholeShelter
  | BrokenShelter
  | NoLuft
  | NoFlight
  | OpenLineBeside
  | KingZone
  | WeakBackRank;
