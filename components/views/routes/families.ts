/** The parts of a post in seven families, each with a hatching of its own, so that a bar is read without colour. */
import { PARTS, type PartName } from '@/engine/posts/weights';
import type { Paint, Pattern } from '@/components/plate/types';

export const FAMILIES = ['tactics', 'squares', 'room', 'files', 'aims', 'order', 'time'] as const;
export type Family = (typeof FAMILIES)[number];

export const FAMILY_NAMES: Readonly<Record<Family, string>> = {
  tactics: 'won, lost, attacked',
  squares: 'squares and posts',
  room: 'room to move',
  files: 'files',
  aims: 'pawns and kings',
  order: 'development',
  time: 'time: further moves',
};

const MEMBERS: Readonly<Record<Exclude<Family, 'time'>, readonly PartName[]>> = {
  tactics: ['lost', 'hanging', 'wins', 'threatens', 'check', 'underCheaper', 'facesEqual', 'pawnHit'],
  squares: ['outpost', 'weakSquares', 'outnumbers', 'enemyHalf', 'centre', 'blockade'],
  room: ['safeMoves', 'rookMoves', 'knightCentre', 'diagonal'],
  files: ['openFile', 'halfOpenFile', 'fileTarget', 'doubled', 'seventh', 'joined'],
  aims: ['targets', 'guardsWeak', 'eyes', 'fromEnemyKing', 'fromOwnKing'],
  order: ['heavy', 'atHome', 'castlingKept', 'betweenToCastle', 'inPawnsWay'],
};

/** A part with its family, in the order in which bars are stacked. */
export interface StackedPart {
  readonly name: PartName;
  readonly label: string;
  readonly weight: number;
  /** Why it counts so, in a coach's words. */
  readonly reason: string;
  readonly family: Family;
}

/** All parts, family by family. A part that no family names would be left out; a test holds that none is. */
export const STACKED: readonly StackedPart[] = FAMILIES.flatMap((family) =>
  family === 'time'
    ? []
    : MEMBERS[family].flatMap((name) => {
        const part = PARTS.find((each) => each.name === name);
        return part ? [{ name, label: part.label, weight: part.weight, reason: part.reason, family }] : [];
      }),
);

const HATCHES: Readonly<Record<Exclude<Family, 'tactics' | 'time'>, { size: number; turned: boolean; d: string }>> = {
  squares: { size: 5, turned: true, d: 'M0 0V5' },
  room: { size: 5, turned: false, d: 'M1.5 1.5h2v2h-2z' },
  files: { size: 4, turned: false, d: 'M2 0V4' },
  aims: { size: 6, turned: true, d: 'M0 0V6M0 0H6' },
  order: { size: 4, turned: false, d: 'M0 2H4' },
};

/** The hatchings in one ink; `id` is the prefix of their names. */
export function familyPatterns(id: string, paint: Paint): Pattern[] {
  return Object.entries(HATCHES).map(([family, { size, turned, d }]) => ({
    id: `${id}${family}`,
    size,
    turned,
    x: 0,
    y: 0,
    marks: [{ type: 'path', d, stroke: paint, width: 1.3, fill: family === 'room' ? paint : 'none' }],
  }));
}
