/** Facts about men. */
import type { Colour, Side, SquareName } from '../../types';
import type { ManAt } from '../words';
import type { FactBase } from './base';

export interface PlacedMan extends FactBase {
  readonly id: 'best-placed' | 'worst-placed';
  readonly side: Side;
  readonly man: ManAt;
  readonly safeMoves: number;
  /** Most moves that a man of the kind can have on an empty board. */
  readonly most: number;
  /** Squares of the enemy half that it attacks. */
  readonly enemyHalf: number;
  /** Safe moves to the centre; null where it takes more than three. */
  readonly toCentre: number | null;
}

export interface BadBishop extends FactBase {
  readonly id: 'bad-bishop';
  readonly side: Side;
  readonly square: SquareName;
  readonly colour: Colour;
  readonly onColour: number;
  readonly pawns: number;
  readonly fixed: readonly SquareName[];
  readonly tradeable: boolean;
  readonly lever: {
    readonly pawn: SquareName;
    readonly on: SquareName;
    readonly against: SquareName;
    readonly moves: number;
  } | null;
  readonly outside: { readonly square: SquareName; readonly moves: number } | null;
}

export interface ActiveBadBishop extends FactBase {
  readonly id: 'bad-but-active';
  readonly side: Side;
  readonly square: SquareName;
  readonly onColour: number;
  readonly pawns: number;
  readonly safeMoves: number;
}

export interface RimKnight extends FactBase {
  readonly id: 'knight-on-rim';
  readonly side: Side;
  readonly square: SquareName;
  readonly sees: number;
}

export interface OutOfPlay extends FactBase {
  readonly id: 'out-of-play';
  readonly side: Side;
  readonly man: ManAt;
  readonly safeMoves: number;
  readonly toCentre: number | null;
}

export interface TrappedMan extends FactBase {
  readonly id: 'trapped';
  readonly side: Side;
  readonly man: ManAt;
  readonly attacked: boolean;
}

export interface PinnedMan extends FactBase {
  readonly id: 'pinned';
  readonly side: Side;
  readonly man: ManAt;
  readonly pinner: ManAt;
  readonly king: SquareName;
}

export interface OverloadedMan extends FactBase {
  readonly id: 'overloaded';
  readonly side: Side;
  readonly man: ManAt;
  readonly guards: readonly ManAt[];
}

export interface TiedMan extends FactBase {
  readonly id: 'tied';
  readonly side: Side;
  readonly man: ManAt;
  readonly ward: ManAt;
  /** Pawns that the enemy gains there once it has left, beyond those of `already`. */
  readonly loses: number;
  /** Pawns that the enemy gains there now. */
  readonly already: number;
  readonly by: 'guard' | 'screen';
}

export interface LooseMan extends FactBase {
  readonly id: 'loose';
  readonly side: Side;
  readonly man: ManAt;
}

export interface EnPriseMan extends FactBase {
  readonly id: 'en-prise';
  readonly side: Side;
  readonly man: ManAt;
  readonly gain: number;
  /** Own men that guard it. */
  readonly guards: number;
}

export interface BishopPair extends FactBase {
  readonly id: 'bishop-pair';
  readonly side: Side;
}

export interface BishopAgainstKnight extends FactBase {
  readonly id: 'bishop-against-knight';
  /** The bishop's side. */
  readonly side: Side;
  readonly bishop: SquareName;
  readonly knight: SquareName;
  readonly favours: 'bishop' | 'knight';
  /** Own pawns on the bishop's colour and all own pawns. */
  readonly onColour: number;
  readonly pawns: number;
  readonly rams: number;
}

export interface BlockedIn extends FactBase {
  readonly id: 'blocked-in';
  readonly side: Side;
  readonly man: ManAt;
  readonly by: readonly ManAt[];
}

export type MenFact =
  | PlacedMan
  | BadBishop
  | ActiveBadBishop
  | RimKnight
  | OutOfPlay
  | TrappedMan
  | PinnedMan
  | OverloadedMan
  | TiedMan
  | LooseMan
  | EnPriseMan
  | BishopPair
  | BishopAgainstKnight
  | BlockedIn;
