/** Sentences about counts over the whole board. */
import type { ControlFact } from '../facts/control';
import type { Phrases } from '../phrase';
import { counted, enemyName, name, possessive } from '../words';

export const CONTROL_PHRASES: Phrases<ControlFact> = {
  reach: ({ side, more, fewer }) => ({
    head: `${name(side)} reaches further`,
    body: `it attacks ${counted(more, 'square')} in ${enemyName(side)}’s half, ${enemyName(side)} ${fewer === 0 ? 'none' : counted(fewer, 'square')} in ${possessive(side)}`,
  }),
  'safe-moves': ({ side, more, fewer }) => ({
    head: `${possessive(side)} men have more freedom`,
    body: `${more} safe moves in all, against ${fewer}`,
  }),
  space: ({ side, more, fewer }) => ({
    head: `${name(side)} has more room behind its pawns`,
    body: `${counted(more, 'square')} behind the foremost pawns of the files c to f, against ${fewer === 0 ? 'none' : counted(fewer, 'square')}`,
  }),
  command: ({ side, more, fewer }) => ({
    head: `${name(side)} commands more of the board`,
    body: `${more} squares, against ${fewer}`,
  }),
};
