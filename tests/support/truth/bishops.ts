/** Statements about bishops, recomputed: bad ones and what would mend them, the pair, bishop against knight. */
import type { MenFact } from '@/engine/explain/facts/men';
import type { Checkers, FactOf, Told } from './claim';
import { headToHead, inTheWay, isFixedByPawns, pawnMoves, strikesPawn } from './pawns';
import { colourOf, fileOf, other, rankFor, type Scene, type Side, squareOf, step } from './scene';
import { enemyNamed, inOrder, list, many, named, names, num, sentences, share, verb } from './words';

type BishopFact = Extract<MenFact, { id: 'bad-bishop' | 'bad-but-active' | 'bishop-pair' | 'bishop-against-knight' }>;

const onColour = (scene: Scene, side: Side, bishop: number) =>
  scene.pawns(side).filter((pawn) => colourOf(pawn) === colourOf(bishop));

/** Own pawns of its colour on the files c to f that pawns fix. */
const fixedCentre = (scene: Scene, side: Side, bishop: number) =>
  onColour(scene, side, bishop).filter(
    (pawn) => fileOf(pawn) >= 2 && fileOf(pawn) <= 5 && isFixedByPawns(scene, side, pawn),
  );

const isBad = (scene: Scene, side: Side, bishop: number) =>
  fixedCentre(scene, side, bishop).length > 0 && onColour(scene, side, bishop).length * 2 >= scene.pawns(side).length;

/** Outside the fixed pawns: no forward diagonal runs first into one of them, and one leads into the enemy half. */
function isOutside(scene: Scene, side: Side, square: number, fixed: readonly number[]): boolean {
  const ends = [-1, 1].map((files) => {
    let last = square;
    for (let at = step(side, square, files, 1); at >= 0; at = step(side, at, files, 1)) {
      last = at;
      if (scene.letter(at) !== '') break;
    }
    return last;
  });
  return !ends.some((end) => end !== square && fixed.includes(end)) && ends.some((end) => rankFor(side, end) >= 5);
}

function bad(scene: Scene, fact: FactOf<'bad-bishop'>): Told {
  const { side, square, lever, outside } = fact;
  const at = squareOf(square);
  const enemy = other(side);
  const colour = colourOf(at);
  const fixed = fixedCentre(scene, side, at);
  const count = onColour(scene, side, at).length;
  const pawns = scene.pawns(side).length;
  const tradeable = scene.men(enemy, 'bishop').some((each) => colourOf(each) === colour);
  const helps = lever ? `the pawn on ${lever.against} that helps to shut it in` : '';
  const remedy =
    lever && outside?.moves !== 1
      ? lever.moves === 0
        ? `The pawn on ${lever.pawn} attacks ${helps}`
        : `The lever ${lever.pawn}-${lever.on}, ${many(lever.moves, 'move')} away, strikes at ${helps}`
      : outside
        ? `It gets outside the chain, to ${outside.square}, in ${many(outside.moves, 'move')}`
        : tradeable
          ? `It can be offered for ${enemyNamed(side)}’s ${colour}-squared bishop`
          : null;
  return {
    facts: {
      square,
      colour,
      onColour: count,
      pawns,
      fixed: names(fixed, side),
      tradeable,
      lever: lever && { ...lever, moves: pawnMoves(side, squareOf(lever.pawn), squareOf(lever.on)) },
      outside: outside && { ...outside, moves: scene.reach(at).get(squareOf(outside.square)) ?? -1 },
    },
    text: sentences(
      `The bishop on ${square} is ${outside?.moves === 1 ? 'shut in by its pawns for now' : `${named(side)}’s problem piece`}: ${share(count, pawns)} on its colour, ${list(names(fixed, side))} fixed among them`,
      remedy,
    ),
    claims: {
      'own bishop': scene.sideOn(at) === side && scene.kindOn(at) === 'bishop',
      'half of the pawns, one fixed in the centre': isBad(scene, side, at),
      'not outside already': !isOutside(scene, side, at, fixed),
      'the lever is one': !lever || isLever(scene, side, lever, fixed),
      'nobody in the lever’s way':
        !lever || lever.moves === 0 || inTheWay(scene, side, squareOf(lever.pawn), squareOf(lever.on)) < 0,
      'outside there':
        !outside || isOutside(scene.moved(at, squareOf(outside.square)), side, squareOf(outside.square), fixed),
    },
  };
}

