/** Pawn play on a board of letters: the definitions of the handbooks, walked square by square. */
import { fileOf, other, rankFor, type Scene, type Side, step } from './scene';

const beside = (a: number, b: number) => Math.abs(fileOf(a) - fileOf(b)) === 1;

/** Pawns of the side on the next files. */
export const neighbours = (scene: Scene, side: Side, square: number): number[] =>
  scene.pawns(side).filter((pawn) => beside(pawn, square));

export const isIsolated = (scene: Scene, side: Side, pawn: number): boolean =>
  neighbours(scene, side, pawn).length === 0;

export const pawnsOnFile = (scene: Scene, side: Side, file: number): number[] =>
  scene.pawns(side).filter((pawn) => fileOf(pawn) === file);

/** Pawns of the side that attack the square now. */
export const pawnAttackers = (scene: Scene, side: Side, square: number): number[] =>
  scene.attackers(side, square).filter((from) => scene.kindOn(from) === 'pawn');

/** Squares in front of a pawn, nearest first. */
export function road(side: Side, pawn: number): number[] {
  const squares: number[] = [];
  for (let at = step(side, pawn, 0, 1); at >= 0; at = step(side, at, 0, 1)) squares.push(at);
  return squares;
}

/** Pawn moves from the square to one further on its file, the double step counted once. */
export function pawnMoves(side: Side, from: number, to: number): number {
  const ranks = rankFor(side, to) - rankFor(side, from);
  return rankFor(side, from) === 2 && ranks > 1 ? ranks - 1 : ranks;
}

export interface OnTheWay {
  readonly pawn: number;
  /** Where it will stand. */
  readonly landing: number;
  readonly moves: number;
  /** The first square on which it is stopped by pawns; -1 where it is not. */
  readonly stop: number;
  readonly by: 'ram' | 'controlled';
}

/** Every pawn of the side that attacks the square or would, if it went straight on. */
export function comingPawns(scene: Scene, side: Side, square: number): OnTheWay[] {
  return neighbours(scene, side, square)
    .filter((pawn) => rankFor(side, pawn) < rankFor(side, square))
    .map((pawn) => {
      const way = road(side, pawn).filter((at) => rankFor(side, at) < rankFor(side, square));
      const ram = (at: number) => scene.hasPawn(other(side), at);
      const controlled = (at: number) =>
        pawnAttackers(scene, other(side), at).length > 0 && pawnAttackers(scene, side, at).length === 0;
      const stop = way.find((at) => ram(at) || controlled(at)) ?? -1;
      const landing = way.at(-1) ?? pawn;
      return {
        pawn,
        landing,
        moves: pawnMoves(side, pawn, landing),
        stop,
        by: stop >= 0 && ram(stop) ? 'ram' : 'controlled',
      };
    });
}

/** How a square is held against the side's pawns. */
export function holdAgainst(scene: Scene, side: Side, square: number): 'attacked' | 'permanent' | 'fixed' | 'open' {
  const coming = comingPawns(scene, side, square);
  if (coming.length === 0) return 'permanent';
  if (coming.some(({ moves }) => moves === 0)) return 'attacked';
  return coming.every(({ stop }) => stop >= 0) ? 'fixed' : 'open';
}

/** The soonest pawns that are not stopped by pawns. */
export function soonestPawns(scene: Scene, side: Side, square: number): OnTheWay[] {
  const free = comingPawns(scene, side, square).filter(({ stop }) => stop < 0);
  const soonest = Math.min(...free.map(({ moves }) => moves));
  return free.filter(({ moves }) => moves === soonest);
}

/** The first man of either side from the pawn to a square ahead of it, that square included; -1 for none. */
export function inTheWay(scene: Scene, side: Side, pawn: number, to: number): number {
  return road(side, pawn).find((at) => rankFor(side, at) <= rankFor(side, to) && scene.letter(at) !== '') ?? -1;
}

/** Whether the pawn can take something now, in passing included. */
export function canTake(scene: Scene, side: Side, pawn: number): boolean {
  return [-1, 1].some((files) => {
    const to = step(side, pawn, files, 1);
    if (to < 0) return false;
    if (to === scene.passing) return side === scene.mover;
    return scene.sideOn(to) === other(side) && scene.kindOn(to) !== 'king';
  });
}

/** Whether the pawn attacks an enemy pawn. */
export const strikesPawn = (scene: Scene, side: Side, pawn: number): boolean =>
  [-1, 1].some((files) => scene.hasPawn(other(side), step(side, pawn, files, 1)));

export function isPassed(scene: Scene, side: Side, pawn: number): boolean {
  return !scene
    .pawns(other(side))
    .some((enemy) => Math.abs(fileOf(enemy) - fileOf(pawn)) <= 1 && rankFor(side, enemy) > rankFor(side, pawn));
}

/** No own pawn beside or behind on the next files, some ahead, and an enemy pawn bears on its way up to the nearest. */
export function isBackward(scene: Scene, side: Side, pawn: number): boolean {
  const own = neighbours(scene, side, pawn);
  if (own.length === 0 || own.some((one) => rankFor(side, one) <= rankFor(side, pawn))) return false;
  const level = Math.min(...own.map((one) => rankFor(side, one)));
  return road(side, pawn).some((at) => rankFor(side, at) <= level && pawnAttackers(scene, other(side), at).length > 0);
}

/** All pairs of pawns head to head, White's first. */
export function headToHead(scene: Scene): { white: number; black: number }[] {
  return scene
    .pawns('white')
    .filter((white) => scene.hasPawn('black', white + 8))
    .map((white) => ({ white, black: white + 8 }));
}

/** Runs of files with pawns of the side. */
export function islandCount(scene: Scene, side: Side): number {
  const held = [0, 1, 2, 3, 4, 5, 6, 7].map((file) => pawnsOnFile(scene, side, file).length > 0);
  return held.filter((here, file) => here && !held[file - 1]).length;
}

/** Whether pawns fix the pawn: one stands before it, or holds the square that no own pawn guards, and it attacks none. */
export function isFixedByPawns(scene: Scene, side: Side, pawn: number): boolean {
  const stop = step(side, pawn, 0, 1);
  const held = pawnAttackers(scene, other(side), stop).length > 0 && pawnAttackers(scene, side, stop).length === 0;
  return (held || scene.hasPawn(other(side), stop)) && !strikesPawn(scene, side, pawn);
}
