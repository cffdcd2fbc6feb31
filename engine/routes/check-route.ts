/** Checking a route that a person gives: step by step, with the first step that fails and why. */
import { attackMap } from '../attacks';
import { type Position, squareNamed } from '../board';
import { lossOn } from '../exchange';
import { fail, ok, type Result } from '../result';
import { KINDS, type Kind, type Side, type Square } from '../types';
import { type GuardValue, guardOf } from '../tactics';
import { bears, isKingAttacked, moved } from './boards';
import { stepOn } from './describe';
import { type Field, fieldOf } from './placements';
import type { StepValue } from './values';

/**
 * Verdict of a step. `not-a-move`: the man does not move so, or something stands in between. `own-man`, `captures`:
 * the square is taken by an own or an enemy man, and a route takes nothing. `exposes-king`: its own king would stand
 * in check. `gives-check`: before the last step; the enemy cannot stand still then. `unsafe`: the man is lost there by
 * exchange. `loses`: the guard sees something lost.
 */
export const STEP_CODES = [
  'fine',
  'not-a-move',
  'own-man',
  'captures',
  'exposes-king',
  'gives-check',
  'unsafe',
  'loses',
] as const;
export type StepCode = (typeof STEP_CODES)[number];

export interface CheckedStep {
  readonly to: Square;
  readonly code: StepCode;
  /** Pawns lost by exchange on the square, where the step is a move at all. */
  readonly loses: number;
  /** What the step looks like; null where it is no move. */
  readonly step: StepValue | null;
  readonly guard: GuardValue | null;
}

export interface CheckedRoute {
  readonly man: Square;
  readonly kind: Kind;
  readonly side: Side;
  readonly steps: readonly CheckedStep[];
  /** Place of the first step that is not fine, from 0; null where all are. */
  readonly firstFault: number | null;
}

/** Why a route could not be read at all: `place` is that of the text at fault in the list, from 0. */
export interface RouteFault {
  readonly code: 'empty' | 'not-a-square' | 'no-piece' | 'no-such-move' | 'ambiguous' | 'too-long';
  readonly place: number;
}

/** Most steps that are read. */
export const CHECKED_STEPS_MAX = 12;

/**
 * Checks a route given as squares, the man's own first (`['f3', 'd2', 'f1']`), or as SAN of its moves in turn, the
 * enemy passing (`['Nd2', 'Nf1']`). After a step that is no move nothing further is tried.
 */
export function checkRoute(position: Position, given: readonly string[]): Result<CheckedRoute, RouteFault> {
  const read = squaresOf(position, given);
  if (!read.ok) return read;
  const [man, ...stops] = read.value;
  const code = man === undefined ? 0 : position.board[man]!;
  const kind = KINDS[(code & 7) - 1];
  if (man === undefined || kind === undefined || kind === 'pawn' || kind === 'king') {
    return fail({ code: 'no-piece', place: 0 });
  }
  const side: Side = code >> 3 ? 'black' : 'white';
  const field = fieldOf(position, side);
  const steps: CheckedStep[] = [];
  let at = man;
  for (const [place, to] of stops.entries()) {
    const step = checkStep(field, man, at, to, place === stops.length - 1);
    steps.push(step);
    if (step.step === null) break;
    at = to;
  }
  const fault = steps.findIndex((step) => step.code !== 'fine');
  return ok({ man, kind, side, steps, firstFault: fault < 0 ? null : fault });
}

function checkStep(field: Field, man: Square, at: Square, to: Square, isLast: boolean): CheckedStep {
  const { map, ground } = field;
  const { board } = map;
  const place = board[man]! & 7;
  const none = { to, loses: 0, step: null, guard: null };
  const occupant = to === man ? 0 : board[to]!;
  if (at === to || !bears(board, place, at, to, man)) return { ...none, code: 'not-a-move' };
  if (occupant !== 0) return { ...none, code: occupant >> 3 === ground.index ? 'own-man' : 'captures' };
  const after = moved(board, man, to);
  const afterMap = attackMap({ board: after });
  if (isKingAttacked(afterMap, ground.index)) return { ...none, code: 'exposes-king' };
  const loses = lossOn(map, ground.index, place, to, man);
  const guard = guardOf(after, ground.index ^ 1);
  const givesCheck = !isLast && isKingAttacked(afterMap, ground.index ^ 1);
  const code = loses > 0 ? 'unsafe' : guard.verdict === 'loses' ? 'loses' : givesCheck ? 'gives-check' : 'fine';
  return { to, code, loses, step: stepOn(field, man, to), guard };
}

/** The squares of a given route, the man's first. */
function squaresOf(position: Position, given: readonly string[]): Result<Square[], RouteFault> {
  if (given.length === 0) return fail({ code: 'empty', place: 0 });
  if (given.length > CHECKED_STEPS_MAX + 1) return fail({ code: 'too-long', place: CHECKED_STEPS_MAX + 1 });
  const squares = given.map((text) => squareNamed(text.trim()));
  const unread = squares.indexOf(undefined);
  if (unread < 0) {
    return squares.length < 2 ? fail({ code: 'empty', place: 0 }) : ok(squares.filter((each) => each !== undefined));
  }
  return unread === 0 ? squaresOfSan(position, given) : fail({ code: 'not-a-square', place: unread });
}

const SAN = /^([NBRQ])([a-h]?)([1-8]?)x?([a-h][1-8])[+#]?[!?]*$/;

/** The squares of moves in SAN by one man: the first finds the man, the others must be its own. */
function squaresOfSan(position: Position, given: readonly string[]): Result<Square[], RouteFault> {
  const squares: Square[] = [];
  for (const [place, text] of given.entries()) {
    const read = SAN.exec(text.trim());
    const to = read?.[4] === undefined ? undefined : squareNamed(read[4]);
    if (!read || to === undefined) return fail({ code: 'no-such-move', place });
    if (place === 0) {
      const men = moversTo(position, read, to);
      if (men.length !== 1) return fail({ code: men.length === 0 ? 'no-such-move' : 'ambiguous', place });
      squares.push(...men);
    } else if ((position.board[squares[0]!]! & 7) !== placeOf(read)) return fail({ code: 'no-such-move', place });
    squares.push(to);
  }
  return ok(squares);
}

function placeOf(read: RegExpExecArray): number {
  return 'NBRQ'.indexOf(read[1] ?? '') + 2;
}

/** Men of the side to move that a SAN text can mean; those that the move would leave in check are no such men. */
function moversTo({ board, sideToMove }: Position, read: RegExpExecArray, to: Square): Square[] {
  const side = sideToMove === 'white' ? 0 : 1;
  const men: Square[] = [];
  for (let from = 0; from < 64; from++) {
    if (board[from] !== ((side << 3) | placeOf(read))) continue;
    if (read[2] && 'abcdefgh'.indexOf(read[2]) !== (from & 7)) continue;
    if (read[3] && Number(read[3]) - 1 !== from >> 3) continue;
    if (!bears(board, placeOf(read), from as Square, to, -1)) continue;
    if (!isKingAttacked(attackMap({ board: moved(board, from as Square, to) }), side)) men.push(from as Square);
  }
  return men;
}
