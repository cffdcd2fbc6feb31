/** Facts about pawns. */
import type { Colour, FileName, Side, SquareName } from '../../types';
import type { ManAt } from '../words';
import type { FactBase } from './base';

export interface NamedStructure extends FactBase {
  readonly id: 'named-structure';
  readonly name: string;
  /** The side with the leading part. */
  readonly leader: Side;
  readonly differs: number;
  /** What the structure means, as a clause. */
  readonly lead: string;
}

export interface CentreState extends FactBase {
  readonly id: 'centre-fixed' | 'centre-open' | 'centre-tension';
  /** Rams on the d- and e-file, or pawns that can take each other; the pawn of the side to move first. */
  readonly pairs: readonly (readonly [SquareName, SquareName])[];
}

export interface WeakPawn extends FactBase {
  readonly id: 'isolated-pawn';
  readonly side: Side;
  readonly pawn: SquareName;
  readonly neighbours: readonly FileName[];
  /** The file is half-open for the enemy. */
  readonly halfOpen: boolean;
}

export interface DoubledPawns extends FactBase {
  readonly id: 'doubled-pawns';
  readonly side: Side;
  readonly pawns: readonly SquareName[];
  /** No own pawn stands on the next files either. */
  readonly isolated: boolean;
}

export interface BackwardPawn extends FactBase {
  readonly id: 'backward-pawn';
  readonly side: Side;
  readonly pawn: SquareName;
  readonly file: FileName;
  readonly stop: SquareName;
  /** Who holds the stop square: an enemy pawn's attack, the enemy's command, or nobody in particular. */
  readonly stopHeldBy: 'pawn' | 'command' | null;
  readonly halfOpen: boolean;
}

export interface PassedPawn extends FactBase {
  readonly id: 'passed-pawn' | 'protected-passed-pawn';
  readonly side: Side;
  readonly pawn: SquareName;
  /** Own moves to the last rank on an empty road. */
  readonly moves: number;
  readonly blocker: ManAt | null;
  readonly guards: readonly SquareName[];
}

export interface CandidatePawn extends FactBase {
  readonly id: 'candidate-pawn';
  readonly side: Side;
  readonly pawn: SquareName;
  readonly file: FileName;
}

export interface PawnChain extends FactBase {
  readonly id: 'pawn-chain';
  readonly side: Side;
  /** From the base to the head. */
  readonly pawns: readonly SquareName[];
}

export interface Rams extends FactBase {
  readonly id: 'rams';
  /** The pawn of the side to move first. */
  readonly pairs: readonly (readonly [SquareName, SquareName])[];
}

export interface LeverFact extends FactBase {
  readonly id: 'lever-ready' | 'lever-coming';
  readonly side: Side;
  readonly pawn: SquareName;
  readonly on: SquareName;
  readonly against: SquareName;
  readonly moves: number;
  /** A man of either side in the pawn's way. */
  readonly blocker: ManAt | null;
  /** An own pawn guards the square from which it strikes. */
  readonly supported: boolean;
}

export interface MinorityAttackFact extends FactBase {
  readonly id: 'minority-attack';
  readonly side: Side;
  readonly wing: 'queenside' | 'kingside';
  readonly own: number;
  readonly enemy: number;
  readonly pawn: SquareName;
  readonly on: SquareName;
  readonly against: SquareName;
  /** Pawn moves until it strikes; 0: it does now. */
  readonly moves: number;
  /** A man of either side in the pawn's way. */
  readonly blocker: ManAt | null;
}

export interface Majority extends FactBase {
  readonly id: 'majority' | 'crippled-majority';
  readonly side: Side;
  readonly wing: 'queenside' | 'centre' | 'kingside';
  readonly own: number;
  readonly enemy: number;
  /** Doubled pawns among them. */
  readonly doubled: readonly SquareName[];
}

export interface HangingPawns extends FactBase {
  readonly id: 'hanging-pawns';
  readonly side: Side;
  readonly pawns: readonly SquareName[];
}

export interface Islands extends FactBase {
  readonly id: 'islands';
  /** The side with fewer. */
  readonly fewer: Side;
  readonly fewest: number;
  readonly most: number;
}

export interface PawnsOnColour extends FactBase {
  readonly id: 'pawns-on-colour';
  readonly side: Side;
  readonly colour: Colour;
  readonly count: number;
  readonly total: number;
}

export type StructureFact =
  | NamedStructure
  | CentreState
  | WeakPawn
  | DoubledPawns
  | BackwardPawn
  | PassedPawn
  | CandidatePawn
  | PawnChain
  | Rams
  | LeverFact
  | MinorityAttackFact
  | Majority
  | HangingPawns
  | Islands
  | PawnsOnColour;
