/** Sentences about files, the seventh rank and diagonals. */
import type { FilesFact } from '../facts/files';
import type { Phrases } from '../phrase';
import type { Side } from '../../types';
import { capital, counted, inWords, listed, type ManAt, name, possessive, theMan, theMen } from '../words';

const WHY = {
  isolated: 'the pawn there is isolated',
  backward: 'the pawn there is backward',
  unguarded: 'no pawn guards the pawn there',
} as const;

/** Whether one of the men stands on the last two ranks already. */
function hasEntered(heavy: readonly ManAt[], side: Side): boolean {
  return heavy.some(({ square }) => (side === 'white' ? /[78]$/ : /[12]$/).test(square));
}

export const FILES_PHRASES: Phrases<FilesFact> = {
  'file-owned': ({ side, file, heavy, entries }) => ({
    head: `${name(side)} owns the ${file}-file`,
    body:
      entries.length > 0
        ? `${theMen(heavy)} can enter on ${listed(entries, 'or')}`
        : `${theMen(heavy)} ${heavy.length === 1 ? 'stands' : 'stand'} there alone${hasEntered(heavy, side) ? '' : ', but with no safe way in yet'}`,
  }),
  'file-contested': ({ file, heavy }) => ({
    head: `The ${file}-file is contested`,
    body: `both sides stand on it, with ${theMen(heavy)}`,
  }),
  'file-open-no-entry': ({ file }) => ({
    head: `The ${file}-file is open and leads nowhere`,
    body: 'neither side has an entry square on its last two ranks',
  }),
  'half-open-target': ({ side, file, target, why, heavy }) => ({
    head: `The ${file}-file is half-open for ${name(side)} and bites on ${target}`,
    body: WHY[why],
    more: [
      heavy.length > 0 ? `${capital(theMen(heavy))} ${heavy.length === 1 ? 'stands' : 'stand'} on the file` : null,
    ],
  }),
  'half-open-nothing': ({ side, file, pawn, guards }) => ({
    head: `The ${file}-file is half-open for ${name(side)} and bites on nothing`,
    body: `${listed(guards)} ${guards.length === 1 ? 'guards' : 'guard'} ${pawn}, and no entry square on it is ${possessive(side)}`,
  }),
  'rook-to-file': ({ rook, to, moves, file, status }) => ({
    head: `The rook on ${rook} can take the ${status} ${file}-file`,
    body: `it is ${counted(moves, 'move')} from ${to}`,
  }),
  'heavy-doubled': ({ side, file, heavy }) => ({
    head: `${name(side)} has ${heavy.length > 2 ? `${inWords(heavy.length)} heavy men` : 'doubled'} on the ${file}-file`,
    body: `${theMen(heavy)} stand behind one another`,
  }),
  'file-man-target': ({ file, target, heavy }) => ({
    head: `${capital(theMan(target))} is a target on the ${file}-file`,
    body: `no pawn guards it, and ${theMen(heavy)} stand against it`,
  }),
  'on-seventh': ({ side, heavy, pawns }) => {
    const where = `on ${possessive(side)} seventh rank`;
    const prey =
      pawns.length > 0
        ? `${counted(pawns.length, 'enemy pawn')} ${pawns.length === 1 ? 'stands' : 'stand'} there too, on ${listed(pawns)}`
        : undefined;
    // Men of two kinds are too long for a head.
    return heavy.every(({ kind }) => kind === heavy[0]?.kind)
      ? { head: `${capital(theMen(heavy))} ${heavy.length === 1 ? 'stands' : 'stand'} ${where}`, body: prey }
      : {
          head: `${capital(inWords(heavy.length))} heavy men stand ${where}`,
          body: theMen(heavy),
          more: [prey && capital(prey)],
        };
  },
  'to-seventh': ({ side, man, to, moves }) => ({
    head: `${capital(theMan(man))} can come to ${possessive(side)} seventh rank`,
    body: `${to} is ${counted(moves, 'safe move')} away`,
  }),
  'long-diagonal-open': ({ man, last, seen }) => ({
    head: `${capital(theMan(man))} has the long diagonal open`,
    body: `it sees ${counted(seen, 'square')} ahead on it, as far as ${last}`,
  }),
  'diagonal-shut': ({ side, man, stopper, stopperSide }) => ({
    head: `${capital(theMan(man))} looks at a wall`,
    body: `its way forward ends at ${stopperSide === side ? 'its own' : `the ${stopperSide}`} pawn on ${stopper}, which stands head to head with another`,
  }),
};
