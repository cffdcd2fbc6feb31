/** Routes in words: what a choice says as a whole, and why a step of a given route is fine or fails. */
import { PARTS } from '../posts';
import type { RouteFault } from '../routes';
import { MATE } from '../tactics';
import type { CheckedStep, RouteChoice } from '../reading/schema/routes';
import type { Kind, Side, SquareName } from '../types';
import { capital, counted, enemyOf, inWords, listed, name, possessive, theMan } from './words';

/** A choice before its words: what they are made from. */
export type RouteFacts = Omit<RouteChoice, 'text'>;

/** The whole choice in two to five sentences: the way, what must come first, who disputes the post, what is left behind. */
export function routeText(route: RouteFacts, side: Side): string {
  const sentences = [
    wayOf(route),
    gainsOf(route),
    preparationOf(route),
    challengeOf(route, side),
    dropsOf(route),
    guardOf(route, side),
  ];
  return sentences.flatMap((sentence) => (sentence === null ? [] : [`${sentence}.`])).join(' ');
}

function wayOf({ man, kind, post, moves, stops, shortest, needs }: RouteFacts): string {
  const via = stops.slice(0, -1);
  const by = via.length === 0 ? '' : ` by ${listed(via)}`;
  const ways = shortest > 1 ? `, one of ${inWords(shortest)} safe ways` : '';
  const after = needs === null ? '' : `, once ${needs} is played`;
  return `${capital(theMan({ kind, square: man }))} gets to ${post} in ${counted(moves, 'move')}${by}${ways}${after}`;
}

/** Most parts that are named. */
const PARTS_NAMED_MAX = 3;
/** Parts that gain less than this in all are left to the table. */
const GAIN_MIN = 0.1;
/** Parts that order placements but are nothing to say: where the kings are, and what kind of man moves. */
const UNSAID: ReadonlySet<string> = new Set(['fromOwnKing', 'fromEnemyKing', 'heavy', 'check']);

/** What the post gives, the weightiest first, as counts now and there. */
function gainsOf({ parts }: RouteFacts): string | null {
  const gains = PARTS.flatMap(({ name: part, label, weight }) => {
    const { now, there } = parts[part] ?? { now: 0, there: 0 };
    const gain = weight * (there - now);
    return gain >= GAIN_MIN && !UNSAID.has(part) ? [{ gain, words: `${label} ${now} to ${there}` }] : [];
  });
  if (gains.length === 0) return null;
  gains.sort((a, b) => b.gain - a.gain);
  return `What changes for the better: ${gains
    .slice(0, PARTS_NAMED_MAX)
    .map(({ words }) => words)
    .join('; ')}`;
}

function preparationOf({ needs, preparations, moves }: RouteFacts): string | null {
  const [first] = preparations;
  if (first === undefined) return null;
  if (needs !== null) return `With the preparation that makes ${counted(first.moves, 'move')} in all`;
  const saved = moves - first.moves;
  return saved > 0
    ? `${first.move} first shortens it to ${counted(first.moves, 'move')} in all`
    : `${first.move} prepares a way of ${counted(first.moves, 'move')} in all`;
}

function challengeOf({ post, moves, challenge, steps }: RouteFacts, side: Side): string | null {
  const enemy = enemyOf(side);
  const hit = steps[steps.length - 1]?.pawnHit ?? null;
  const pawn =
    hit === null
      ? `No ${enemy} pawn can attack it on ${post}`
      : hit.moves === 0
        ? `The ${enemy} pawn on ${hit.from} attacks ${post}`
        : `The ${enemy} pawn on ${hit.from} can attack it there in ${counted(hit.moves, 'move')}`;
  if (challenge === null || challenge.kind === 'pawn') return pawn;
  const challenger = theMan({ kind: challenge.kind, square: challenge.by });
  if (challenge.moves === 0) return `${pawn}; ${challenger} already bears on ${post}`;
  const race = challenge.moves > moves ? 'later than it arrives' : 'no later than it arrives';
  return `${pawn}; ${challenger} can dispute ${post} in ${counted(challenge.moves, 'move')}, ${race}`;
}

function dropsOf({ drops }: RouteFacts): string | null {
  if (drops.length === 0) return null;
  const wards = listed(drops.map(({ square }) => square));
  return `It leaves ${wards} short of a guard`;
}

function guardOf({ guard }: RouteFacts, side: Side): string | null {
  if (guard.verdict === 'holds') return null;
  if (guard.verdict === 'unknown') return 'The tactical check gave up before its end';
  return `The tactical check finds ${lossText(guard.loses, side)}: ${guard.line.join(' ')}`;
}

/** What the guard's line costs; it counts mate as more than all men together. */
function lossText(loses: number, side: Side): string {
  return loses >= MATE
    ? `mate of ${possessive(side)} king`
    : `a loss of ${counted(loses, 'pawn')}’${loses === 1 ? 's' : ''} worth`;
}

/** Why a step of a given route is fine, or the first thing that is wrong with it. */
export function stepReason(
  { to, code, loses, step, guard }: Omit<CheckedStep, 'reason'>,
  from: SquareName,
  kind: Kind,
  side: Side,
): string {
  const enemy = name(enemyOf(side));
  switch (code) {
    case 'fine':
      return fineReason(to, step, side);
    case 'not-a-move':
      return `The ${kind} does not get from ${from} to ${to} in one move.`;
    case 'own-man':
      return `${capital(to)} is taken by an own man.`;
    case 'captures':
      return `${capital(to)} is taken by an enemy man, and a route captures nothing.`;
    case 'exposes-king':
      return `With the ${kind} on ${to}, ${possessive(side)} own king stands in check.`;
    case 'gives-check':
      return `On ${to} it gives check, so ${enemy} cannot stand still for the next step.`;
    case 'unsafe':
      return `On ${to} it can be taken: ${enemy} gains ${counted(loses, 'pawn')}’${loses === 1 ? 's' : ''} worth there.`;
    case 'loses':
      return `After it ${enemy} has ${guard?.line.join(' ') ?? ''}: ${lossText(guard?.loses ?? 0, side)}.`;
  }
}

function fineReason(to: SquareName, step: CheckedStep['step'], side: Side): string {
  const attackers = step?.attackedBy.length ?? 0;
  const guards = step?.guardedBy.length ?? 0;
  if (attackers === 0) return `${capital(to)} is safe: no ${enemyOf(side)} man attacks it.`;
  return `${capital(to)} is safe by exchange: ${counted(attackers, 'attacker')}, ${counted(guards, 'guard')}.`;
}

/** Why a given route could not be read at all, in a sentence. */
export function routeFaultText({ code, place }: RouteFault, route: readonly string[]): string {
  const given = route[place] ?? '';
  switch (code) {
    case 'empty':
      return 'A route has at least one move: the square of the man and one stop, or one move in SAN.';
    case 'not-a-square':
      return `"${given}" is no square; squares are named a1 to h8.`;
    case 'no-piece':
      return `A route is walked by a knight, bishop, rook or queen; on "${given}" stands none.`;
    case 'no-such-move':
      return `"${given}" is no move of such a man here.`;
    case 'ambiguous':
      return `"${given}" can mean two men; name the file or rank it comes from.`;
    case 'too-long':
      return 'A route has at most twelve moves.';
  }
}
