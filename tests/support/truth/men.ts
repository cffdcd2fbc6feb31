/** Statements about men, recomputed: how they stand, what they do, what threatens them. */
import type { MenFact, PlacedMan } from '@/engine/explain/facts/men';
import { slowBehind } from '../slow/behind';
import { slowLoss } from '../slow/exchange';
import { BISHOPS } from './bishops';
import type { Checkers, FactOf, Told } from './claim';
import { fileOf, nameOf, other, rankFor, type Scene, type Side, squareOf } from './scene';
import { enemyNamed, man, many, named, names, num, start, the, theAll } from './words';

const MOST: Readonly<Record<string, number>> = { knight: 8, bishop: 13, rook: 14, queen: 27 };
const CENTRE = ['d4', 'e4', 'd5', 'e5'].map(squareOf);
const WORTH: Readonly<Record<string, number>> = { pawn: 1, knight: 3, bishop: 3, rook: 5, queen: 9 };

/** Safe moves to the nearest centre square; null where it takes more than three. */
function toCentre(scene: Scene, from: number): number | null {
  const reach = scene.reach(from);
  const moves = CENTRE.flatMap((at) => reach.get(at) ?? []);
  return moves.length > 0 ? Math.min(...moves) : null;
}

const centreText = (moves: number | null) =>
  moves === null ? 'more than three moves from the centre' : `${many(moves, 'move')} from the centre`;

const enemyHalf = (scene: Scene, side: Side, from: number) =>
  scene.seen(from).filter((at) => rankFor(side, at) >= 5).length;

const share = (scene: Scene, from: number) => scene.safeMoves(from).length / (MOST[scene.kindOn(from) ?? ''] ?? 1);

function placed(scene: Scene, { id, side, man: { square } }: PlacedMan): Told {
  const at = squareOf(square);
  const who = man(scene, at);
  const safeMoves = scene.safeMoves(at).length;
  const most = MOST[who.kind] ?? 0;
  const seen = enemyHalf(scene, side, at);
  const centre = toCentre(scene, at);
  const rivals = scene
    .men(side, 'knight', 'bishop', 'rook', 'queen')
    .filter((from) => from !== at && scene.gain(other(side), from) === 0);
  const count = `${many(safeMoves, 'safe move')} of the ${num(most)} that a ${who.kind} can have`;
  const best = id === 'best-placed';
  const body = best
    ? `${count}${seen > 0 ? `, and it attacks ${many(seen, 'square')} in ${enemyNamed(side)}’s half` : ''}`
    : `${count}${centre === 0 ? '' : `, and ${centreText(centre)}`}`;
  return {
    facts: { man: who, safeMoves, most, enemyHalf: seen, toCentre: centre },
    text: `${start(the(who))} is ${named(side)}’s ${best ? 'best' : 'worst'} placed man: ${body}.`,
    claims: {
      'own man, not en prise': scene.sideOn(at) === side && scene.gain(other(side), at) === 0,
      'ahead of (behind) all others': rivals.every((from) =>
        best ? share(scene, from) < share(scene, at) : share(scene, from) > share(scene, at),
      ),
      'somebody to compare with': rivals.length > 0,
    },
  };
}

/** What the enemy gains more by capturing on the ward once the man is off the board. */
function lossWithout(scene: Scene, side: Side, from: number, ward: number): number {
  const letter = scene.letter(ward);
  return slowLoss(scene.without(from).board, letter, ward, -1) - scene.gain(other(side), ward);
}

/**
 * Whether the man guards the ward: directly, from behind another, through enemy men that attack it on the same line, or by
 * holding an enemy attacker in a pin.
 */
function guards(scene: Scene, side: Side, from: number, ward: number): boolean {
  if (scene.attackers(side, ward).includes(from) || slowBehind(scene.board, side === 'white', ward).has(from))
    return true;
  const attackers = scene.attackers(other(side), ward);
  const thinned = scene.with(scene.board.map((letter, at) => (attackers.includes(at) && at !== ward ? '' : letter)));
  if (thinned.attackers(side, ward).includes(from)) return true;
  return attackers.some((at) => scene.pinner(at) === from);
}

