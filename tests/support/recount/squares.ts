/** Statements about squares, outposts and files, counted again. */
import { at, fileOf, isLight, other, relative, type SideName, type SlowBoard } from './board';
import { type Checker, same } from './checker';

interface Man {
  readonly kind: string;
  readonly square: string;
}
interface Comer extends Man {
  readonly moves: number;
}
interface PawnMoves {
  readonly pawn: string;
  readonly moves: number;
  readonly blocker: Man | null;
}

const pawnsOf = (board: SlowBoard, side: SideName) => board.men(side, 'pawn');

/** Whether an enemy pawn stands on the square, or enemy pawns attack it and no own pawn does. */
function stops(board: SlowBoard, square: string, side: SideName): boolean {
  const struck = (by: SideName) => pawnsOf(board, by).some((pawn) => board.attacks(pawn, square));
  return board.is(square, other(side), 'pawn') || (struck(other(side)) && !struck(side));
}

/** Own pawns that could come to attack a square by going straight on, each with its road. */
function comingPawns(board: SlowBoard, square: string, side: SideName) {
  const landing = relative(square, side) - 1;
  return pawnsOf(board, side)
    .filter((pawn) => Math.abs(fileOf(pawn) - fileOf(square)) === 1 && relative(pawn, side) <= landing)
    .map((pawn) => {
      const start = relative(pawn, side);
      const road = Array.from(
        { length: landing - start },
        (_, index) => at(fileOf(pawn), start + 1 + index, side) ?? '',
      );
      return {
        pawn,
        moves: start === 2 && landing >= 4 ? landing - start - 1 : landing - start,
        stoppedOn: road.find((each) => stops(board, each, side)) ?? null,
        man: road.find((each) => board.letter(each) !== '') ?? null,
      };
    });
}

/** Comers as the facts list them: pieces of the side that reach the square safely within three moves. */
function comersTo(board: SlowBoard, side: SideName, square: string): string[] {
  return ['knight', 'bishop', 'rook', 'queen']
    .flatMap((kind) => board.men(side, kind))
    .flatMap((from) => {
      const moves = board.reach(from).get(square);
      return moves === undefined ? [] : [`${from}:${moves}`];
    });
}

const listed = (comers: readonly Comer[]) => comers.map(({ square, moves }) => `${square}:${moves}`);

/** The few that a sentence names get there, and soonest: the rest of the list is not said. */
function comersHold(board: SlowBoard, side: SideName, square: string, comers: readonly Comer[], all: boolean): boolean {
  const slow = comersTo(board, side, square);
  if (all) return same(listed(comers), slow);
  return listed(comers).every((each) => slow.includes(each));
}

const weak: Checker = (board, { side, word, flag, fact, text }) => {
  const square = word('square');
  const enemy = other(side);
  const coming = comingPawns(board, square, side);
  const occupant = fact<Man | null>('occupant');
  const stopped = fact<{ pawn: string; on: string; by: string } | null>('stopped');
  const forGood = text.includes('for good');
  return [
    pawnsOf(board, side).some((pawn) => board.attacks(pawn, square)) && 'a pawn guards it',
    forGood && coming.length > 0 && `${coming[0]?.pawn} can come to guard it`,
    !forGood && coming.length === 0 && 'no pawn could guard it',
    coming.some(({ stoppedOn }) => stoppedOn === null) && 'a pawn is not stopped',
    stopped !== null &&
      !coming.some(({ pawn, stoppedOn }) => pawn === stopped.pawn && stoppedOn === stopped.on) &&
      'stopped elsewhere',
    stopped !== null && (stopped.by === 'ram') !== board.is(stopped.on, enemy, 'pawn') && 'stopped otherwise',
    flag('commandedByEnemy') !== (board.command(square) === enemy) && 'command',
    occupant !== null && board.sideOn(square) !== enemy && 'nobody stands there',
    !comersHold(board, enemy, square, fact<Comer[]>('comers'), true) && `comers: ${comersTo(board, enemy, square)}`,
  ];
};

const hold = (board: SlowBoard, square: string, side: SideName, kind: string): string | false => {
  const enemy = other(side);
  const coming = comingPawns(board, square, enemy);
  if (pawnsOf(board, enemy).some((pawn) => board.attacks(pawn, square))) return 'a pawn attacks it';
  if (kind === 'permanent') return coming.length > 0 && `${coming[0]?.pawn} can challenge it`;
  return (coming.length === 0 || coming.some(({ stoppedOn }) => stoppedOn === null)) && 'not fixed';
};

function pawnComes(
  board: SlowBoard,
  side: SideName,
  square: string,
  { pawn, moves, blocker }: PawnMoves,
): string | false {
  const coming = comingPawns(board, square, side);
  const found = coming.find((each) => each.pawn === pawn);
  if (!found) return `${pawn} does not come`;
  if (found.moves !== moves) return `${pawn} takes ${found.moves} moves`;
  if (found.man !== (blocker?.square ?? null)) return `in its way: ${found.man}`;
  return coming.some((each) => each.stoppedOn === null && each.moves < moves) && 'another comes sooner';
}

