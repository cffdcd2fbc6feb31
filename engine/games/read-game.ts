/** A game read: its timeline, journeys, commitments, and the moves that lasting features come from. Start here. */
import { formatFen, type Position } from '../board';
import { newDesk, readValues } from '../reading';
import { type Step, Walk } from '../rules';
import type { Side, SquareName } from '../types';
import { type CompactReading, compactOf } from './compact';
import { type Feature, type FeatureKind, featuresOf } from './features';
import { type Journey, journeysOf } from './journeys';
import type { ReplayedGame } from './replay';

/** A position of the game with the move that led to it. */
export interface TimelinePly extends CompactReading {
  /** Half-moves played. */
  readonly ply: number;
  /** '12. Nf3', '12... c5'; null at the beginning. */
  readonly move: string | null;
  readonly fen: string;
}

/** A lasting feature that a move made or ended. */
export interface FeatureChange {
  readonly kind: FeatureKind;
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  readonly made: boolean;
  readonly text: string;
}

/** A move that cannot be taken back, and what it changed for good. */
export interface Commitment {
  readonly ply: number;
  readonly move: string;
  readonly side: Side;
  readonly act: 'pawn-move' | 'capture' | 'promotion';
  readonly changes: readonly FeatureChange[];
  /** The move and its changes in a sentence. */
  readonly text: string;
}

/** A lasting feature of the last position and the move since which it has been there without a break. */
export interface Origin {
  readonly kind: FeatureKind;
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  readonly text: string;
  /** 0: it was there at the beginning. */
  readonly ply: number;
  readonly move: string | null;
}

export interface GameReading {
  readonly timeline: readonly TimelinePly[];
  readonly journeys: readonly Journey[];
  readonly commitments: readonly Commitment[];
  readonly origins: readonly Origin[];
}

type Features = ReadonlyMap<string, Feature>;

/** Reads every position of a game. */
export function readGame({ start, steps, game }: ReplayedGame): GameReading {
  const desk = newDesk();
  const timeline: TimelinePly[] = [];
  const features: Features[] = [];
  const look = (position: Position, ply: number, move: string | null): void => {
    const values = readValues(position, desk);
    timeline.push({ ply, move, fen: formatFen(position), ...compactOf(values) });
    features.push(featuresOf(values));
  };
  look(start, 0, null);
  const walk = new Walk(start);
  for (const [place, { text }] of game.moves.entries()) {
    const { fullmove, side } = walk.turn;
    walk.step(text);
    look(walk.position(), place + 1, `${fullmove}${side === 'white' ? '.' : '...'} ${steps[place]!.san}`);
  }
  return {
    timeline,
    journeys: journeysOf(start, steps),
    commitments: commitmentsOf(timeline, features, steps),
    origins: originsOf(timeline, features),
  };
}

/** So many half-moves later a change must still stand, or the game be over: a pawn that is taken back at once changed nothing. */
const LASTS_PLIES = 2;

function commitmentsOf(
  timeline: readonly TimelinePly[],
  features: readonly Features[],
  steps: readonly Step[],
): Commitment[] {
  return steps.flatMap((step, place): Commitment[] => {
    const isPawn = (step.man & 7) === 1;
    if (!isPawn && step.captured === 0) return [];
    const ply = place + 1;
    const [before, after] = [features[place]!, features[ply]!];
    const later = features.slice(ply, ply + 1 + LASTS_PLIES);
    const made = [...after.values()].filter(({ key }) => !before.has(key) && later.every((each) => each.has(key)));
    const ended = [...before.values()].filter(
      ({ key, kind }) => ENDS.has(kind) && later.every((each) => !each.has(key)),
    );
    const changes = [...made.map((each) => changeOf(each, true)), ...ended.map((each) => changeOf(each, false))];
    if (changes.length === 0) return [];
    const move = timeline[ply]!.move!;
    const act = step.promoted > 0 ? 'promotion' : step.captured !== 0 ? 'capture' : 'pawn-move';
    const text = `${move}: ${changes.map((change) => change.text).join('. ')}.`;
    return [{ ply, move, side: step.man >> 3 ? 'black' : 'white', act, changes, text }];
  });
}

/** Features whose end is worth a word: the others end with the pawn or file that bears them. */
const ENDS: ReadonlySet<FeatureKind> = new Set<FeatureKind>([
  'structure',
  'weak-square',
  'outpost',
  'bishop-pair',
  'weak-complex',
]);

function changeOf({ kind, side, squares, claim, end }: Feature, made: boolean): FeatureChange {
  return { kind, side, squares, made, text: made ? claim : end };
}

function originsOf(timeline: readonly TimelinePly[], features: readonly Features[]): Origin[] {
  const last = features.length - 1;
  return [...features[last]!.values()].map(({ key, kind, side, squares, claim }) => {
    let ply = last;
    while (ply > 0 && features[ply - 1]!.has(key)) ply--;
    return { kind, side, squares, text: claim, ply, move: timeline[ply]!.move };
  });
}
