/** Sentences about pawns. */
import type { LeverFact, Majority, PassedPawn, StructureFact } from '../facts/structure';
import type { Phrase, Phrases } from '../phrase';
import { capital, counted, enemyName, enemyOf, filesNamed, inWords, listed, name, possessive, theMan } from '../words';

/** 'd4 against d5', 'd4 against d5 and e4 against e5'. */
function pairs(list: readonly (readonly [string, string])[]): string {
  return listed(list.map(([one, other]) => `${one} against ${other}`));
}

function passed({ pawn, side, moves, blocker, guards }: PassedPawn): Phrase {
  const last = `${inWords(moves)} ${moves === 1 ? 'move' : 'moves'} from the last rank`;
  if (guards.length > 0) {
    return {
      head: `The pawn on ${pawn} is a protected passed pawn`,
      body: `${listed(guards)} ${guards.length === 1 ? 'guards' : 'guard'} it, and no ${enemyOf(side)} pawn can stop it`,
      more: [blocker ? `${capital(theMan(blocker))} stands in its way` : `It is ${last}`],
    };
  }
  return {
    head: `The pawn on ${pawn} is passed`,
    body: blocker
      ? `no ${enemyOf(side)} pawn can stop it, but ${theMan(blocker)} stands in its way`
      : `no ${enemyOf(side)} pawn can stop it, and it is ${last}`,
  };
}

function lever({ pawn, on, against, moves, blocker, supported, side }: LeverFact): Phrase {
  const support = supported ? `, with a pawn to support it` : '';
  const strike = `it strikes at ${against}${support}`;
  if (blocker) {
    return {
      head: `The lever ${pawn}-${on} waits`,
      body: `${theMan(blocker)} stands in its way; ${strike.replace('it strikes', 'it would strike')}`,
    };
  }
  if (moves === 1 && !supported) {
    return { head: `The lever ${pawn}-${on} lacks a supporting pawn`, body: `it would strike at ${against}` };
  }
  return moves === 1
    ? { head: `The lever ${pawn}-${on} is ready`, body: strike }
    : {
        head: `${name(side)} has the lever ${on} against ${against} in ${counted(moves, 'move')}`,
        body: `the pawn comes from ${pawn}${support}`,
      };
}

function majority({ side, wing, own, enemy, doubled }: Majority): Phrase {
  const where = wing === 'centre' ? 'in the centre' : `on the ${wing}`;
  const count = `${inWords(own)} ${own === 1 ? 'pawn' : 'pawns'} against ${enemy === 0 ? 'none' : inWords(enemy)}`;
  if (doubled.length > 0) {
    return {
      head: `${possessive(side)} majority ${where} is crippled`,
      body: `${count}, but with ${listed(doubled)} doubled it makes no passed pawn by itself`,
    };
  }
  return { head: `${name(side)} has the majority ${where}`, body: count };
}

export const STRUCTURE_PHRASES: Phrases<StructureFact> = {
  'named-structure': ({ name: title, differs, lead }) => ({
    head: `Pawn structure: ${title}`,
    body: undefined,
    more: [
      capital(lead),
      differs === 0 ? null : `${capital(counted(differs, 'pawn differs', 'pawns differ'))} from the book form`,
    ],
  }),
  'centre-fixed': ({ pairs: rams }) => ({
    head: 'The centre is fixed',
    body: `${pairs(rams)}, and no pawn can take another there now`,
  }),
  'centre-open': () => ({ head: 'The centre is open', body: 'no pawn stands on the d-file or the e-file' }),
  'centre-tension': ({ pairs: levers }) => ({
    head: 'The centre is in tension',
    body: `${listed(
      levers.map(([one, other]) => `${one} and ${other}`),
      'as well as',
    )} attack each other`,
  }),
  'isolated-pawn': ({ side, pawn, neighbours, halfOpen }) => ({
    head: `The pawn on ${pawn} is isolated`,
    body: `no ${side} pawn stands on the ${filesNamed(neighbours)} to guard it`,
    more: [halfOpen ? `Its file is half-open for ${enemyName(side)}` : null],
  }),
  'doubled-pawns': ({ side, pawns, isolated }) => ({
    head: `${possessive(side)} pawns on ${listed(pawns)} are doubled`,
    body: isolated ? 'they cannot guard each other, and no neighbour can guard them' : 'they cannot guard each other',
  }),
  'backward-pawn': ({ side, pawn, stop, stopHeldBy, halfOpen, file }) => ({
    head: `The pawn on ${pawn} is backward`,
    body:
      stopHeldBy === 'pawn'
        ? `no pawn can come to guard it, and a ${enemyOf(side)} pawn holds its stop square ${stop}`
        : stopHeldBy === 'command'
          ? `no pawn can come to guard it, and ${enemyName(side)} commands its stop square ${stop}`
          : `no pawn can come to guard it, and a ${enemyOf(side)} pawn bears on its way forward`,
    more: [halfOpen ? `The ${file}-file is half-open for ${enemyName(side)}` : null],
  }),
  'passed-pawn': passed,
  'protected-passed-pawn': passed,
  'candidate-pawn': ({ pawn, side, file }) => ({
    head: `The pawn on ${pawn} can become passed`,
    body: `no pawn stands before it on the ${file}-file, and beside it ${name(side)} is not outnumbered`,
  }),
  'pawn-chain': ({ side, pawns }) => ({
    head: `${possessive(side)} pawn chain runs from ${pawns[0]} to ${pawns[pawns.length - 1]}`,
    body: `its base on ${pawns[0]} has no pawn to guard it`,
  }),
  rams: ({ pairs: list }) => ({
    head: `${capital(inWords(list.length))} pairs of pawns stand head to head`,
    body: pairs(list),
  }),
  'lever-ready': lever,
  'lever-coming': lever,
  'minority-attack': ({ side, wing, own, enemy, pawn, on, against, moves, blocker }) => ({
    head: `${name(side)} has a minority attack on the ${wing}`,
    body: `${inWords(own)} ${own === 1 ? 'pawn' : 'pawns'} against ${inWords(enemy)}, and ${moves === 0 ? `${pawn} strikes at ${against} now` : `the pawn from ${pawn} strikes at ${against} from ${on}, ${counted(moves, 'move')} away${blocker ? `, once ${theMan(blocker)} has moved` : ''}`}`,
  }),
  majority,
  'crippled-majority': majority,
  'hanging-pawns': ({ side, pawns }) => ({
    head: `${possessive(side)} pawns on ${listed(pawns)} hang`,
    body: `no own pawn stands beside them, and both files are half-open for ${enemyName(side)}`,
  }),
  islands: ({ fewer, fewest, most }) => ({
    head: `${name(fewer)} has ${counted(fewest, 'pawn island')}, ${enemyName(fewer)} ${inWords(most)}`,
  }),
  'pawns-on-colour': ({ side, colour, count, total }) => ({
    head:
      count === total
        ? `All ${inWords(total)} of ${possessive(side)} pawns stand on ${colour} squares`
        : `${capital(inWords(count))} of ${possessive(side)} ${inWords(total)} pawns stand on ${colour} squares`,
  }),
};
