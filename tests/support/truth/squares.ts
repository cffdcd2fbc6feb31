/** Statements about squares, recomputed; and who can come to stand on one. */
import type { SquaresFact } from '@/engine/explain/facts/squares';
import type { Checkers, FactOf, Told } from './claim';
import { comingPawns, holdAgainst } from './pawns';
import { colourOf, fileOf, nameOf, other, rankFor, type Scene, type Side, squareOf } from './scene';
import { enemyNamed, inOrder, list, man, type ManAt, many, named, names, num, sentences, start, theAll } from './words';

export interface Comer extends ManAt {
  readonly moves: number;
}

const DEAR = ['pawn', 'knight', 'bishop', 'rook', 'queen', 'king'];

/** Pieces of the side that can come to stand on the square safely within three moves, soonest first. */
export function comersTo(scene: Scene, side: Side, square: number): Comer[] {
  return inOrder(scene.men(side, 'knight', 'bishop', 'rook', 'queen'), side)
    .flatMap((from) => {
      const moves = scene.reach(from).get(square);
      return moves === undefined ? [] : [{ ...man(scene, from), moves }];
    })
    .sort((a, b) => a.moves - b.moves || DEAR.indexOf(a.kind) - DEAR.indexOf(b.kind));
}

/** The sentence that names the soonest of them. */
export function comingText(scene: Scene, side: Side, comers: readonly Comer[]): string | null {
  const moves = Math.min(...comers.map((each) => each.moves).filter((each) => each > 0));
  const soonest = comers.filter((each) => each.moves === moves);
  const [first] = soonest;
  if (!first) return null;
  const within = `in ${many(moves, 'move')}`;
  const on = soonest.map(({ square }) => square);
  if (soonest.length === 1) return `The ${side} ${first.kind} on ${first.square} gets there ${within}`;
  const alike = soonest.every(({ kind }) => kind === first.kind);
  if (soonest.length === 2 && alike && first.kind === 'knight' && scene.men(side, 'knight').length === 2)
    return `Both ${side} knights get there ${within}`;
  if (alike) return `The ${side} ${first.kind}s on ${list(on)} get there ${within}`;
  const men = `${start(num(soonest.length))} ${side} men get there ${within}`;
  return soonest.length > 3 ? men : `${men}: ${theAll(soonest)}`;
}

function weak(scene: Scene, { id, side, square }: FactOf<'weak-for-good'>): Told {
  const at = squareOf(square);
  const enemy = other(side);
  const hold = holdAgainst(scene, side, at);
  const comers = comersTo(scene, enemy, at);
  const occupant = comers.some((comer) => comer.moves === 0) ? man(scene, at) : null;
  const commandedByEnemy = scene.command(at) === enemy;
  const front = comingPawns(scene, side, at).filter(
    ({ pawn }, _, all) =>
      !all.some((each) => fileOf(each.pawn) === fileOf(pawn) && rankFor(side, each.pawn) > rankFor(side, pawn)),
  );
  const stopped = hold === 'fixed' ? front.sort((a, b) => fileOf(a.pawn) - fileOf(b.pawn)) : [];
  const usage = occupant
    ? `A ${enemy} ${occupant.kind} stands there`
    : (comingText(scene, enemy, comers) ?? (commandedByEnemy ? `${named(enemy)} commands it` : null));
  const stops = stopped.map(({ stop, by }) =>
    by === 'ram' ? `by the pawn on ${nameOf(stop)}` : `before ${nameOf(stop)}, which a ${enemy} pawn holds`,
  );
  const pawns = stopped.map(({ pawn }) => nameOf(pawn));
  const why =
    stops.length === 0
      ? `no ${side} pawn can guard it any more`
      : stops.length === 1
        ? `the pawn on ${pawns[0]} that could guard it is stopped ${stops[0]}`
        : `of the pawns that could guard it, the one on ${pawns[0]} is stopped ${stops[0]}, and the one on ${pawns[1]} ${stops[1]}`;
  return {
    facts: {
      square,
      commandedByEnemy,
      occupant,
      comers,
      enemyKnights: scene.men(enemy, 'knight').length,
      stopped: stopped.map(({ pawn, stop, by }) => ({ pawn: nameOf(pawn), on: nameOf(stop), by })),
    },
    text: sentences(`${square} is weak ${stops.length > 0 ? 'as the pawns stand' : 'for good'}: ${why}`, usage),
    claims: {
      'held as it says': hold === (id === 'weak-for-good' ? 'permanent' : 'fixed'),
      'on the third to fifth rank': rankFor(side, at) >= 3 && rankFor(side, at) <= 5,
      'no pawn stands on it': scene.kindOn(at) !== 'pawn',
      'of use to the enemy': commandedByEnemy || comers.length > 0,
    },
  };
}

