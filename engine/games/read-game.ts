/** A game read: its timeline, journeys, commitments, and the moves that lasting features come from. Start here. */
import { formatFen, PAWN, type Position } from '../board';
import { newDesk, readValues } from '../reading';
import { type Step, Walk } from '../rules';
import { SIDES } from '../types';
import { type Commitment, commitmentsOf, type Origin, originsOf } from './commitments';
import { type CompactReading, compactOf } from './compact';
import { canCastle, type Features, featuresOf } from './features';
import { type Journey, journeysOf } from './journeys';
import { follow, lineageOf } from './lineage';
import type { ReplayedGame } from './replay';

/** A position of the game with the move that led to it. */
export interface TimelinePly extends CompactReading {
  /** Half-moves played. */
  readonly ply: number;
  /** '12. Nf3', '12... c5'; null at the beginning. */
  readonly move: string | null;
  readonly fen: string;
}

export interface GameReading {
  /** One entry a position, the start first. */
  readonly timeline: readonly TimelinePly[];
  readonly journeys: readonly Journey[];
  readonly commitments: readonly Commitment[];
  readonly origins: readonly Origin[];
}

/** Reads every position of a game. */
export function readGame({ start, steps, game }: ReplayedGame): GameReading {
  const desk = newDesk();
  const lineage = lineageOf(start);
  const timeline: TimelinePly[] = [];
  const features: Features[] = [];
  const positions: Position[] = [start];
  const walk = new Walk(start);
  const look = (position: Position, move: string | null, ply: number, canReuse: boolean): void => {
    const values = readValues(position, desk);
    timeline.push({ ply, move, fen: formatFen(position), ...compactOf(values) });
    features.push(canReuse ? features[ply - 1]! : featuresOf(values, lineage));
  };
  look(start, null, 0, false);
  for (const [place, step] of steps.entries()) {
    const { fullmove, side } = walk.turn;
    walk.step(game.moves[place]!.text);
    follow(lineage, step);
    const position = walk.position();
    const isLast = place === steps.length - 1;
    look(
      position,
      `${fullmove}${side === 'white' ? '.' : '...'} ${step.san}`,
      place + 1,
      !isLast && isReversible(step, positions[place]!, position),
    );
    positions.push(position);
  }
  const found = { features, moves: timeline.map(({ move }) => move), positions, steps };
  return {
    timeline,
    journeys: journeysOf(start, steps),
    commitments: commitmentsOf(found),
    origins: originsOf(found),
  };
}

/** Whether a move can make or end no lasting feature. */
function isReversible({ man, captured }: Step, before: Position, after: Position): boolean {
  if ((man & 7) === PAWN || captured !== 0) return false;
  return SIDES.every((side) => canCastle(before, side) === canCastle(after, side));
}