/** Whether the man stands between an enemy slider and the ward, or its own king, on a line on which that slider moves. */
function screens(scene: Scene, side: Side, from: number, ward: number): boolean {
  const bare = scene.board.map((letter, at) => (at === ward || at === scene.king(side) ? letter : ''));
  return scene.men(other(side), 'bishop', 'rook', 'queen').some((slider) => {
    const line = scene.with(bare.map((letter, at) => (at === slider ? scene.letter(slider) : letter)));
    const shut = scene.with(line.board.map((letter, at) => (at === from ? scene.letter(from) : letter)));
    return [ward, scene.king(side)].some(
      (end) => end >= 0 && line.seen(slider).includes(end) && !shut.seen(slider).includes(end),
    );
  });
}

function trapped(scene: Scene, { side, man: { square } }: FactOf<'trapped'>): Told {
  const at = squareOf(square);
  const who = man(scene, at);
  const enemy = other(side);
  const attacked = scene.attackers(enemy, at).length > 0;
  const pawnComes = scene
    .pawns(enemy)
    .some((pawn) =>
      scene.advances(pawn).some((to) => scene.moves(pawn).includes(to) && scene.moved(pawn, to).seen(to).includes(at)),
    );
  const worthwhile = scene
    .moves(at)
    .some(
      (to) =>
        scene.letter(to) !== '' &&
        (WORTH[scene.kindOn(to) ?? ''] ?? 0) >= slowLoss(scene.board, scene.letter(at), to, at),
    );
  return {
    facts: { man: who, attacked },
    text: `${start(the(who))} is trapped: ${
      attacked
        ? 'it is attacked and has no safe square to go to'
        : 'a pawn can attack it in one move, and it has no safe square to go to'
    }.`,
    claims: {
      'own piece': scene.sideOn(at) === side && MOST[who.kind] !== undefined,
      'no safe square': scene.safeMoves(at).length === 0,
      'no capture that pays': !worthwhile,
      'attacked, or a pawn comes': attacked || pawnComes,
    },
  };
}

function outOfPlay(scene: Scene, { side, man: { square } }: FactOf<'out-of-play'>): Told {
  const at = squareOf(square);
  const who = man(scene, at);
  const safeMoves = scene.safeMoves(at).length;
  const centre = toCentre(scene, at);
  return {
    facts: { man: who, safeMoves, toCentre: centre },
    text: `${start(the(who))} is out of play: ${many(safeMoves, 'safe move')}, and ${centreText(centre)}.`,
    claims: {
      'own man': scene.sideOn(at) === side,
      'at the edge': [0, 1, 6, 7].includes(fileOf(at)),
      'few moves': safeMoves <= 2,
      'far away': centre === null || centre >= 3,
    },
  };
}

