/** Answers the routes page: run by the server for an address, by the worker for every change after. */
import {
  checkRoute,
  encodeCheck,
  encodeRoutes,
  formatFen,
  parseFen,
  type Position,
  readPosition,
  routes,
} from '@/engine';
import { manOn, squareName, squareNamed } from '@/engine/board';
import { routeFaultText } from '@/engine/explain';
import { MOVE_COST, PREPARATION_MOVES } from '@/engine/posts';
import { allWays, fieldOf, type RoutesValue, waysOf } from '@/engine/routes';
import type { Reading } from '@/engine/reading/schema';
import type { RouteChoice } from '@/engine/reading/schema/routes';
import type { Side, Square } from '@/engine/types';
import type { Answer, Ask, ManRow, RankedChoice } from './ask';

/** Longest way looked for, in moves of the man. */
const MOVES_MAX = 4;
/** Posts of one man that are listed. */
const MAN_CHOICES_MAX = 12;
/** Posts of the side that are listed, and placements that are weighed so that every man has its best among them. */
const SIDE_CHOICES_MAX = 12;
const SIDE_WEIGHED_MAX = 96;
/** Other ways of the same length that are drawn: more would hide the board. */
const OTHERS_MAX = 3;

/** Computes the whole answer in place: some 25 ms for a side. Throws where the FEN cannot be read, which the page has done before. */
export function answerRoutes(ask: Ask): Answer {
  const position = openedPosition(ask.fen);
  const { man, of } = ask;
  const from = man === null ? undefined : squareNamed(man);
  const side = sideOf(position, of, from);
  return { ...postsOf(position, side, from), ...given(position, ask.route) };
}

type Posts = Omit<Answer, 'check' | 'fault'>;

/** The posts that were computed last: a route drawn stop by stop asks for the same again and again. */
let last: { readonly key: string; readonly posts: Posts } | null = null;

function postsOf(position: Position, side: Side, from: Square | undefined): Posts {
  const key = `${formatFen(position)} ${side} ${from ?? ''}`;
  if (last?.key === key) return last.posts;
  const bounds = { side, movesMax: MOVES_MAX };
  const whole = routes(position, { ...bounds, choicesMax: SIDE_WEIGHED_MAX });
  const asked = from === undefined ? whole : routes(position, { ...bounds, from, choicesMax: MAN_CHOICES_MAX });
  const listed = asked.choices.slice(0, from === undefined ? SIDE_CHOICES_MAX : MAN_CHOICES_MAX);
  const { engine, choices } = encodeRoutes(position, { side, choices: listed });
  const posts = {
    engine,
    reading: bareReading(readPosition(position)),
    side,
    men: menOf(position, whole),
    choices: withOthers(position, side, choices),
  };
  last = { key, posts };
  return posts;
}

function openedPosition(fen: string): Position {
  const strict = parseFen(fen, 'strict');
  if (strict.ok) return strict.value.position;
  const diagram = parseFen(fen, 'diagram');
  if (!diagram.ok) throw new Error('Routes are asked of a position that can be read.');
  return diagram.value.position;
}

function sideOf(position: Position, of: Side | null, from: Square | undefined): Side {
  const man = from === undefined ? null : manOn(position, from);
  return man?.side ?? of ?? position.sideToMove;
}

/** What orders a choice: its gain, less what its moves cost. */
function meritOf({ gain, moves, needs }: Pick<RouteChoice, 'gain' | 'moves' | 'needs'>): number {
  return gain - MOVE_COST * (moves - 1 + (needs === null ? 0 : PREPARATION_MOVES));
}

function menOf(position: Position, { side, choices }: RoutesValue): ManRow[] {
  const men: ManRow[] = [];
  for (let square = 0; square < 64; square++) {
    const man = manOn(position, square as Square);
    if (!man || man.side !== side || man.kind === 'pawn' || man.kind === 'king') continue;
    const best = choices.find((choice) => choice.man === square);
    men.push({
      square: squareName(square as Square),
      kind: man.kind,
      best: best
        ? {
            post: squareName(best.post),
            moves: best.moves,
            merit: meritOf({ gain: best.gain, moves: best.moves, needs: best.needs === null ? null : '' }),
          }
        : null,
    });
  }
  const worth = ({ best }: ManRow) => best?.merit ?? Number.NEGATIVE_INFINITY;
  return men.sort((a, b) => (worth(a) === worth(b) ? 0 : worth(b) - worth(a)));
}

/** The choices with the other ways of the same length; those after a preparation have the shown way only. */
function withOthers(position: Position, side: Side, choices: readonly RouteChoice[]): RankedChoice[] {
  const { safety } = fieldOf(position, side);
  return choices.map((choice) => {
    const man = squareNamed(choice.man);
    const post = squareNamed(choice.post);
    const merit = meritOf(choice);
    if (man === undefined || post === undefined || choice.needs !== null || choice.shortest < 2) {
      return { ...choice, merit, others: [] };
    }
    const shown = choice.stops.join();
    const others = allWays(safety, waysOf(safety, man, choice.moves), post, OTHERS_MAX + 1)
      .map((stops) => stops.map(squareName))
      .filter((stops) => stops.join() !== shown)
      .slice(0, OTHERS_MAX);
    return { ...choice, merit, others };
  });
}

function given(position: Position, route: readonly string[]): Pick<Answer, 'check' | 'fault'> {
  if (route.length === 0) return { check: null, fault: null };
  const checked = checkRoute(position, route);
  return checked.ok
    ? { check: encodeCheck(position, checked.value), fault: null }
    : { check: null, fault: routeFaultText(checked.fault, route) };
}

/** The reading without its long lists, which this page does not show. */
function bareReading(reading: Reading): Reading {
  return {
    ...reading,
    squares: [],
    weakSquares: [],
    outposts: [],
    files: [],
    diagonals: [],
    statements: [],
    lead: [],
  };
}
