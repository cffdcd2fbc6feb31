/** Statements about pawns, recomputed. */
import type { StructureFact } from '@/engine/explain/facts/structure';
import type { Checkers, FactOf, Told } from './claim';
import {
  canTake,
  headToHead,
  isBackward,
  isIsolated,
  isPassed,
  islandCount,
  neighbours,
  pawnAttackers,
  pawnMoves,
  pawnsOnFile,
  road,
} from './pawns';
import { colourOf, fileLetter, fileOf, nameOf, other, rankFor, type Scene, type Side, squareOf, step } from './scene';
import { PLANS } from './plans';
import { structureTold } from './structures';
import {
  enemyNamed,
  files,
  inOrder,
  list,
  manOrNull,
  many,
  named,
  names,
  num,
  sentences,
  start,
  the,
  verb,
} from './words';

type Pair = readonly [string, string];

/** Pairs head to head, the pawn of the side to move first, in its order. */
function rams(scene: Scene): Pair[] {
  const mine = scene.mover;
  const pairs = headToHead(scene);
  const order = inOrder(
    pairs.map((pair) => pair[mine]),
    mine,
  );
  return order.map((at) => {
    const pair = pairs.find((each) => each[mine] === at);
    return [nameOf(at), nameOf(pair ? pair[other(mine)] : at)];
  });
}

const against = (pairs: readonly Pair[]) => list(pairs.map(([one, two]) => `${one} against ${two}`));
const central = (square: number) => fileOf(square) === 3 || fileOf(square) === 4;

/** Pawn pairs that attack each other with one of them on the d- or e-file. */
function tension(scene: Scene): Pair[] {
  const mine = scene.mover;
  return inOrder(scene.pawns(mine), mine).flatMap((pawn) =>
    [-1, 1]
      .map((side) => step(mine, pawn, side, 1))
      .filter((to) => scene.hasPawn(other(mine), to) && (central(pawn) || central(to)))
      .map((to): Pair => [nameOf(pawn), nameOf(to)]),
  );
}

/** The front pawn has no own pawn before it on its file. */
const isFront = (scene: Scene, side: Side, pawn: number) => !road(side, pawn).some((at) => scene.hasPawn(side, at));

function passed(scene: Scene, { side, pawn }: FactOf<'passed-pawn'>): Told {
  const at = squareOf(pawn);
  const guards = names(pawnAttackers(scene, side, at), side);
  const blocker = manOrNull(scene, step(side, at, 0, 1));
  const moves = pawnMoves(side, at, road(side, at).at(-1) ?? at);
  const last = `${many(moves, 'move')} from the last rank`;
  const noStop = `no ${other(side)} pawn can stop it`;
  const text =
    guards.length > 0
      ? sentences(
          `The pawn on ${pawn} is a protected passed pawn: ${list(guards)} ${verb(guards.length, 'guard')} it, and ${noStop}`,
          blocker ? `${start(the(blocker))} stands in its way` : `It is ${last}`,
        )
      : sentences(
          `The pawn on ${pawn} is passed: ${noStop}${blocker ? `, but ${the(blocker)} stands in its way` : `, and it is ${last}`}`,
        );
  return {
    facts: { pawn, moves, blocker, guards },
    text,
    claims: {
      'a pawn of the side': scene.hasPawn(side, at),
      'no enemy pawn ahead': isPassed(scene, side, at),
      'no own pawn ahead': isFront(scene, side, at),
    },
  };
}

