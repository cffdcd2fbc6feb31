/** Statements about files, the seventh rank and diagonals, recomputed. */
import type { FilesFact } from '@/engine/explain/facts/files';
import { attacks } from '../slow/exchange';
import type { Checkers, FactOf, Told } from './claim';
import { headToHead, isBackward, isIsolated, pawnAttackers, pawnsOnFile } from './pawns';
import { fileOf, letterFor, nameOf, other, rankFor, type Scene, type Side, squareOf, step } from './scene';
import { list, man, many, named, names, num, sentences, start, the, theAll, verb } from './words';

const numberOf = (file: string) => 'abcdefgh'.indexOf(file);

/** Rooks and queens of the side on a file, its first rank first. */
function heavyOn(scene: Scene, side: Side, file: number): number[] {
  return scene
    .men(side, 'rook', 'queen')
    .filter((at) => fileOf(at) === file)
    .sort((a, b) => rankFor(side, a) - rankFor(side, b));
}

/** Squares of a file from the side's first rank on. */
const along = (side: Side, file: number) =>
  [1, 2, 3, 4, 5, 6, 7, 8].map((rank) => (side === 'white' ? rank - 1 : 8 - rank) * 8 + file);

const statusOf = (scene: Scene, side: Side, file: number) =>
  pawnsOnFile(scene, side, file).length > 0
    ? 'closed'
    : pawnsOnFile(scene, other(side), file).length > 0
      ? 'half-open'
      : 'open';

/** Whether a rook could be there without loss: no enemy king on the square. */
const rookSafe = (scene: Scene, side: Side, square: number) =>
  !(scene.kindOn(square) === 'king' && scene.sideOn(square) !== side) && !scene.lost(side, 'r', square);

/** Squares of the last two ranks where a rook is safe, before the first pawn or enemy man that it could not take. */
function entries(scene: Scene, side: Side, file: number): number[] {
  const line = along(side, file);
  const shut = line.findIndex(
    (at) => scene.kindOn(at) === 'pawn' || (scene.sideOn(at) === other(side) && !rookSafe(scene, side, at)),
  );
  const open = shut < 0 ? line : line.slice(0, shut);
  return open.filter((at) => rankFor(side, at) >= 7 && rookSafe(scene, side, at));
}

/** Squares of the enemy half that a heavy man of the side holds along the file. */
const held = (scene: Scene, side: Side, file: number) =>
  along(side, file).filter(
    (at) =>
      rankFor(side, at) >= 5 &&
      heavyOn(scene, side, file).some((from) => from === at || attacks(scene.board, from, at)) &&
      !scene.lost(side, 'r', at),
  );

/** Whether a heavy man of the file can go to the square now without loss. */
const canEnter = (scene: Scene, side: Side, file: number, to: number) =>
  heavyOn(scene, side, file).some((from) => scene.safeMoves(from).includes(to));

function owned(scene: Scene, { side, file }: FactOf<'file-owned'>): Told {
  const number = numberOf(file);
  const on = heavyOn(scene, side, number);
  const heavy = on.map((at) => man(scene, at));
  const into = along(side, number).filter((at) => rankFor(side, at) >= 7 && canEnter(scene, side, number, at));
  const stand = `${theAll(heavy)} ${verb(heavy.length, 'stand')} there alone`;
  const isIn = on.some((at) => rankFor(side, at) >= 7);
  return {
    facts: { file, status: statusOf(scene, side, number), heavy, entries: into.map(nameOf) },
    text: `${named(side)} owns the ${file}-file: ${
      into.length > 0
        ? `${theAll(heavy)} can enter on ${list(into.map(nameOf), 'or')}`
        : `${stand}${isIn ? '' : ', but with no safe way in yet'}`
    }.`,
    claims: {
      'no enemy heavy man on it': heavyOn(scene, other(side), number).length === 0,
      'a square held beyond the middle': held(scene, side, number).length > 0,
    },
  };
}

function target(scene: Scene, { side, file }: FactOf<'half-open-target'>): Told {
  const number = numberOf(file);
  const enemy = other(side);
  const [first = -1] = pawnsOnFile(scene, enemy, number).sort((a, b) => rankFor(side, a) - rankFor(side, b));
  const guarded = pawnAttackers(scene, enemy, first).length > 0;
  const why = isBackward(scene, enemy, first)
    ? 'backward'
    : isIsolated(scene, enemy, first)
      ? 'isolated'
      : guarded
        ? null
        : 'unguarded';
  const heavy = heavyOn(scene, side, number).map((at) => man(scene, at));
  const reason = why === 'unguarded' ? 'no pawn guards the pawn there' : `the pawn there is ${why}`;
  return {
    facts: { file, target: nameOf(first), why, heavy },
    text: sentences(
      `The ${file}-file is half-open for ${named(side)} and bites on ${nameOf(first)}: ${reason}`,
      heavy.length > 0 ? `${start(theAll(heavy))} ${verb(heavy.length, 'stand')} on the file` : null,
    ),
    claims: { 'half-open': statusOf(scene, side, number) === 'half-open' },
  };
}

