/** Routes of a side: which placements help most, how the men get there, and what must come first. Start here. */
import { kindOn } from '../attacks';
import type { Position } from '../board';
import { PARTS } from '../posts';
import { type SquareTable, squareTable } from '../squares';
import type { Side, Square } from '../types';
import { challengeOf, dropsOf, stepOn } from './describe';
import { type Field, fieldWith, guardPlacement, merit, type Placement, placementOn, rowNow } from './placements';
import { type Prepared, preparationOn, preparationsFor } from './preparations';
import { byMerit, rankPlacements } from './rank';
import type { PartCounts, PreparationValue, RoutesValue, RouteValue } from './values';
import { stopsTo, type Ways } from './ways';

export interface RoutesOptions {
  /** One man only: the square of a knight, bishop, rook or queen. */
  readonly from?: Square;
  /** Whose routes; the side of the man, else the side to move, unless said. */
  readonly side?: Side;
  /** Longest route, 1 to 6 moves of the man; 4 unless said. */
  readonly movesMax?: number;
  /** Most choices given; 12 unless said. */
  readonly choicesMax?: number;
}

const MOVES_UNSAID = 4;
const CHOICES_UNSAID = 12;
/** Men whose preparations are looked for, in the order of their best placement. */
const PREPARED_MEN_MAX = 3;
/** Posts that a preparation opens and that are weighed, a man. */
const PREPARED_POSTS_MAX = 4;

/** The placements that help a side most, best first, each with the way there. Empty where `from` holds no such piece. */
export function routes(position: Position, options: RoutesOptions = {}): RoutesValue {
  const { from, movesMax = MOVES_UNSAID, choicesMax = CHOICES_UNSAID } = options;
  const side = options.side ?? (from === undefined ? position.sideToMove : sideAt(position, from));
  if (from !== undefined && !isPieceOf(position, side, from)) return { side, choices: [] };
  const ranking = rankPlacements(position, side, { movesMax, choicesMax, ...(from === undefined ? {} : { from }) });
  const { field } = ranking;
  const table = squareTable(field.safety);
  const preparedOf = preparationsOfMen(field, ranking.placements, movesMax);
  const opened = [...preparedOf.values()].flatMap(({ ways, prepared }) => openedPosts(field, ways, prepared));
  const all: Choice[] = [...ranking.placements.map((placement) => ({ placement, needs: null })), ...opened];
  all.sort(byMeritOf);
  const choices = all.slice(0, choicesMax).map((choice) => {
    const men = preparedOf.get(choice.placement.man);
    const found = men && choice.needs === null ? shortcuts(field, men.ways, men.prepared, choice.placement.post) : [];
    return describe(field, table, choice, found);
  });
  return { side, choices };
}

interface Choice {
  readonly placement: Placement;
  readonly needs: PreparationValue | null;
}

/** Choices closer than this in merit count as equal. */
const GRAIN = 1e-9;

function meritOf({ placement, needs }: Choice): number {
  return Math.round(merit(placement, needs !== null) / GRAIN) * GRAIN;
}

function byMeritOf(a: Choice, b: Choice): number {
  return meritOf(b) - meritOf(a) || byMerit(a.placement, b.placement);
}

function sideAt({ board }: Position, square: Square): Side {
  return board[square]! >> 3 ? 'black' : 'white';
}

function isPieceOf(position: Position, side: Side, square: Square): boolean {
  const place = position.board[square]! & 7;
  return place >= 2 && place <= 5 && sideAt(position, square) === side;
}

interface PreparedMan {
  readonly ways: Ways;
  readonly prepared: readonly Prepared[];
}

function preparationsOfMen(field: Field, placements: readonly Placement[], movesMax: number): Map<Square, PreparedMan> {
  const men = new Map<Square, PreparedMan>();
  for (const { man, ways } of placements) {
    if (men.has(man)) continue;
    if (men.size >= PREPARED_MEN_MAX) break;
    men.set(man, { ways, prepared: preparationsFor(field, ways, movesMax) });
  }
  return men;
}

/** Posts that only a preparation opens, weighed on the board after it, the best few with the guard's word. */
function openedPosts(field: Field, ways: Ways, prepared: readonly Prepared[]): Choice[] {
  const best = new Map<Square, Choice>();
  for (const each of prepared) {
    // What is won and lost is compared with the position before the preparation.
    const after = fieldWith(each.position, field.ground.side, field);
    const now = rowNow(after, ways.from);
    for (let post = 0; post < 64; post++) {
      if (ways.moves[post]! >= 0) continue;
      const needs = preparationOn(field, ways, each, post as Square);
      if (needs === null) continue;
      const choice = { placement: placementOn(after, each.ways, now, post as Square), needs };
      const known = best.get(post as Square);
      if (known === undefined || meritOf(choice) > meritOf(known)) best.set(post as Square, choice);
    }
  }
  const likely = [...best.values()].sort(byMeritOf).slice(0, PREPARED_POSTS_MAX);
  for (const { placement } of likely) guardPlacement(placement);
  return likely;
}

function shortcuts(field: Field, ways: Ways, prepared: readonly Prepared[], post: Square): PreparationValue[] {
  const found = prepared.map((each) => preparationOn(field, ways, each, post)).filter((each) => each !== null);
  return found.sort((a, b) => a.moves - b.moves).slice(0, 3);
}

function describe(
  field: Field,
  table: SquareTable,
  { placement, needs }: Choice,
  preparations: readonly PreparationValue[],
): RouteValue {
  const { man, post, ways, moves, gain } = placement;
  const there = placement.field;
  const stops = stopsTo(ways, post);
  return {
    man,
    kind: kindOn(field.map, man),
    post,
    moves,
    stops,
    shortest: ways.counts[post]!,
    steps: stops.map((stop) => stepOn(there, man, stop)),
    parts: partsOf(placement),
    gain,
    challenge: challengeOf(there, man, post),
    drops: dropsOf(there, there === field ? table : squareTable(there.safety), man, post),
    preparations: needs === null ? preparations : [needs],
    needs,
    guard: placement.guard ?? { verdict: 'unknown', line: [], loses: 0 },
    guardStop: placement.guardStop ?? post,
  };
}

function partsOf({ now, there }: Placement): PartCounts {
  return Object.fromEntries(
    PARTS.map(({ name }, place) => [name, { now: now[place]!, there: there[place]! }]),
  ) as PartCounts;
}
