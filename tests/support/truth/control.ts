/** Statements about counts over the whole board, recomputed. */
import type { ControlFact } from '@/engine/explain/facts/control';
import type { Checkers, Told } from './claim';
import { pawnsOnFile } from './pawns';
import { other, rankFor, type Scene, type Side } from './scene';
import { enemyNamed, many, named } from './words';

const squares = [...Array(64).keys()];

const reach = (scene: Scene, side: Side) =>
  squares.filter((at) => rankFor(side, at) >= 5 && scene.attackers(side, at).length > 0).length;
const freedom = (scene: Scene, side: Side) =>
  scene.men(side).reduce((sum, from) => sum + scene.safeMoves(from).length, 0);
const room = (scene: Scene, side: Side) =>
  [2, 3, 4, 5].reduce((sum, file) => {
    const foremost = Math.max(0, ...pawnsOnFile(scene, side, file).map((pawn) => rankFor(side, pawn)));
    return sum + Math.max(0, foremost - 1);
  }, 0);
const command = (scene: Scene, side: Side) => squares.filter((at) => scene.command(at) === side).length;

type Count = (scene: Scene, side: Side) => number;
type Say = (side: Side, more: number, fewer: number) => string;

function balance(count: Count, say: Say) {
  return (scene: Scene, { side }: ControlFact): Told => {
    const [more, fewer] = [count(scene, side), count(scene, other(side))];
    return { facts: { more, fewer }, text: say(side, more, fewer), claims: { more: more > fewer } };
  };
}

const noneOr = (count: number) => (count === 0 ? 'none' : many(count, 'square'));

export const CONTROL: Checkers<ControlFact> = {
  reach: balance(
    reach,
    (side, more, fewer) =>
      `${named(side)} reaches further: it attacks ${many(more, 'square')} in ${enemyNamed(side)}’s half, ${enemyNamed(side)} ${noneOr(fewer)} in ${named(side)}’s.`,
  ),
  'safe-moves': balance(
    freedom,
    (side, more, fewer) => `${named(side)}’s men have more freedom: ${more} safe moves in all, against ${fewer}.`,
  ),
  space: balance(
    room,
    (side, more, fewer) =>
      `${named(side)} has more room behind its pawns: ${many(more, 'square')} behind the foremost pawns of the files c to f, against ${noneOr(fewer)}.`,
  ),
  command: balance(
    command,
    (side, more, fewer) => `${named(side)} commands more of the board: ${more} squares, against ${fewer}.`,
  ),
};
