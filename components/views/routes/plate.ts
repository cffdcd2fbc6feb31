/** The plate of the routes page: the men, the chosen way as a trail, others in lighter ink, and a route of one's own. */
import { type Trail, trailExtra, wayTitle, wayTrails } from '@/components/plate/layers/routes';
import { plateOf } from '@/components/plate/layout';
import type { Plate } from '@/components/plate/types';
import type { SquareName } from '@/engine/types';
import type { Answer, RankedChoice } from './ask';
import { SIDE_NAMES } from './words';

export interface RoutesPlateRequest {
  readonly answer: Answer;
  /** The chosen row of the ranking. */
  readonly choice: RankedChoice | undefined;
  readonly man: SquareName | null;
  readonly flipped: boolean;
  readonly width: number;
  /** Caption and legend in the figure itself, for a file. */
  readonly below: 'drawn' | 'none';
  readonly id: string;
}

/** The ways that the plate shows. A route of one's own sets the chosen way back to lighter ink. */
export function trailsOf({ check, side }: Answer, choice: RankedChoice | undefined): Trail[] {
  if (check === null) return choice ? wayTrails(side, choice, choice.others) : [];
  const stops = check.steps.map(({ to, code }) => ({ square: to, fine: code === 'fine' }));
  const own: Trail = { side: check.side, from: check.man, stops, rank: 'own' };
  if (choice?.man !== check.man) return [own];
  const [ranked] = wayTrails(side, choice, []);
  return ranked ? [own, { ...ranked, rank: 'other' }] : [own];
}

/** The figure. */
export function routesPlate({ answer, choice, man, flipped, width, below, id }: RoutesPlateRequest): Plate {
  const { check, reading, side, engine } = answer;
  const trails = trailsOf(answer, choice);
  const words = trailWords(answer, choice);
  const mover = `${reading.sideToMove === 'white' ? 'White' : 'Black'} to move.`;
  const shownMan = check?.man ?? choice?.man ?? man;
  return plateOf({
    reading,
    layer: 'position',
    width,
    flipped,
    notes: 'none',
    below,
    id,
    caption: {
      title: words,
      text:
        below === 'drawn'
          ? `${mover} The enemy stands still on the way. Waypost engine ${engine} · ${SIDE_NAMES[side]} · ${reading.fen}`
          : `${mover} The enemy stands still on the way.`,
    },
    lit: shownMan === null ? [] : [shownMan],
    extra: trailExtra(trails, words),
  });
}

/** What the plate shows, in a line: its title. */
function trailWords({ check, side }: Answer, choice: RankedChoice | undefined): string {
  if (check) {
    const squares = [check.man, ...check.steps.map(({ to }) => to)].join(', ');
    return `A route of the ${check.kind}: ${squares}${check.holds ? '' : ', which fails'}`;
  }
  if (!choice) return `${SIDE_NAMES[side]}: no way to show`;
  return wayTitle(choice);
}

/** Names of all squares for a reader: what stands there, and which stop it is. */
export function routeLabels(answer: Answer, choice: RankedChoice | undefined): ReadonlyMap<SquareName, string> {
  const labels = new Map<SquareName, string>();
  for (const { square, side, kind } of answer.reading.men) labels.set(square, `${square}, ${side} ${kind}`);
  for (const { stops, rank } of trailsOf(answer, choice)) {
    if (rank === 'other') continue;
    stops.forEach(({ square, fine }, index) => {
      const before = labels.get(square) ?? `${square}, empty`;
      labels.set(square, `${before}, stop ${index + 1}${fine ? '' : ', fails'}`);
    });
  }
  return labels;
}
