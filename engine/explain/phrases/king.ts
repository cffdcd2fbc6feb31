/** Sentences about kings. */
import type { KingFact } from '../facts/king';
import type { Phrases } from '../phrase';
import {
  capital,
  counted,
  enemyName,
  enemyOf,
  filesNamed,
  inWords,
  listed,
  possessive,
  theFiles,
  theMen,
} from '../words';

export const KING_PHRASES: Phrases<KingFact> = {
  'in-check': ({ king, checkers, side }) => ({
    head: `The ${side} king on ${king} is in check`,
    body: `${theMen(checkers)} ${checkers.length === 1 ? 'attacks' : 'attack'} it`,
  }),
  'shelter-whole': ({ side, king, pawns }) => ({
    head: `${possessive(side)} king on ${king} has its pawn cover whole`,
    body: `the pawns on ${listed(pawns)} have not moved`,
  }),
  'shelter-broken': ({ side, king, bare, advanced }) => ({
    head: `${possessive(side)} king on ${king} has ${bare.length > 0 ? 'gaps in its' : 'a loosened'} pawn cover`,
    body: [
      bare.length > 0 ? `no ${side} pawn stands before it on the ${filesNamed(bare)}` : null,
      advanced.length > 0 ? `${listed(advanced)} ${advanced.length === 1 ? 'has' : 'have'} gone ahead` : null,
    ]
      .filter(Boolean)
      .join(', and '),
  }),
  'no-luft': ({ king, noFlight, gives }) => {
    const moves = listed(
      gives.map(({ from, to }) => `${from}-${to}`),
      'or',
    );
    return noFlight
      ? {
          head: `The king on ${king} has no flight square`,
          body: gives.length > 0 ? `${moves} gives it the first` : undefined,
        }
      : {
          head: `The king on ${king} has no luft`,
          body:
            gives.length > 0
              ? `it cannot leave its back rank, and ${moves} gives it a square`
              : 'it cannot leave its back rank',
        };
  },
  'no-flight': ({ king }) => ({
    head: `The king on ${king} has no square to step to`,
    body: 'every square around it is taken or attacked',
  }),
  'open-line-beside-king': ({ side, king, files, status, heavy }) => ({
    head: `${theFiles(files)} by the king on ${king} ${files.length === 1 ? 'is' : 'are'} ${status === 'open' ? 'open' : `half-open for ${enemyName(side)}`}`,
    body: heavy.length > 0 ? `${theMen(heavy)} ${heavy.length === 1 ? 'stands' : 'stand'} there already` : undefined,
  }),
  'king-zone': ({ side, king, attackers, guards }) => ({
    head: `${capital(inWords(attackers.length))} ${enemyOf(side)} men aim at the king on ${king} or squares beside it`,
    body: `${theMen(attackers)}, against ${guards === 0 ? 'no guard' : counted(guards, 'guard')} besides the king`,
  }),
  'weak-back-rank': ({ side, king }) => ({
    head: `${possessive(side)} back rank is weak`,
    body: `the king on ${king} cannot leave it, and no ${side} rook or queen stands on it`,
  }),
};
