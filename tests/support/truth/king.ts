/** Statements about kings, recomputed. Luft is tried out: the pawn is moved and the flights are counted anew. */
import type { KingFact } from '@/engine/explain/facts/king';
import type { Checkers, FactOf, Told } from './claim';
import { pawnsOnFile } from './pawns';
import { fileLetter, fileOf, nameOf, other, rankFor, type Scene, type Side, squareOf } from './scene';
import { enemyNamed, files, inOrder, list, man, many, named, names, num, start, theAll, verb } from './words';

/** Squares that the king can step to. */
const flights = (scene: Scene, side: Side) => scene.safeMoves(scene.king(side));

const offBackRank = (scene: Scene, side: Side) => flights(scene, side).filter((at) => rankFor(side, at) !== 1);

/** The king's file and its neighbours. */
function filesBeside(king: number): number[] {
  return [fileOf(king) - 1, fileOf(king), fileOf(king) + 1].filter((file) => file >= 0 && file < 8);
}

/** The own pawn on the file nearest ahead of the king, or level with it; -1 for none. */
function shelterPawn(scene: Scene, side: Side, king: number, file: number): number {
  const ahead = pawnsOnFile(scene, side, file).filter((pawn) => rankFor(side, pawn) >= rankFor(side, king));
  return ahead.sort((a, b) => rankFor(side, a) - rankFor(side, b))[0] ?? -1;
}

const heavyMen = (scene: Scene, side: Side) => scene.men(side, 'rook', 'queen');

function luft(scene: Scene, { side, king, gives }: FactOf<'no-luft'>): Told {
  const at = squareOf(king);
  const noFlight = flights(scene, side).length === 0;
  const moves = list(
    gives.map(({ from, to }) => `${from}-${to}`),
    'or',
  );
  const given = gives.length > 0;
  const freed = gives.every(({ from, to }) => {
    const after = scene.moved(squareOf(from), squareOf(to));
    return offBackRank(after, side).length > 0 && (!noFlight || flights(after, side).length > 0);
  });
  const legal = gives.every(({ from, to }) => {
    const after = scene.moved(squareOf(from), squareOf(to));
    return scene.advances(squareOf(from)).includes(squareOf(to)) && after.attackers(other(side), at).length === 0;
  });
  const text = noFlight
    ? `The king on ${king} has no flight square${given ? `: ${moves} gives it the first` : ''}.`
    : `The king on ${king} has no luft: it cannot leave its back rank${given ? `, and ${moves} gives it a square` : ''}.`;
  return {
    facts: { king, noFlight, gives: gives.map(({ from, to }) => ({ from, to })) },
    text,
    claims: {
      'own king': scene.king(side) === at,
      'on its back rank': rankFor(side, at) === 1,
      'no luft': offBackRank(scene, side).length === 0,
      'each pawn move gives luft': freed,
      'each pawn move is legal': legal,
    },
  };
}

function broken(scene: Scene, { side, king }: FactOf<'shelter-broken'>): Told {
  const at = squareOf(king);
  const beside = filesBeside(at);
  const pawns = beside.map((file) => shelterPawn(scene, side, at, file));
  const bare = beside.filter((_, index) => pawns[index] === -1).map(fileLetter);
  const advanced = names(
    pawns.filter((pawn) => pawn >= 0 && rankFor(side, pawn) >= 4),
    side,
  );
  const parts = [
    bare.length > 0 ? `no ${side} pawn stands before it on the ${files(bare)}` : '',
    advanced.length > 0 ? `${list(advanced)} ${advanced.length === 1 ? 'has' : 'have'} gone ahead` : '',
  ];
  return {
    facts: { king, bare, advanced },
    text: `${named(side)}’s king on ${king} has ${bare.length > 0 ? 'gaps in its' : 'a loosened'} pawn cover: ${parts.filter((part) => part !== '').join(', and ')}.`,
    claims: { 'own king': scene.king(side) === at, 'a gap': bare.length + advanced.length > 0 },
  };
}

