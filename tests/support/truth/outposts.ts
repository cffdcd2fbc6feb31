/** Statements about outposts, recomputed. */
import type { OutpostsFact } from '@/engine/explain/facts/outposts';
import { attacks } from '../slow/exchange';
import type { Checkers, Told } from './claim';
import { holdAgainst, inTheWay, type OnTheWay, pawnAttackers, soonestPawns } from './pawns';
import { colourOf, fileOf, nameOf, other, rankFor, type Scene, type Side, squareOf } from './scene';
import { comersTo, comingText } from './squares';
import { man, type ManAt, manOrNull, many, named, sentences, start, the } from './words';

interface Way {
  readonly pawn: string;
  readonly moves: number;
  readonly blocker: ManAt | null;
}

/** The soonest pawn; of two equally soon the one further from the centre. */
function soonest(scene: Scene, side: Side, square: number): Way | null {
  const left = fileOf(square) < 4;
  const [first] = soonestPawns(scene, side, square).sort((a, b) =>
    fileOf(a.pawn) === fileOf(b.pawn)
      ? rankFor(side, b.pawn) - rankFor(side, a.pawn)
      : (fileOf(a.pawn) - fileOf(b.pawn)) * (left ? 1 : -1),
  );
  return first ? wayOf(scene, side, first) : null;
}

function wayOf(scene: Scene, side: Side, { pawn, landing, moves }: OnTheWay): Way {
  const blocker = moves === 0 ? null : manOrNull(scene, inTheWay(scene, side, pawn, landing));
  return { pawn: nameOf(pawn), moves, blocker };
}

/** No pin keeps the pawn from going straight on, where nothing else stands in its way. */
function mayGo(scene: Scene, { pawn, moves, blocker }: Way): boolean {
  return (
    moves === 0 || blocker !== null || scene.moves(squareOf(pawn)).some((to) => fileOf(to) === fileOf(squareOf(pawn)))
  );
}

const once = ({ blocker }: Way) => (blocker ? `, once ${the(blocker)} has moved` : '');

function supportText(way: Way): string {
  return way.moves === 0
    ? `the pawn on ${way.pawn} supports it`
    : `the pawn on ${way.pawn} can support it in ${many(way.moves, 'move')}${once(way)}`;
}

/** Whether a minor piece of the side can trade itself for the man there: a bishop of its colour, a knight within two moves. */
function canTrade(scene: Scene, side: Side, square: number): boolean {
  if (scene.men(side, 'bishop').some((at) => colourOf(at) === colourOf(square))) return true;
  return scene.men(side, 'knight').some((from) => {
    const stops = [from, ...[...scene.reach(from)].filter(([, moves]) => moves === 1).map(([to]) => to)];
    return stops.some((at) => attacks(scene.moved(from, at).board, at, square));
  });
}

function post(scene: Scene, side: Side, square: number) {
  const hold = holdAgainst(scene, other(side), square);
  const support = soonest(scene, side, square) ?? { pawn: '', moves: 99, blocker: null };
  const challenge =
    hold === 'permanent'
      ? `no ${other(side)} pawn can ever challenge it`
      : `no ${other(side)} pawn can challenge it as the pawns stand`;
  const claims = {
    'no pawn can challenge it': hold === 'permanent' || hold === 'fixed',
    'a pawn supports it now or in one move': support.moves <= 1,
    'that pawn may move': mayGo(scene, support),
    'on the fourth to seventh rank': rankFor(side, square) >= 4 && rankFor(side, square) <= 7,
  };
  return { hold, support, body: `${challenge}, and ${supportText(support)}`, claims };
}

export const OUTPOSTS: Checkers<OutpostsFact> = {
  'outpost-taken': (scene, { side, man: { square } }): Told => {
    const at = squareOf(square);
    const { hold, support, body, claims } = post(scene, side, at);
    const tradable = canTrade(scene, other(side), at);
    const occupant = man(scene, at);
    return {
      facts: { hold, support, man: occupant, tradable },
      text: sentences(
        `${start(the(occupant))} stands on an outpost: ${body}`,
        tradable ? null : `No ${other(side)} minor piece can trade itself for it within two moves`,
      ),
      claims: { ...claims, 'an own man': scene.sideOn(at) === side, 'no pawn': occupant.kind !== 'pawn' },
    };
  },
  'outpost-free': (scene, { side, square }): Told => {
    const at = squareOf(square);
    const { hold, support, body, claims } = post(scene, side, at);
    const comers = comersTo(scene, side, at).filter(({ kind }) => kind !== 'queen');
    return {
      facts: { hold, support, square, comers, ownKnights: scene.men(side, 'knight').length },
      text: sentences(`${square} is an outpost for ${named(side)}: ${body}`, comingText(scene, side, comers)),
      claims: { ...claims, free: scene.letter(at) === '' },
    };
  },
  'advanced-post': (scene, { side, man: { square } }): Told => {
    const at = squareOf(square);
    const occupant = man(scene, at);
    const challenge = soonest(scene, other(side), at) ?? { pawn: '', moves: 99, blocker: null };
    const guards = pawnAttackers(scene, side, at);
    const guard = soonest(scene, side, at);
    const held = guards.length > 0 && guard ? guard.pawn : null;
    return {
      facts: { man: occupant, challenge, guard: held },
      text: sentences(
        `${start(the(occupant))} is there on loan: the pawn on ${challenge.pawn} can challenge it in ${many(challenge.moves, 'move')}${once(challenge)}`,
        held ? `Till then the pawn on ${held} supports it` : null,
      ),
      claims: {
        'an own man': scene.sideOn(at) === side,
        'that pawn may move': mayGo(scene, challenge),
        'a pawn can come': holdAgainst(scene, other(side), at) === 'open',
        'in the enemy half': rankFor(side, at) >= 5,
      },
    };
  },
};
