/** Journeys: every man's way through a game, and how long it stood where. */
import { type Position, squareName } from '../board';
import type { Step } from '../rules';
import { KINDS, type Kind, type Side, type Square, type SquareName } from '../types';

/** One stay of a man. */
export interface Stay {
  readonly square: SquareName;
  /** Half-moves played when it came; 0: it stood there at the beginning. */
  readonly from: number;
  /** Half-moves that it stood there. */
  readonly plies: number;
}

export interface Journey {
  readonly side: Side;
  /** The kind it began as. */
  readonly kind: Kind;
  readonly start: SquareName;
  readonly stays: readonly Stay[];
  /** The half-move that took it off the board; null: it is there at the end. */
  readonly takenAt: number | null;
  readonly promoted: { readonly kind: Kind; readonly at: number } | null;
}

interface Open {
  readonly side: Side;
  readonly kind: Kind;
  readonly start: SquareName;
  readonly stays: { square: SquareName; from: number; plies: number }[];
  takenAt: number | null;
  promoted: { kind: Kind; at: number } | null;
}

/** The journeys of all men, in square order of where they began. A king that castles takes its rook along. */
export function journeysOf(start: Position, steps: readonly Step[]): Journey[] {
  const at = new Map<number, Open>();
  const all: Open[] = [];
  for (let square = 0; square < 64; square++) {
    const code = start.board[square]!;
    if (code === 0) continue;
    const name = squareName(square as Square);
    const man: Open = {
      side: code >> 3 ? 'black' : 'white',
      kind: KINDS[(code & 7) - 1]!,
      start: name,
      stays: [{ square: name, from: 0, plies: 0 }],
      takenAt: null,
      promoted: null,
    };
    at.set(square, man);
    all.push(man);
  }
  for (const [place, step] of steps.entries()) {
    const ply = place + 1;
    const taken = step.captured === 0 ? undefined : at.get(step.capturedOn);
    if (taken) {
      leave(taken, ply);
      taken.takenAt = ply;
      at.delete(step.capturedOn);
    }
    const man = go(at, step.from, step.to, ply);
    if (man && step.promoted > 0) man.promoted = { kind: KINDS[step.promoted - 1]!, at: ply };
    if (step.castling === 'king') go(at, step.to + 1, step.to - 1, ply);
    if (step.castling === 'queen') go(at, step.to - 2, step.to + 1, ply);
  }
  for (const man of at.values()) leave(man, steps.length);
  return all;
}

function leave({ stays }: Open, ply: number): void {
  const last = stays[stays.length - 1]!;
  last.plies = ply - last.from;
}

function go(at: Map<number, Open>, from: number, to: number, ply: number): Open | undefined {
  const man = at.get(from);
  if (!man) return undefined;
  leave(man, ply);
  man.stays.push({ square: squareName(to as Square), from: ply, plies: 0 });
  at.delete(from);
  at.set(to, man);
  return man;
}