/** Whether a minor piece of the side can trade itself on the square: a bishop of its colour, a knight at hand or one safe move away. */
function canTrade(board: SlowBoard, side: SideName, square: string): boolean {
  if (board.men(side, 'bishop').some((bishop) => isLight(bishop) === isLight(square))) return true;
  return board.men(side, 'knight').some((knight) => {
    const near = [knight, ...[...board.reach(knight, 1)].filter(([, moves]) => moves === 1).map(([to]) => to)];
    return near.some(
      (from) => Math.abs((fileOf(from) - fileOf(square)) * (Number(from.charAt(1)) - Number(square.charAt(1)))) === 2,
    );
  });
}

const fileSquares = (file: string, side: SideName) =>
  [1, 2, 3, 4, 5, 6, 7, 8].map((rank) => at(fileOf(`${file}1`), rank, side) ?? '');
const heavyOn = (board: SlowBoard, side: SideName, file: string) =>
  fileSquares(file, side).filter((square) => board.is(square, side, 'rook') || board.is(square, side, 'queen'));

function entries(board: SlowBoard, side: SideName, file: string): string[] {
  const found: string[] = [];
  for (const square of fileSquares(file, side)) {
    const kind = board.kindOn(square);
    const isEnemy = board.sideOn(square) === other(side);
    const safe = kind !== 'pawn' && !(isEnemy && kind === 'king') && board.loss(side, 'rook', square, null) === 0;
    if (safe && relative(square, side) >= 7) found.push(square);
    if (kind === 'pawn' || (isEnemy && !safe)) break;
  }
  return found;
}

const isOpen = (board: SlowBoard, file: string) =>
  !fileSquares(file, 'white').some((square) => board.kindOn(square) === 'pawn');
const isHalfOpenFor = (board: SlowBoard, side: SideName, file: string) =>
  !isOpen(board, file) && !fileSquares(file, side).some((square) => board.is(square, side, 'pawn'));

const squaresOf = (men: readonly Man[]) => men.map(({ square }) => square);