export const STRUCTURE: Checkers<StructureFact> = {
  ...PLANS,
  'named-structure': structureTold,
  'centre-fixed': (scene) => {
    const pairs = rams(scene).filter(([pawn]) => central(squareOf(pawn)));
    const pawns = [...scene.pawns('white'), ...scene.pawns('black')];
    const takesThere = pawns.filter((pawn) => {
      const side = scene.sideOn(pawn) ?? 'white';
      return [-1, 1].some((each) => {
        const to = step(side, pawn, each, 1);
        if (to < 0 || !(central(pawn) || central(to))) return false;
        if (to === scene.passing && side === scene.mover) return true;
        return scene.hasPawn(other(side), to);
      });
    });
    const stuck = pawns.filter(central).every((pawn) => {
      const side = scene.sideOn(pawn) ?? 'white';
      return scene.advances(pawn).length === 0 && !canTake(scene, side, pawn);
    });
    return {
      facts: { pairs },
      text: `The centre is fixed: ${against(pairs)}, and no pawn can take another there now.`,
      claims: {
        'a pair head to head': pairs.length > 0,
        'no centre pawn can step or take': stuck,
        'no pawn takes there': takesThere.length === 0,
      },
    };
  },
  'centre-open': (scene) => ({
    facts: { pairs: [] },
    text: 'The centre is open: no pawn stands on the d-file or the e-file.',
    claims: { 'no pawn there': ![...scene.pawns('white'), ...scene.pawns('black')].some(central) },
  }),
  'centre-tension': (scene) => {
    const pairs = tension(scene);
    return {
      facts: { pairs },
      text: `The centre is in tension: ${list(
        pairs.map(([one, two]) => `${one} and ${two}`),
        'as well as',
      )} attack each other.`,
      claims: { 'at least one pair': pairs.length > 0 },
    };
  },
  'isolated-pawn': (scene, { side, pawn }) => {
    const at = squareOf(pawn);
    const next = [fileOf(at) - 1, fileOf(at) + 1].filter((file) => file >= 0 && file < 8).map(fileLetter);
    const halfOpen = pawnsOnFile(scene, other(side), fileOf(at)).length === 0;
    return {
      facts: { pawn, neighbours: next, halfOpen },
      text: sentences(
        `The pawn on ${pawn} is isolated: no ${side} pawn stands on the ${files(next)} to guard it`,
        halfOpen ? `Its file is half-open for ${enemyNamed(side)}` : null,
      ),
      claims: { 'own pawn': scene.hasPawn(side, at), alone: isIsolated(scene, side, at) },
    };
  },
  'doubled-pawns': (scene, { side, pawns }) => {
    const file = fileOf(squareOf(pawns[0] ?? 'a1'));
    const all = pawnsOnFile(scene, side, file);
    const isolated = all.every((pawn) => isIsolated(scene, side, pawn));
    return {
      facts: { pawns: names(all, side), isolated },
      text: `${named(side)}’s pawns on ${list(names(all, side))} are doubled: they cannot guard each other${
        isolated ? ', and no neighbour can guard them' : ''
      }.`,
      claims: { 'two or more': all.length > 1 },
    };
  },
  'backward-pawn': (scene, { side, pawn }) => {
    const at = squareOf(pawn);
    const stop = step(side, at, 0, 1);
    const enemy = other(side);
    const byPawn = pawnAttackers(scene, enemy, stop).length > 0;
    const stopHeldBy = byPawn ? 'pawn' : scene.command(stop) === enemy ? 'command' : null;
    const halfOpen = pawnsOnFile(scene, enemy, fileOf(at)).length === 0;
    const file = fileLetter(fileOf(at));
    const held =
      stopHeldBy === 'pawn'
        ? `a ${enemy} pawn holds its stop square ${nameOf(stop)}`
        : stopHeldBy === 'command'
          ? `${named(enemy)} commands its stop square ${nameOf(stop)}`
          : `a ${enemy} pawn bears on its way forward`;
    return {
      facts: { pawn, file, stop: nameOf(stop), stopHeldBy, halfOpen },
      text: sentences(
        `The pawn on ${pawn} is backward: no pawn can come to guard it, and ${held}`,
        halfOpen ? `The ${file}-file is half-open for ${named(enemy)}` : null,
      ),
      claims: { 'own pawn': scene.hasPawn(side, at), backward: isBackward(scene, side, at) },
    };
  },
  'passed-pawn': passed,
  'protected-passed-pawn': passed,
  'candidate-pawn': (scene, { side, pawn }) => {
    const at = squareOf(pawn);
    const ahead = (one: number) => rankFor(side, one) > rankFor(side, at);
    const own = neighbours(scene, side, at).filter((one) => !ahead(one)).length;
    const enemy = neighbours(scene, other(side), at).filter(ahead).length;
    const file = fileLetter(fileOf(at));
    return {
      facts: { pawn, file },
      text: `The pawn on ${pawn} can become passed: no pawn stands before it on the ${file}-file, and beside it ${named(side)} is not outnumbered.`,
      claims: {
        'own pawn': scene.hasPawn(side, at),
        'not passed yet': !isPassed(scene, side, at),
        'no pawn before it': !road(side, at).some((one) => scene.kindOn(one) === 'pawn'),
        'not outnumbered': own >= enemy,
      },
    };
  },
  'pawn-chain': (scene, { side, pawns }) => {
    const chain = pawns.map(squareOf);
    const [base = 0, head = 0] = [chain[0], chain.at(-1)];
    return {
      facts: { pawns: chain.map(nameOf) },
      text: `${named(side)}’s pawn chain runs from ${nameOf(base)} to ${nameOf(head)}: its base on ${nameOf(base)} has no pawn to guard it.`,
      claims: {
        'three or more own pawns': chain.length > 2 && chain.every((pawn) => scene.hasPawn(side, pawn)),
        'each guards the next': chain.every(
          (pawn, index) => index === 0 || [-1, 1].some((each) => step(side, chain[index - 1] ?? 0, each, 1) === pawn),
        ),
        'nothing guards the base': pawnAttackers(scene, side, base).length === 0,
        'the head guards no further pawn': ![-1, 1].some((each) => scene.hasPawn(side, step(side, head, each, 1))),
      },
    };
  },
  rams: (scene) => {
    const pairs = rams(scene);
    return {
      facts: { pairs },
      text: `${start(num(pairs.length))} pairs of pawns stand head to head: ${against(pairs)}.`,
      claims: { 'two or more': pairs.length > 1 },
    };
  },
  'hanging-pawns': (scene, { side, pawns }) => {
    const two = pawns.map(squareOf);
    const held = two.map(fileOf);
    return {
      facts: { pawns: two.map(nameOf) },
      text: `${named(side)}’s pawns on ${list(two.map(nameOf))} hang: no own pawn stands beside them, and both files are half-open for ${enemyNamed(side)}.`,
      claims: {
        'two own pawns abreast': two.length === 2 && two.every((at) => scene.hasPawn(side, at)),
        'next to each other on the fourth rank':
          Math.abs((held[0] ?? 0) - (held[1] ?? 0)) === 1 && two.every((at) => rankFor(side, at) === 4),
        'nobody beside them': two.every((at) => neighbours(scene, side, at).every((one) => two.includes(one))),
        'both files half-open': held.every((file) => pawnsOnFile(scene, other(side), file).length === 0),
      },
    };
  },
  islands: (scene, { fewer }) => {
    const [fewest, most] = [islandCount(scene, fewer), islandCount(scene, other(fewer))];
    return {
      facts: { fewer, fewest, most },
      text: `${named(fewer)} has ${many(fewest, 'pawn island')}, ${enemyNamed(fewer)} ${num(most)}.`,
      claims: { fewer: fewest < most, some: fewest > 0 },
    };
  },
  'pawns-on-colour': (scene, { side, colour }) => {
    const all = scene.pawns(side);
    const count = all.filter((pawn) => colourOf(pawn) === colour).length;
    return {
      facts: { colour, count, total: all.length },
      text:
        count === all.length
          ? `All ${num(count)} of ${named(side)}’s pawns stand on ${colour} squares.`
          : `${start(num(count))} of ${named(side)}’s ${num(all.length)} pawns stand on ${colour} squares.`,
      claims: { 'three quarters': count * 4 >= all.length * 3 },
    };
  },
};