const CENTRE = ['d4', 'd5', 'e4', 'e5'].map(squareOf);

export const SQUARES: Checkers<SquaresFact> = {
  'weak-for-good': weak,
  'weak-while-fixed': weak,
  'weak-complex': (scene, { side, colour, weak: squares }) => {
    const enemyBishop = scene.men(other(side), 'bishop').some((at) => colourOf(at) === colour);
    const all = squares.map(squareOf);
    return {
      facts: { colour, weak: names(all, side), enemyBishop },
      text: sentences(
        `${named(side)} is weak on the ${colour} squares: no pawn can guard ${list(names(all, side))}, and ${named(side)} has no ${colour}-squared bishop`,
        enemyBishop ? `${enemyNamed(side)} has one` : null,
      ),
      claims: {
        'three or more': all.length >= 3,
        'of the colour, in the camp': all.every((at) => colourOf(at) === colour && rankFor(side, at) <= 4),
        'no pawn can guard them': all.every((at) => holdAgainst(scene, side, at) === 'permanent'),
        'no bishop': !scene.men(side, 'bishop').some((at) => colourOf(at) === colour),
      },
    };
  },
  'centre-command': (scene, { side }) => {
    const commanded = names(
      CENTRE.filter((at) => scene.command(at) === side),
      side,
    );
    return {
      facts: { commanded },
      text: `${named(side)} commands the centre: a ${other(side)} minor piece would be lost on ${list(commanded, 'or')}, a ${side} one would not.`,
      claims: {
        'three or more': commanded.length >= 3,
        'bishops as knights': commanded.every(
          (at) => scene.lost(other(side), 'b', squareOf(at)) && !scene.lost(side, 'b', squareOf(at)),
        ),
      },
    };
  },
  'disputed-square': (scene, { square }) => {
    const at = squareOf(square);
    const first = scene.mover;
    const [firstCount, secondCount] = [scene.attackers(first, at).length, scene.attackers(other(first), at).length];
    return {
      facts: { square, first, firstCount, secondCount },
      text: `${square} is disputed: a minor piece of either side would be lost there, with ${num(firstCount)} ${first} ${
        firstCount === 1 ? 'attacker' : 'attackers'
      } against ${num(secondCount)}.`,
      claims: {
        'both lost': scene.command(at) === 'disputed',
        'bishops as knights': scene.lost('white', 'b', at) && scene.lost('black', 'b', at),
      },
    };
  },
  'square-closed': (scene, { side, square }) => {
    const at = squareOf(square);
    const enemySide = other(side);
    const [own, enemy] = [scene.attackers(side, at).length, scene.attackers(enemySide, at).length];
    return {
      facts: { square, own, enemy },
      text: sentences(
        `${named(side)} commands ${square}: a ${enemySide} minor piece there would be lost, a ${side} one would not`,
        `${start(num(own))} ${side} ${own === 1 ? 'man bears' : 'men bear'} on it, ${
          enemy === 0 ? `no ${enemySide} one` : `${num(enemy)} of ${named(enemySide)}’s`
        }`,
      ),
      claims: {
        commanded: scene.command(at) === side,
        'bishops as knights': scene.lost(enemySide, 'b', at) && !scene.lost(side, 'b', at),
        empty: scene.letter(at) === '',
      },
    };
  },
};