function nothing(scene: Scene, { side, file }: FactOf<'half-open-nothing'>): Told {
  const number = numberOf(file);
  const enemy = other(side);
  const [first = -1] = pawnsOnFile(scene, enemy, number).sort((a, b) => rankFor(side, a) - rankFor(side, b));
  const guards = names(pawnAttackers(scene, enemy, first), enemy);
  return {
    facts: { file, pawn: nameOf(first), guards },
    text: `The ${file}-file is half-open for ${named(side)} and bites on nothing: ${list(guards)} ${verb(guards.length, 'guard')} ${nameOf(first)}, and no entry square on it is ${named(side)}’s.`,
    claims: {
      'half-open': statusOf(scene, side, number) === 'half-open',
      'a pawn guards it': guards.length > 0,
      'neither isolated nor backward': !isIsolated(scene, enemy, first) && !isBackward(scene, enemy, first),
      'no way in': entries(scene, side, number).length === 0,
    },
  };
}

function onSeventh(scene: Scene, { side }: FactOf<'on-seventh'>): Told {
  const on = scene.men(side, 'rook', 'queen').filter((at) => rankFor(side, at) === 7);
  const heavy = names(on, side).map((name) => man(scene, squareOf(name)));
  const pawns = names(
    scene.pawns(other(side)).filter((at) => rankFor(side, at) === 7),
    side,
  );
  const rank = `on ${named(side)}’s seventh rank`;
  const isMixed = new Set(heavy.map(({ kind }) => kind)).size > 1;
  const there = `${many(pawns.length, 'enemy pawn')} ${verb(pawns.length, 'stand')} there too, on ${list(pawns)}`;
  return {
    facts: { heavy, pawns },
    text: isMixed
      ? sentences(
          `${start(num(heavy.length))} heavy men stand ${rank}: ${theAll(heavy)}`,
          pawns.length > 0 ? start(there) : null,
        )
      : `${start(theAll(heavy))} ${verb(heavy.length, 'stand')} ${rank}${pawns.length > 0 ? `: ${there}` : ''}.`,
    claims: { somebody: heavy.length > 0 },
  };
}

/** Squares that a slider sees one way, the first man on it included. */
function ray(scene: Scene, from: number, files: number, ranks: number): number[] {
  const squares: number[] = [];
  for (let at = step('white', from, files, ranks); at >= 0; at = step('white', at, files, ranks)) {
    squares.push(at);
    if (scene.letter(at) !== '') break;
  }
  return squares;
}

const forwardRays = (scene: Scene, side: Side, from: number) =>
  [-1, 1].map((files) => ray(scene, from, files, side === 'white' ? 1 : -1));

