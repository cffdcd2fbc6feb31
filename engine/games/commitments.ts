/** Commitments: moves that cannot be taken back, and what they changed for good; and origins, the same question asked from the end. */
import { PAWN, type Position, squareNamed } from '../board';
import type { Step } from '../rules';
import type { Side, SquareName } from '../types';
import { endedText, madeText } from './feature-words';
import { type Feature, type FeatureKind, type Features, inTellingOrder, isPawnOn } from './features';

/** How a commitment was made: a king's or rook's move is one where it gives up castling. */
export const ACTS = ['pawn-move', 'capture', 'promotion', 'king-move', 'rook-move'] as const;
export type Act = (typeof ACTS)[number];

/** A lasting feature that a move made or ended. */
export interface FeatureChange {
  readonly kind: FeatureKind;
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  readonly hold: 'permanent' | 'fixed' | null;
  readonly made: boolean;
  /** The change alone, without full stop. */
  readonly text: string;
}

export interface Commitment {
  /** Half-moves played, this move included. */
  readonly ply: number;
  readonly move: string;
  readonly side: Side;
  readonly act: Act;
  readonly changes: readonly FeatureChange[];
  /** The move and its changes, those of one kind in one sentence. */
  readonly text: string;
}

/** A lasting feature of the last position and the move since which it has been there without a break. */
export interface Origin {
  readonly kind: FeatureKind;
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  readonly hold: 'permanent' | 'fixed' | null;
  /** Without full stop. */
  readonly text: string;
  /** 0: it was there at the beginning. */
  readonly ply: number;
  readonly move: string | null;
}

/** What commitments are found from: entry 0 of each list is the start. */
export interface GameFeatures {
  readonly features: readonly Features[];
  readonly moves: readonly (string | null)[];
  readonly positions: readonly Position[];
  readonly steps: readonly Step[];
}

/** So many half-moves later a change must still stand, or the game be over: a pawn that is taken back at once changed nothing. */
const LASTS_PLIES = 2;

/** Features whose end is worth a word: the others end with the pawns that bear them. */
const ENDS: ReadonlySet<FeatureKind> = new Set<FeatureKind>([
  'structure',
  'weak-square',
  'outpost',
  'open-file',
  'half-open-file',
  'bishop-pair',
  'weak-complex',
]);

/** The commitments of a game, in its order; moves that changed nothing for good are left out. */
export function commitmentsOf(game: GameFeatures): Commitment[] {
  const { features, moves, steps } = game;
  const last = features[features.length - 1]!;
  return steps.flatMap((step, place): Commitment[] => {
    const ply = place + 1;
    const [before, after] = [features[place]!, features[ply]!];
    if (before === after) return [];
    const later = features.slice(ply, ply + 1 + LASTS_PLIES);
    // What matters only later is named here too, so that every origin is found among the commitments.
    const side = step.man >> 3 ? 'black' : 'white';
    const order = inTellingOrder(side);
    const made = [...after.values()]
      .filter(
        ({ key, isShown }) =>
          !before.has(key) && later.every((each) => each.has(key)) && (isShown || last.get(key)?.isShown === true),
      )
      .sort(order);
    const ended = [...before.values()]
      .filter(
        (feature) =>
          later.every((each) => !each.has(feature.key)) && isEndWorthAWord(feature, after, game.positions[ply]!),
      )
      .sort(order);
    if (made.length + ended.length === 0) return [];
    const move = moves[ply]!;
    const texts = [...groups(made).map((alike) => madeText(alike, side)), ...groups(ended).map(endedText)];
    return [
      {
        ply,
        move,
        side,
        act: actOf(step),
        changes: [
          ...made.map((each) => changeOf(each, side, true)),
          ...ended.map((each) => changeOf(each, side, false)),
        ],
        text: `${move}: ${texts.join('. ')}.`,
      },
    ];
  });
}

function actOf({ man, captured, promoted }: Step): Act {
  if (promoted > 0) return 'promotion';
  if (captured !== 0) return 'capture';
  return (man & 7) === PAWN ? 'pawn-move' : (man & 7) === 6 ? 'king-move' : 'rook-move';
}

/** Neither where the same is there under another hold or name, nor where a pawn has come to stand on the square. */
function isEndWorthAWord(
  { kind, side, squares, hold, label, isShown }: Feature,
  after: Features,
  at: Position,
): boolean {
  if (!isShown || !ENDS.has(kind)) return false;
  for (const other of after.values()) {
    if (kind === 'structure' && other.kind === 'structure') return false;
    if (kind === 'open-file' && other.kind === 'half-open-file' && other.label === label) return false;
    if (kind === 'half-open-file' && other.label === label && other.kind.endsWith('-file')) return false;
    if (hold !== null && other.kind === kind && other.side === side && other.squares[0] === squares[0]) return false;
  }
  return hold === null || !isPawnOn(at, squareNamed(squares[0]!)!);
}

/** Features alike in kind, side and hold; complexes and structures stand alone. */
function groups(features: readonly Feature[]): [Feature, ...Feature[]][] {
  const found = new Map<string, [Feature, ...Feature[]]>();
  for (const feature of features) {
    const { key, kind, side, hold } = feature;
    const like = kind === 'structure' || kind === 'weak-complex' ? key : `${kind} ${side} ${hold}`;
    const group = found.get(like);
    if (group) group.push(feature);
    else found.set(like, [feature]);
  }
  return [...found.values()];
}

function changeOf(feature: Feature, mover: Side, made: boolean): FeatureChange {
  const { kind, side, squares, hold } = feature;
  return { kind, side, squares, hold, made, text: made ? madeText([feature], mover) : endedText([feature]) };
}

/** For each shown feature of the last position the move that made it: absent before, there ever since. */
export function originsOf({ features, moves, positions }: GameFeatures): Origin[] {
  const last = features.length - 1;
  const shown = [...features[last]!.values()]
    .filter(({ isShown }) => isShown)
    .sort(inTellingOrder(positions[last]!.sideToMove));
  return shown.map((feature) => {
    const { key, kind, side, squares, hold } = feature;
    let ply = last;
    while (ply > 0 && features[ply - 1]!.has(key)) ply--;
    return {
      kind,
      side,
      squares,
      hold,
      text: madeText([feature], positions[ply]!.sideToMove === 'white' ? 'black' : 'white'),
      ply,
      move: moves[ply]!,
    };
  });
}
