/** Sentences about outposts. */
import type { PawnMoves } from '../facts/base';
import type { OutpostsFact } from '../facts/outposts';
import type { Phrases } from '../phrase';
import { capital, comersSentence, counted, enemyOf, name, theMan } from '../words';

/** What must happen before the pawn can move. */
function once({ blocker }: PawnMoves): string {
  return blocker ? `, once ${theMan(blocker)} has moved` : '';
}

function supported(support: PawnMoves): string {
  const { pawn, moves } = support;
  if (moves === 0) return `the pawn on ${pawn} supports it`;
  return `the pawn on ${pawn} can support it in ${counted(moves, 'move')}${once(support)}`;
}

function unchallenged(hold: 'permanent' | 'fixed', side: 'white' | 'black'): string {
  return hold === 'permanent'
    ? `no ${enemyOf(side)} pawn can ever challenge it`
    : `no ${enemyOf(side)} pawn can challenge it as the pawns stand`;
}

export const OUTPOSTS_PHRASES: Phrases<OutpostsFact> = {
  'outpost-taken': ({ side, man, hold, support, tradable }) => ({
    head: `${capital(theMan(man))} stands on an outpost`,
    body: `${unchallenged(hold, side)}, and ${supported(support)}`,
    more: [tradable ? null : `No ${enemyOf(side)} minor piece can trade itself for it within two moves`],
  }),
  'outpost-free': ({ side, square, hold, support, comers, ownKnights }) => ({
    head: `${square} is an outpost for ${name(side)}`,
    body: `${unchallenged(hold, side)}, and ${supported(support)}`,
    more: [comersSentence(comers, side, ownKnights)],
  }),
  'advanced-post': ({ man, challenge, guard }) => ({
    head: `${capital(theMan(man))} is there on loan`,
    body: `the pawn on ${challenge.pawn} can challenge it in ${counted(challenge.moves, 'move')}${once(challenge)}`,
    more: [guard ? `Till then the pawn on ${guard} supports it` : null],
  }),
};