export const KING: Checkers<KingFact> = {
  'in-check': (scene, { side, king, checkers }) => {
    const at = squareOf(king);
    const attackers = scene.attackers(other(side), at).map(nameOf);
    const known = checkers
      .filter(({ square }) => attackers.includes(square))
      .map(({ square }) => man(scene, squareOf(square)));
    return {
      facts: { king, checkers: known },
      text: `The ${side} king on ${king} is in check: ${theAll(known)} ${verb(known.length, 'attack')} it.`,
      claims: {
        'own king': scene.king(side) === at,
        'all of them': known.length === attackers.length && known.length > 0,
      },
    };
  },
  'shelter-whole': (scene, { side, king }) => {
    const at = squareOf(king);
    const pawns = filesBeside(at).map((file) => shelterPawn(scene, side, at, file));
    return {
      facts: {
        king,
        pawns: names(
          pawns.filter((pawn) => pawn >= 0),
          side,
        ),
      },
      text: `${named(side)}’s king on ${king} has its pawn cover whole: the pawns on ${list(names(pawns, side))} have not moved.`,
      claims: {
        'own king': scene.king(side) === at,
        'all on their first square': pawns.every((pawn) => pawn >= 0 && rankFor(side, pawn) === 2),
      },
    };
  },
  'shelter-broken': broken,
  'no-luft': luft,
  'no-flight': (scene, { side, king }) => ({
    facts: { king },
    text: `The king on ${king} has no square to step to: every square around it is taken or attacked.`,
    claims: { 'own king': scene.king(side) === squareOf(king), 'no flight': flights(scene, side).length === 0 },
  }),
  'open-line-beside-king': (scene, { side, king, status }) => {
    const at = squareOf(king);
    const enemy = other(side);
    const open = filesBeside(at).filter(
      (file) =>
        pawnsOnFile(scene, enemy, file).length === 0 &&
        (pawnsOnFile(scene, side, file).length === 0) === (status === 'open'),
    );
    const on = files(open.map(fileLetter));
    const heavy = open.flatMap((file) =>
      heavyMen(scene, enemy)
        .filter((from) => fileOf(from) === file)
        .sort((a, b) => rankFor(enemy, a) - rankFor(enemy, b))
        .map((from) => man(scene, from)),
    );
    const head = `${open.length > 2 ? start(on) : `The ${on}`} by the king on ${king} ${open.length === 1 ? 'is' : 'are'} ${
      status === 'open' ? 'open' : `half-open for ${enemyNamed(side)}`
    }`;
    return {
      facts: { king, files: open.map(fileLetter), status: status === 'open' ? 'open' : 'half-open', heavy },
      text: heavy.length > 0 ? `${head}: ${theAll(heavy)} ${verb(heavy.length, 'stand')} there already.` : `${head}.`,
      claims: {
        'own king': scene.king(side) === at,
        'a file': open.length > 0,
        'heavy men left': heavyMen(scene, enemy).length > 0,
      },
    };
  },
  'king-zone': (scene, { side, king }) => {
    const at = squareOf(king);
    const round = [at, ...scene.seen(at)];
    const bearing = (of: Side) =>
      scene
        .men(of)
        .filter((from) => scene.kindOn(from) !== 'king' && scene.seen(from).some((to) => round.includes(to)));
    const attackers = inOrder(bearing(other(side)), other(side)).map((from) => man(scene, from));
    const guards = bearing(side).length;
    return {
      facts: { king, attackers, guards },
      text: `${start(num(attackers.length))} ${other(side)} men aim at the king on ${king} or squares beside it: ${theAll(attackers)}, against ${
        guards === 0 ? 'no guard' : many(guards, 'guard')
      } besides the king.`,
      claims: { 'own king': scene.king(side) === at, 'three or more': attackers.length >= 3 },
    };
  },
  'weak-back-rank': (scene, { side, king }) => {
    const at = squareOf(king);
    return {
      facts: { king },
      text: `${named(side)}’s back rank is weak: the king on ${king} cannot leave it, and no ${side} rook or queen stands on it.`,
      claims: {
        'own king on it': scene.king(side) === at && rankFor(side, at) === 1,
        'cannot leave it': offBackRank(scene, side).length === 0,
        'no own heavy man on it': heavyMen(scene, side).every((from) => rankFor(side, from) !== 1),
        'the enemy has heavy men': heavyMen(scene, other(side)).length > 0,
      },
    };
  },
};
