/** Sentences about men. */
import type { BadBishop, MenFact, PlacedMan } from '../facts/men';
import type { Phrase, Phrases } from '../phrase';
import { capital, counted, enemyName, inWords, listed, name, pawnsStand, possessive, theMan, theMen } from '../words';

function toCentre(moves: number | null): string {
  return moves === null ? 'more than three moves from the centre' : `${counted(moves, 'move')} from the centre`;
}

function placed({ id, side, man, safeMoves, most, enemyHalf, toCentre: centre }: PlacedMan): Phrase {
  const share = `${counted(safeMoves, 'safe move')} of the ${inWords(most)} that a ${man.kind} can have`;
  return id === 'best-placed'
    ? {
        head: `${capital(theMan(man))} is ${possessive(side)} best placed man`,
        body:
          enemyHalf > 0
            ? `${share}, and it attacks ${counted(enemyHalf, 'square')} in ${enemyName(side)}’s half`
            : share,
      }
    : {
        head: `${capital(theMan(man))} is ${possessive(side)} worst placed man`,
        body: centre === 0 ? share : `${share}, and ${toCentre(centre)}`,
      };
}

function remedy({ side, colour, tradeable, lever, outside }: BadBishop): string | null {
  if (outside?.moves === 1) return `It gets outside the chain, to ${outside.square}, in one move`;
  if (lever) {
    const pawn = `the pawn on ${lever.against} that helps to shut it in`;
    if (lever.moves === 0) return `The pawn on ${lever.pawn} attacks ${pawn}`;
    return `The lever ${lever.pawn}-${lever.on}, ${counted(lever.moves, 'move')} away, strikes at ${pawn}`;
  }
  if (outside) return `It gets outside the chain, to ${outside.square}, in ${counted(outside.moves, 'move')}`;
  return tradeable ? `It can be offered for ${enemyName(side)}’s ${colour}-squared bishop` : null;
}

export const MEN_PHRASES: Phrases<MenFact> = {
  'best-placed': placed,
  'worst-placed': placed,
  'bad-bishop': (fact) => ({
    head:
      fact.outside?.moves === 1
        ? `The bishop on ${fact.square} is shut in by its pawns for now`
        : `The bishop on ${fact.square} is ${possessive(fact.side)} problem piece`,
    body: `${pawnsStand(fact.onColour, fact.pawns)} on its colour, ${listed(fact.fixed)} fixed among them`,
    more: [remedy(fact)],
  }),
  'bad-but-active': ({ square, onColour, pawns, safeMoves }) => ({
    head: `The bishop on ${square} is bad by its pawns but looks past them`,
    body: `${pawnsStand(onColour, pawns)} on its colour, yet it has ${counted(safeMoves, 'safe move')}`,
  }),
  'knight-on-rim': ({ square, sees }) => ({
    head: `The knight on ${square} stands on the rim`,
    body: `it attacks ${inWords(sees)} of the eight squares that a knight can`,
  }),
  'out-of-play': ({ man, safeMoves, toCentre: centre }) => ({
    head: `${capital(theMan(man))} is out of play`,
    body: `${counted(safeMoves, 'safe move')}, and ${toCentre(centre)}`,
  }),
  trapped: ({ man, attacked }) => ({
    head: `${capital(theMan(man))} is trapped`,
    body: attacked
      ? 'it is attacked and has no safe square to go to'
      : 'a pawn can attack it in one move, and it has no safe square to go to',
  }),
  pinned: ({ man, pinner, king }) => ({
    head: `${capital(theMan(man))} is pinned`,
    body: `${theMan(pinner)} would attack the king on ${king} through it`,
  }),
  overloaded: ({ man, guards }) => ({
    head: `${capital(theMan(man))} is overloaded`,
    body: `${theMen(guards)} both need it as a guard, and both are attacked`,
  }),
  tied: ({ man, ward, side, loses, already, by }) => ({
    head: `${capital(theMan(man))} is tied to ${theMan(ward)}`,
    body: `${by === 'screen' ? 'it shuts the line; ' : ''}if it leaves, ${enemyName(side)} gains ${counted(loses, 'pawn')}’${loses === 1 ? 's' : ''} worth ${already > 0 ? 'more ' : ''}there`,
  }),
  loose: ({ man, side }) => ({
    head: `${capital(theMan(man))} is loose`,
    body: `no ${side} man guards it`,
  }),
  'en-prise': ({ man, side, gain, guards }) => ({
    head: `${capital(theMan(man))} is en prise`,
    body:
      guards === 0
        ? `no ${side} man guards it, and ${enemyName(side)} can take it`
        : `${enemyName(side)} gains ${counted(gain, 'pawn')}’${gain === 1 ? 's' : ''} worth by capturing there`,
  }),
  'bishop-pair': ({ side }) => ({
    head: `${name(side)} has the bishop pair`,
    body: `${enemyName(side)} has not`,
  }),
  'bishop-against-knight': ({ side, bishop, knight, favours, onColour, pawns, rams }) =>
    favours === 'knight'
      ? {
          head: `The pawns suit the knight on ${knight} better than the bishop on ${bishop}`,
          body: `${inWords(onColour)} of ${possessive(side)} ${counted(pawns, 'pawn')} ${onColour === 1 ? 'stands' : 'stand'} on the bishop’s colour, and ${counted(rams, 'pair')} of pawns ${rams === 1 ? 'stands' : 'stand'} head to head`,
        }
      : {
          head: `The pawns suit the bishop on ${bishop} better than the knight on ${knight}`,
          body: `there are pawns on both wings, none stand head to head, and ${onColour === 0 ? 'none' : inWords(onColour)} of ${possessive(side)} ${inWords(pawns)} ${onColour === 1 ? 'stands' : 'stand'} on the bishop’s colour`,
        },
  'blocked-in': ({ man, by }) => ({
    head: `${capital(theMan(man))} is blocked in by its own side`,
    body: `${theMen(by)} ${by.length === 1 ? 'takes' : 'take'} every square it could go to`,
  }),
};
