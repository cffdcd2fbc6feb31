/** Lasting features in sentences: those of one kind and side together. */
import { capital, inView, listed, name, possessive } from '../explain';
import type { Side, SquareName } from '../types';
import type { Feature } from './features';

/**
 * Features alike in kind, side and hold, as one claim without full stop: 'd3 and f3 are weak for White for good: …'.
 * Of pawns of both sides the mover's is named first.
 */
export function madeText(alike: readonly [Feature, ...Feature[]], mover: Side): string {
  const [{ kind, side, hold, label, squares }] = alike;
  const all = alike.flatMap((each) => (kind === 'ram' ? pair(each, mover) : each.squares));
  const whose = side === null ? '' : name(side);
  const them = all.length === 1 ? 'it' : 'them';
  switch (kind) {
    case 'structure':
      return `Pawn structure: ${label}`;
    case 'weak-square':
      return hold === 'permanent'
        ? `${listed(all)} ${are(all)} weak for ${whose} for good: no ${side} pawn can guard ${them} any more`
        : `${listed(all)} ${are(all)} weak for ${whose} while the pawns stand so: each ${side} pawn that could guard ${them} is stopped`;
    case 'outpost':
      return hold === 'permanent'
        ? `${listed(all)} ${are(all)} ${outposts(all)} of ${possessive(side!)}: a pawn guards ${them}, and no enemy pawn can come`
        : `${listed(all)} ${are(all)} ${outposts(all)} of ${possessive(side!)} while the pawns stand so: each enemy pawn that could come is stopped`;
    case 'open-file':
      return `${filesOf(alike)} open`;
    case 'half-open-file':
      return `${filesOf(alike)} half-open for ${whose}`;
    case 'bishop-pair':
      return `${whose} alone has both bishops`;
    case 'weak-complex':
      return `${possessive(side!)} ${label} squares are weak together: ${listed(inView(squares, side!))}`;
    case 'ram':
      return alike.length === 1
        ? `The pawns on ${listed(all)} stand head to head`
        : `Pawns stand head to head: ${listed(alike.map((ram) => pair(ram, mover).join(' against ')))}`;
    case 'castling-lost':
      return `${whose} can castle no longer`;
    default:
      return capital(`${thePawns(side!, all)} ${are(all)} ${kind.slice(0, -'-pawn'.length)}`);
  }
}

/** The end of features alike, likewise. */
export function endedText(alike: readonly [Feature, ...Feature[]]): string {
  const [{ kind, side, label }] = alike;
  const all = alike.flatMap((each) => each.squares);
  switch (kind) {
    case 'structure':
      return `Pawn structure: ${label} no longer`;
    case 'weak-square':
      return `${listed(all)} ${are(all)} weak for ${name(side!)} no longer: a ${side} pawn can guard ${all.length === 1 ? 'it' : 'them'} again`;
    case 'outpost':
      return `${listed(all)} ${are(all)} ${outposts(all)} of ${possessive(side!)} no longer`;
    case 'bishop-pair':
      return `${name(side!)} alone has both bishops no longer`;
    case 'weak-complex':
      return `${possessive(side!)} ${label} squares are weak together no longer`;
    default:
      return `${filesOf(alike)} closed again`;
  }
}

function pair({ squares }: Feature, mover: Side): readonly SquareName[] {
  return mover === 'white' ? squares : squares.toReversed();
}

function are(list: readonly unknown[]): string {
  return list.length === 1 ? 'is' : 'are';
}

function outposts(squares: readonly SquareName[]): string {
  return squares.length === 1 ? 'an outpost' : 'outposts';
}

function thePawns(side: Side, squares: readonly SquareName[]): string {
  return `the ${side} ${squares.length === 1 ? 'pawn' : 'pawns'} on ${listed(squares)}`;
}

/** 'The c-file is', 'The c- and d-files are', 'The c-, d- and e-files are'. */
function filesOf(alike: readonly Feature[]): string {
  const letters = alike.map(({ label }) => `${label}-`);
  return `The ${listed(letters)}${alike.length === 1 ? 'file is' : 'files are'}`;
}