/** An own pawn that attacks, from there, a pawn that stands before one of the fixed ones. */
function isLever(
  scene: Scene,
  side: Side,
  { pawn, on, against }: { pawn: string; on: string; against: string },
  fixed: readonly number[],
): boolean {
  const [from, goal, target] = [squareOf(pawn), squareOf(on), squareOf(against)];
  return (
    scene.hasPawn(side, from) &&
    fileOf(from) === fileOf(goal) &&
    rankFor(side, goal) >= rankFor(side, from) &&
    scene.hasPawn(other(side), target) &&
    [-1, 1].some((files) => step(side, goal, files, 1) === target) &&
    fixed.some((each) => step(side, each, 0, 1) === target && !strikesPawn(scene, side, each))
  );
}

export const BISHOPS: Checkers<BishopFact> = {
  'bad-bishop': bad,
  'bad-but-active': (scene, { side, square }) => {
    const at = squareOf(square);
    const count = onColour(scene, side, at).length;
    const pawns = scene.pawns(side).length;
    const safeMoves = scene.safeMoves(at).length;
    return {
      facts: { square, onColour: count, pawns, safeMoves },
      text: `The bishop on ${square} is bad by its pawns but looks past them: ${share(count, pawns)} on its colour, yet it has ${many(safeMoves, 'safe move')}.`,
      claims: {
        'own bishop': scene.sideOn(at) === side && scene.kindOn(at) === 'bishop',
        'bad by its pawns': isBad(scene, side, at),
        outside: isOutside(scene, side, at, fixedCentre(scene, side, at)),
      },
    };
  },
  'bishop-pair': (scene, { side }) => {
    const hasBoth = (of: Side) => new Set(scene.men(of, 'bishop').map(colourOf)).size === 2;
    return {
      facts: {},
      text: `${named(side)} has the bishop pair: ${enemyNamed(side)} has not.`,
      claims: { 'one side': hasBoth(side) && !hasBoth(other(side)) },
    };
  },
  'bishop-against-knight': (scene, { side, bishop, knight, favours }) => {
    const at = squareOf(bishop);
    const count = onColour(scene, side, at).length;
    const pawns = scene.pawns(side).length;
    const rams = headToHead(scene).length;
    const minors = [...scene.men('white', 'bishop', 'knight'), ...scene.men('black', 'bishop', 'knight')];
    const allFiles = [...scene.pawns('white'), ...scene.pawns('black')].map(fileOf);
    const text =
      favours === 'knight'
        ? `The pawns suit the knight on ${knight} better than the bishop on ${bishop}: ${num(count)} of ${named(side)}’s ${many(pawns, 'pawn')} ${verb(count, 'stand')} on the bishop’s colour, and ${many(rams, 'pair')} of pawns ${verb(rams, 'stand')} head to head.`
        : `The pawns suit the bishop on ${bishop} better than the knight on ${knight}: there are pawns on both wings, none stand head to head, and ${count === 0 ? 'none' : num(count)} of ${named(side)}’s ${num(pawns)} ${verb(count, 'stand')} on the bishop’s colour.`;
    return {
      facts: { bishop, knight, favours, onColour: count, pawns, rams },
      text,
      claims: {
        'these minor pieces and no other':
          inOrder(minors, side).length === 2 &&
          scene.men(side, 'bishop').includes(at) &&
          scene.men(other(side), 'knight').includes(squareOf(knight)),
        'the pawns suit it':
          favours === 'knight'
            ? isBad(scene, side, at) && rams > 0
            : rams === 0 &&
              allFiles.some((file) => file <= 2) &&
              allFiles.some((file) => file >= 5) &&
              count * 2 < pawns,
      },
    };
  },
};