export const SQUARE_CHECKS: Readonly<Record<string, Checker>> = {
  'weak-for-good': weak,
  'weak-while-fixed': weak,
  'weak-complex': (board, { side, word, words, flag }) => {
    const light = word('colour') === 'light';
    const bishop = (of: SideName) => board.men(of, 'bishop').some((each) => isLight(each) === light);
    return [
      words('weak').some((square) => isLight(square) !== light || comingPawns(board, square, side).length > 0) &&
        'a pawn can guard one',
      words('weak').some((square) => pawnsOf(board, side).some((pawn) => board.attacks(pawn, square))) &&
        'a pawn guards one',
      bishop(side) && 'has the bishop',
      flag('enemyBishop') !== bishop(other(side)) && 'enemy bishop',
    ];
  },
  'centre-command': (board, { side, words }) => [
    words('commanded').some((square) => board.command(square) !== side) && 'command',
  ],
  'disputed-square': (board, { word, count }) => {
    const first = word('first') as SideName;
    const square = word('square');
    return [
      board.command(square) !== 'disputed' && 'command',
      board.attackers(first, square).length !== count('firstCount') && 'first',
      board.attackers(other(first), square).length !== count('secondCount') && 'second',
    ];
  },
  'square-closed': (board, { side, word, count }) => [
    board.command(word('square')) !== side && 'command',
    board.attackers(side, word('square')).length !== count('own') && 'own',
    board.attackers(other(side), word('square')).length !== count('enemy') && 'enemy',
  ],
  'outpost-taken': (board, { side, word, flag, fact }) => {
    const { square } = fact<Man>('man');
    return [
      board.sideOn(square) !== side && 'nobody there',
      hold(board, square, side, word('hold')),
      pawnComes(board, side, square, fact<PawnMoves>('support')),
      flag('tradable') !== canTrade(board, other(side), square) && 'tradable',
    ];
  },
  'outpost-free': (board, { side, word, fact }) => [
    hold(board, word('square'), side, word('hold')),
    pawnComes(board, side, word('square'), fact<PawnMoves>('support')),
    !comersHold(board, side, word('square'), fact<Comer[]>('comers'), false) &&
      `comers: ${comersTo(board, side, word('square'))}`,
  ],
  'advanced-post': (board, { side, fact }) => {
    const { square } = fact<Man>('man');
    const guard = fact<string | null>('guard');
    return [
      pawnComes(board, other(side), square, fact<PawnMoves>('challenge')),
      guard !== null && !board.attacks(guard, square) && 'guard',
    ];
  },
  'file-owned': (board, { side, word, words, fact }) => [
    !isOpen(board, word('file')) && 'not open',
    !same(squaresOf(fact<Man[]>('heavy')), heavyOn(board, side, word('file'))) && 'heavy men',
    heavyOn(board, other(side), word('file')).length > 0 && 'the enemy is there too',
    !same(words('entries'), entries(board, side, word('file'))) && `entries: ${entries(board, side, word('file'))}`,
  ],
  'file-contested': (board, { word }) => [
    (heavyOn(board, 'white', word('file')).length === 0 || heavyOn(board, 'black', word('file')).length === 0) &&
      'one side only',
  ],
  'file-open-no-entry': (board, { word }) => [
    !isOpen(board, word('file')) && 'not open',
    [...entries(board, 'white', word('file')), ...entries(board, 'black', word('file'))].length > 0 && 'has an entry',
  ],
  'half-open-target': (board, { side, word, fact }) => {
    const target = word('target');
    const enemy = other(side);
    const first = fileSquares(word('file'), side).find((square) => board.is(square, enemy, 'pawn'));
    const close = pawnsOf(board, enemy).filter((each) => Math.abs(fileOf(each) - fileOf(target)) === 1);
    const guarded = close.some((each) => board.attacks(each, target));
    const why = word('why');
    return [
      !isHalfOpenFor(board, side, word('file')) && 'not half-open',
      first !== target && 'not the first pawn',
      why === 'isolated' && close.length > 0 && 'not isolated',
      why === 'unguarded' && guarded && 'guarded',
      why === 'backward' &&
        (close.length === 0 || close.some((each) => relative(each, enemy) <= relative(target, enemy))) &&
        'not backward',
      !same(squaresOf(fact<Man[]>('heavy')), heavyOn(board, side, word('file'))) && 'heavy men',
    ];
  },
  'half-open-nothing': (board, { side, word, words }) => [
    !isHalfOpenFor(board, side, word('file')) && 'not half-open',
    !same(
      words('guards'),
      pawnsOf(board, other(side)).filter((pawn) => board.attacks(pawn, word('pawn'))),
    ) && 'guards',
    entries(board, side, word('file')).length > 0 && 'has an entry',
  ],
  'rook-to-file': (board, { side, word, count }) => [
    board.reach(word('rook')).get(word('to')) !== count('moves') && 'moves',
    !(word('status') === 'open' ? isOpen(board, word('file')) : isHalfOpenFor(board, side, word('file'))) && 'status',
  ],
  'heavy-doubled': (board, { side, word, fact }) => {
    const men = squaresOf(fact<Man[]>('heavy'));
    const ranks = men.map((square) => relative(square, side)).sort((a, b) => a - b);
    const between = fileSquares(word('file'), side).slice((ranks[0] ?? 1) - 1, ranks[ranks.length - 1]);
    return [
      !same(men, heavyOn(board, side, word('file'))) && 'heavy men',
      between.some((square) => board.letter(square) !== '' && !men.includes(square)) && 'somebody between them',
    ];
  },
  'on-seventh': (board, { side, fact, words }) => [
    fact<Man[]>('heavy').some(({ square }) => relative(square, side) !== 7 || board.sideOn(square) !== side) &&
      'not there',
    !same(
      words('pawns'),
      pawnsOf(board, other(side)).filter((pawn) => relative(pawn, side) === 7),
    ) && 'pawns',
  ],
  'to-seventh': (board, { side, word, count, fact }) => [
    relative(word('to'), side) !== 7 && 'not the seventh',
    board.reach(fact<Man>('man').square).get(word('to')) !== count('moves') && 'moves',
  ],
  'long-diagonal-open': (board, { side, word, count, fact }) => {
    const from = fact<Man>('man').square;
    const [files, ranks] = [
      Math.sign(fileOf(word('last')) - fileOf(from)),
      Math.sign(Number(word('last').charAt(1)) - Number(from.charAt(1))),
    ];
    const seen = board
      .seen(from)
      .filter(
        (to) =>
          Math.sign(fileOf(to) - fileOf(from)) === files &&
          Math.sign(Number(to.charAt(1)) - Number(from.charAt(1))) === ranks,
      );
    const onLong = fileOf(from) + 1 === Number(from.charAt(1)) || fileOf(from) + Number(from.charAt(1)) === 8;
    return [
      seen.length !== count('seen') && 'seen',
      !seen.includes(word('last')) && 'last',
      (!onLong || ranks > 0 !== (side === 'white')) && 'not the long diagonal',
    ];
  },
  'diagonal-shut': (board, { side, word, fact }) => {
    const from = fact<Man>('man').square;
    const stopper = word('stopper');
    const owner = board.sideOn(stopper) ?? 'white';
    const stop = at(fileOf(stopper), relative(stopper, owner) + 1, owner) ?? '';
    return [
      !board.attacks(from, stopper) && 'does not end there',
      relative(stopper, side) <= relative(from, side) && 'not forward',
      (board.kindOn(stopper) !== 'pawn' || !board.is(stop, other(owner), 'pawn')) && 'no ram',
    ];
  },
};
