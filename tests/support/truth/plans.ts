/** Statements about what pawns can still do, recomputed: levers, minority attacks, majorities. */
import type { LeverFact, Majority, MinorityAttackFact } from '@/engine/explain/facts/structure';
import type { Checkers, FactOf, Told } from './claim';
import { inTheWay, pawnAttackers, pawnMoves, pawnsOnFile } from './pawns';
import { fileOf, other, rankFor, type Scene, type Side, squareOf, step } from './scene';
import { list, manOrNull, many, named, names, num, the } from './words';

function lever(scene: Scene, fact: FactOf<'lever-ready'>): Told {
  const { side } = fact;
  const [pawn, on, target] = [squareOf(fact.pawn), squareOf(fact.on), squareOf(fact.against)];
  const moves = pawnMoves(side, pawn, on);
  const way = inTheWay(scene, side, pawn, on);
  const blocker = manOrNull(scene, way);
  const supported = pawnAttackers(scene, side, on).length > 0;
  const support = supported ? ', with a pawn to support it' : '';
  const text = blocker
    ? `The lever ${fact.pawn}-${fact.on} waits: ${the(blocker)} stands in its way; it would strike at ${fact.against}${support}.`
    : moves === 1
      ? supported
        ? `The lever ${fact.pawn}-${fact.on} is ready: it strikes at ${fact.against}${support}.`
        : `The lever ${fact.pawn}-${fact.on} lacks a supporting pawn: it would strike at ${fact.against}.`
      : `${named(side)} has the lever ${fact.on} against ${fact.against} in ${many(moves, 'move')}: the pawn comes from ${fact.pawn}${support}.`;
  return {
    facts: { pawn: fact.pawn, on: fact.on, against: fact.against, moves, blocker, supported },
    text,
    claims: {
      'own pawn': scene.hasPawn(side, pawn),
      'same file, ahead': fileOf(pawn) === fileOf(on) && rankFor(side, on) > rankFor(side, pawn),
      'enemy pawn there': scene.hasPawn(other(side), target),
      'struck from there': [-1, 1].some((each) => step(side, on, each, 1) === target),
      'no pawn for good in the way': way < 0 || scene.kindOn(way) !== 'pawn',
      'one move where it is ready': fact.id === 'lever-coming' || moves === 1,
      'free to move where it is ready': blocker !== null || moves > 1 || scene.moves(pawn).includes(on),
    },
  };
}

const WINGS = { queenside: [0, 1, 2], centre: [3, 4], kingside: [5, 6, 7] } as const;
type Wing = keyof typeof WINGS;
const onWing = (scene: Scene, side: Side, wing: Wing) =>
  scene.pawns(side).filter((pawn) => WINGS[wing].some((file) => file === fileOf(pawn)));

function minority(scene: Scene, fact: MinorityAttackFact): Told {
  const { side, wing } = fact;
  const [pawn, on, target] = [squareOf(fact.pawn), squareOf(fact.on), squareOf(fact.against)];
  const own = onWing(scene, side, wing).length;
  const enemy = onWing(scene, other(side), wing).length;
  const moves = pawnMoves(side, pawn, on);
  const strike =
    moves === 0
      ? `${fact.pawn} strikes at ${fact.against} now`
      : `the pawn from ${fact.pawn} strikes at ${fact.against} from ${fact.on}, ${many(moves, 'move')} away`;
  const inner = wing === 'queenside' ? 2 : 5;
  const blocker = moves === 0 ? null : manOrNull(scene, inTheWay(scene, side, pawn, on));
  const then = blocker ? `, once ${the(blocker)} has moved` : '';
  return {
    facts: { wing, own, enemy, pawn: fact.pawn, on: fact.on, against: fact.against, moves, blocker },
    text: `${named(side)} has a minority attack on the ${wing}: ${many(own, 'pawn')} against ${num(enemy)}, and ${strike}${then}.`,
    claims: {
      'fewer pawns': own < enemy,
      'own pawn': scene.hasPawn(side, pawn),
      'enemy pawn': scene.hasPawn(other(side), target) && fileOf(target) === inner,
      'no own pawn on that file': pawnsOnFile(scene, side, inner).length === 0,
      'struck from there': [-1, 1].some((each) => step(side, on, each, 1) === target),
      'no pawn for good in the way': blocker?.kind !== 'pawn',
    },
  };
}

function majority(scene: Scene, { id, side, wing }: FactOf<'majority'>): Told {
  const own = onWing(scene, side, wing);
  const enemy = onWing(scene, other(side), wing);
  const filesHeld = (pawns: readonly number[]) => new Set(pawns.map(fileOf)).size;
  const crippled = filesHeld(own) <= filesHeld(enemy);
  const doubled = crippled
    ? names(
        own.filter((pawn) => pawnsOnFile(scene, side, fileOf(pawn)).length > 1),
        side,
      )
    : [];
  const where = wing === 'centre' ? 'in the centre' : `on the ${wing}`;
  const count = `${many(own.length, 'pawn')} against ${enemy.length === 0 ? 'none' : num(enemy.length)}`;
  return {
    facts: { wing, own: own.length, enemy: enemy.length, doubled },
    text: crippled
      ? `${named(side)}’s majority ${where} is crippled: ${count}, but with ${list(doubled)} doubled it makes no passed pawn by itself.`
      : `${named(side)} has the majority ${where}: ${count}.`,
    claims: { more: own.length > enemy.length, 'id fits': crippled === (id === 'crippled-majority') },
  };
}

export const PLANS: Checkers<LeverFact | MinorityAttackFact | Majority> = {
  'lever-ready': lever,
  'lever-coming': lever,
  'minority-attack': minority,
  majority,
  'crippled-majority': majority,
};