export const MEN: Checkers<MenFact> = {
  ...BISHOPS,
  'best-placed': placed,
  'worst-placed': placed,
  'knight-on-rim': (scene, { side, square }) => {
    const at = squareOf(square);
    const sees = scene.seen(at).length;
    return {
      facts: { man: man(scene, at), square, sees },
      text: `The knight on ${square} stands on the rim: it attacks ${num(sees)} of the eight squares that a knight can.`,
      claims: {
        'own knight': scene.sideOn(at) === side && scene.kindOn(at) === 'knight',
        'on the rim': fileOf(at) === 0 || fileOf(at) === 7,
      },
    };
  },
  'out-of-play': outOfPlay,
  trapped,
  pinned: (scene, { side, man: { square } }) => {
    const at = squareOf(square);
    const pinner = scene.pinner(at);
    const [who, by] = [man(scene, at), man(scene, pinner)];
    const king = nameOf(scene.king(side));
    return {
      facts: { man: who, pinner: by, king },
      text: `${start(the(who))} is pinned: ${the(by)} would attack the king on ${king} through it.`,
      claims: { 'own man': scene.sideOn(at) === side, pinned: pinner >= 0 },
    };
  },
  overloaded: (scene, { side, man: { square }, guards: wards }) => {
    const at = squareOf(square);
    const who = man(scene, at);
    const on = wards.map((ward) => squareOf(ward.square));
    const enemies = on.map((ward) => scene.attackers(other(side), ward));
    return {
      facts: { man: who, guards: on.map((ward) => man(scene, ward)) },
      text: `${start(the(who))} is overloaded: ${theAll(on.map((ward) => man(scene, ward)))} both need it as a guard, and both are attacked.`,
      claims: {
        'own men': [at, ...on].every((each) => scene.sideOn(each) === side),
        'two of them': on.length === 2,
        'it guards both': on.every((ward) => guards(scene, side, at, ward)),
        'both fall without it': on.every((ward) => lossWithout(scene, side, at, ward) > 0),
        'both are attacked': enemies.every((list) => list.length > 0),
        'by two men in all': new Set(enemies.flat()).size >= 2,
      },
    };
  },
  tied: (scene, { side, man: { square }, ward: { square: other_ }, by }) => {
    const [at, ward] = [squareOf(square), squareOf(other_)];
    const loses = lossWithout(scene, side, at, ward);
    const now = scene.gain(other(side), ward);
    const [who, what] = [man(scene, at), man(scene, ward)];
    return {
      facts: { man: who, ward: what, loses, already: now, by },
      text: `${start(the(who))} is tied to ${the(what)}: ${by === 'screen' ? 'it shuts the line; ' : ''}if it leaves, ${enemyNamed(side)} gains ${many(loses, 'pawn')}’${loses === 1 ? 's' : ''} worth ${now > 0 ? 'more ' : ''}there.`,
      claims: {
        'own men': scene.sideOn(at) === side && scene.sideOn(ward) === side,
        'something falls': loses > 0,
        'it shuts a line': by === 'guard' || screens(scene, side, at, ward),
      },
    };
  },
  loose: (scene, { side, man: { square } }) => {
    const at = squareOf(square);
    const who = man(scene, at);
    return {
      facts: { man: who },
      text: `${start(the(who))} is loose: no ${side} man guards it.`,
      claims: { 'own man': scene.sideOn(at) === side, 'no guard': scene.attackers(side, at).length === 0 },
    };
  },
  'en-prise': (scene, { side, man: { square } }) => {
    const at = squareOf(square);
    const who = man(scene, at);
    const gain = scene.gain(other(side), at);
    const own = scene.attackers(side, at).length;
    const enemy = enemyNamed(side);
    return {
      facts: { man: who, gain, guards: own },
      text: `${start(the(who))} is en prise: ${
        own === 0
          ? `no ${side} man guards it, and ${enemy} can take it`
          : `${enemy} gains ${many(gain, 'pawn')}’${gain === 1 ? 's' : ''} worth by capturing there`
      }.`,
      claims: { 'own man': scene.sideOn(at) === side, 'a gain': gain > 0 },
    };
  },
  'blocked-in': (scene, { side, man: { square } }) => {
    const at = squareOf(square);
    const who = man(scene, at);
    const seen = scene.seen(at);
    const by = names(seen, side).map((name) => man(scene, squareOf(name)));
    return {
      facts: { man: who, by },
      text: `${start(the(who))} is blocked in by its own side: ${theAll(by)} ${by.length === 1 ? 'takes' : 'take'} every square it could go to.`,
      claims: {
        'own man': scene.sideOn(at) === side,
        'own men everywhere': seen.length > 0 && seen.every((to) => scene.sideOn(to) === side),
      },
    };
  },
};
