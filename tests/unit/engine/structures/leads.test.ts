/** Leads say nothing that the pawns do not bear out: each claim of a known form is tried on boards where the model stands. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Position, sq, squareName } from '@/engine/board';
import { nameStructure, STRUCTURES, structureLead } from '@/engine/structures';
import type { Side, SquareName } from '@/engine/types';
import { turned } from '../../../support/pawn-boards';
import { slowAttacked, slowPawns, slowReach } from '../../../support/slow/pawns';
import { positionOf, soundBoardsOf } from '../../../support/structure-boards';

const sideOf = (word = ''): Side => (word === 'White' ? 'white' : 'black');
const holds = (position: Position, side: Side, file: string) =>
  slowPawns(position, side).some((square) => squareName(square).charAt(0) === file);

type Check = (position: Position, words: readonly string[]) => boolean;

const isHalfOpen = (position: Position, file = '', side: Side = 'white') =>
  !holds(position, side, file) && holds(position, side === 'white' ? 'black' : 'white', file);
const pawnOwner = (position: Position, name = ''): Side | undefined =>
  (['white', 'black'] as const).find((side) => slowPawns(position, side).some((square) => squareName(square) === name));
const attacksFrom = (position: Position, from = '', to = '') => {
  const owner = pawnOwner(position, from);
  const alone = positionOf([`${owner === 'white' ? 'P' : 'p'}${from}`]);
  return owner !== undefined && slowAttacked(alone, owner, sq(to as SquareName));
};

/** Forms of claims and how each is borne out by pawns alone. */
const FORMS: readonly (readonly [form: RegExp, check: Check])[] = [
  [
    /([a-h])-file (?:is half-open )?for (White|Black)/g,
    (position, [file, side]) => isHalfOpen(position, file, sideOf(side)),
  ],
  [
    /(White|Black) (?:has )?the half-open ([a-h])-file/g,
    (position, [side, file]) => isHalfOpen(position, file, sideOf(side)),
  ],
  [
    /([a-h])- and ([a-h])-files are half-open for (White|Black)/g,
    (position, [one, two, side]) => isHalfOpen(position, one, sideOf(side)) && isHalfOpen(position, two, sideOf(side)),
  ],
  [
    /([a-h])-file (?:is )?open/g,
    (position, [file = '']) => !holds(position, 'white', file) && !holds(position, 'black', file),
  ],
  [
    /no pawn of (White|Black) can guard ([a-h][1-8]) again/g,
    (position, [side, square]) => slowReach(position, sideOf(side), sq(square as SquareName)).hold === 'permanent',
  ],
  [
    /([a-h][1-8]) and ([a-h][1-8]) attack each other/g,
    (position, [one, two]) => attacksFrom(position, one, two) && attacksFrom(position, two, one),
  ],
  [/([a-h][1-8]) (?:guards|attacks|holds) ([a-h][1-8])/g, (position, [one, two]) => attacksFrom(position, one, two)],
  [
    /([a-h][1-8]) and ([a-h][1-8]) (?:both )?(?:guard|hold) ([a-h][1-8])/g,
    (position, [one, two, square]) => attacksFrom(position, one, square) && attacksFrom(position, two, square),
  ],
  [
    /([a-h][1-8]) has no opponent on its file/g,
    (position, [square = '']) =>
      !holds(position, pawnOwner(position, square) === 'white' ? 'black' : 'white', square.charAt(0)),
  ],
];

/** The claims of a lead, each with whether it is borne out. */
function claimsOf(position: Position, lead: string): [claim: string, borneOut: boolean][] {
  return FORMS.flatMap(([form, check]) =>
    [...lead.matchAll(form)].map(([claim, ...words]): [string, boolean] => [claim, check(position, words)]),
  );
}

describe('leads', () => {
  it('are borne out by every board that gets the name, two pawns astray or none, in either colour', () => {
    const tried = new Set<string>();
    const boards = fc.constantFrom(...STRUCTURES).chain(soundBoardsOf);
    fc.assert(
      fc.property(boards, fc.nat({ max: 15 }), fc.nat({ max: 15 }), fc.boolean(), (pawns, one, two, turn) => {
        const left = positionOf(pawns.filter((_, index) => index !== one && index !== two));
        const position = turn ? turned(left) : left;
        const match = nameStructure(position);
        if (match === null) return;
        const claims = claimsOf(position, structureLead(match));
        if (claims.length > 0) tried.add(match.id);
        const unfounded = claims.filter(([, borneOut]) => !borneOut).map(([claim]) => `${match.id}: ${claim}`);
        expect(unfounded).toEqual([]);
      }),
      { numRuns: 1500 },
    );
    expect(tried.size).toBeGreaterThan(STRUCTURES.length / 2);
  });
});