export const FILES: Checkers<FilesFact> = {
  'file-owned': owned,
  'file-contested': (scene, { file }) => {
    const number = numberOf(file);
    const [mine, theirs] = [scene.mover, other(scene.mover)].map((side) => heavyOn(scene, side, number));
    const heavy = [...(mine ?? []), ...(theirs ?? [])].map((at) => man(scene, at));
    return {
      facts: { file, heavy },
      text: `The ${file}-file is contested: both sides stand on it, with ${theAll(heavy)}.`,
      claims: {
        'both stand on it': (mine?.length ?? 0) > 0 && (theirs?.length ?? 0) > 0,
        open: statusOf(scene, 'white', number) === 'open',
      },
    };
  },
  'file-open-no-entry': (scene, { file }) => {
    const number = numberOf(file);
    return {
      facts: { file },
      text: `The ${file}-file is open and leads nowhere: neither side has an entry square on its last two ranks.`,
      claims: {
        open: statusOf(scene, 'white', number) === 'open',
        'no entry for White': entries(scene, 'white', number).length === 0,
        'no entry for Black': entries(scene, 'black', number).length === 0,
      },
    };
  },
  'half-open-target': target,
  'half-open-nothing': nothing,
  'rook-to-file': (scene, { side, rook, to, file }) => {
    const [from, goal] = [squareOf(rook), squareOf(to)];
    const number = numberOf(file);
    const moves = scene.reach(from).get(goal) ?? -1;
    const status = statusOf(scene, side, number);
    return {
      facts: { rook, to, moves, file, status },
      text: `The rook on ${rook} can take the ${status} ${file}-file: it is ${many(moves, 'move')} from ${to}.`,
      claims: {
        'an own rook': scene.letter(from) === letterFor(side, 'r'),
        'the square lies on the file': fileOf(goal) === number && fileOf(from) !== number,
        empty: scene.letter(goal) === '',
        'nobody there yet': heavyOn(scene, side, number).length === 0,
      },
    };
  },
  'heavy-doubled': (scene, { side, file }) => {
    const on = heavyOn(scene, side, numberOf(file));
    const heavy = on.map((at) => man(scene, at));
    const [rear = 0, front = 0] = [on[0], on.at(-1)];
    const line = along(side, numberOf(file)).filter(
      (at) => rankFor(side, at) > rankFor(side, rear) && rankFor(side, at) < rankFor(side, front),
    );
    return {
      facts: { file, heavy },
      text: `${named(side)} has ${heavy.length > 2 ? `${num(heavy.length)} heavy men` : 'doubled'} on the ${file}-file: ${theAll(heavy)} stand behind one another.`,
      claims: {
        'two or more': heavy.length > 1,
        'nothing between': line.every((at) => scene.letter(at) === '' || on.includes(at)),
      },
    };
  },
  'file-man-target': (scene, { side, file, target: { square } }) => {
    const on = heavyOn(scene, side, numberOf(file));
    const heavy = on.map((at) => man(scene, at));
    const at = squareOf(square);
    const target = man(scene, at);
    const beyond = along(side, numberOf(file)).filter((each) => rankFor(side, each) > rankFor(side, on.at(-1) ?? 0));
    return {
      facts: { file, target, heavy },
      text: `${start(the(target))} is a target on the ${file}-file: no pawn guards it, and ${theAll(heavy)} stand against it.`,
      claims: {
        'two or more': heavy.length > 1,
        'an enemy minor man': scene.sideOn(at) === other(side) && ['knight', 'bishop'].includes(target.kind),
        'the next man on the file': beyond.find((each) => scene.letter(each) !== '') === at,
        'no pawn guards it': pawnAttackers(scene, other(side), at).length === 0,
        'no own pawn on the file': pawnsOnFile(scene, side, numberOf(file)).length === 0,
      },
    };
  },
  'on-seventh': onSeventh,
  'to-seventh': (scene, { side, man: { square }, to }) => {
    const from = squareOf(square);
    const comer = man(scene, from);
    const moves = scene.reach(from).get(squareOf(to)) ?? -1;
    return {
      facts: { man: comer, to, moves },
      text: `${start(the(comer))} can come to ${named(side)}’s seventh rank: ${to} is ${many(moves, 'safe move')} away.`,
      claims: {
        'an own heavy man': scene.sideOn(from) === side && (comer.kind === 'rook' || comer.kind === 'queen'),
        'on that rank': rankFor(side, squareOf(to)) === 7,
      },
    };
  },
  'long-diagonal-open': (scene, { side, man: { square } }) => {
    const from = squareOf(square);
    const bishop = man(scene, from);
    const onRising = fileOf(from) === Math.floor(from / 8);
    const onFalling = fileOf(from) + Math.floor(from / 8) === 7;
    const seen = ray(scene, from, (side === 'white') === onRising ? 1 : -1, side === 'white' ? 1 : -1);
    const last = nameOf(seen.at(-1) ?? from);
    return {
      facts: { man: bishop, last, seen: seen.length },
      text: `${start(the(bishop))} has the long diagonal open: it sees ${many(seen.length, 'square')} ahead on it, as far as ${last}.`,
      claims: {
        'an own bishop': scene.sideOn(from) === side && bishop.kind === 'bishop',
        'on a long diagonal': onRising || onFalling,
        'five squares or more': seen.length >= 5,
      },
    };
  },
  'diagonal-shut': (scene, { side, man: { square }, stopper }) => {
    const from = squareOf(square);
    const bishop = man(scene, from);
    const stop = squareOf(stopper);
    const whose = scene.sideOn(stop);
    const rays = forwardRays(scene, side, from);
    return {
      facts: { man: bishop, stopper, stopperSide: whose },
      text: `${start(the(bishop))} looks at a wall: its way forward ends at ${whose === side ? 'its own' : `the ${whose}`} pawn on ${stopper}, which stands head to head with another.`,
      claims: {
        'an own bishop': scene.sideOn(from) === side && bishop.kind === 'bishop',
        'a diagonal ends there': rays.some((squares) => squares.at(-1) === stop),
        'a pawn head to head': headToHead(scene).some(({ white, black }) => white === stop || black === stop),
        'no long way forward': rays.every((squares) => squares.length <= 2),
      },
    };
  },
};
