/** Statements about pawns, counted again. */
import { at, fileOf, isLight, other, relative, type SideName, type SlowBoard } from './board';
import { type Checker, same } from './checker';

type Pair = readonly [string, string];
interface Man {
  readonly kind: string;
  readonly square: string;
}

const pawnsOf = (board: SlowBoard, side: SideName) => board.men(side, 'pawn');
const beside = (a: string, b: string) => Math.abs(fileOf(a) - fileOf(b)) === 1;
const ahead = (pawn: string, side: SideName, ranks = 1) => at(fileOf(pawn), relative(pawn, side) + ranks, side);
const strikes = (board: SlowBoard, pawn: string) => board.seen(pawn);
const neighbours = (board: SlowBoard, side: SideName, pawn: string) =>
  pawnsOf(board, side).filter((each) => beside(each, pawn));

const FILES = { queenside: [0, 1, 2], centre: [3, 4], kingside: [5, 6, 7] } as const;
const onWing = (board: SlowBoard, side: SideName, wing: string) =>
  pawnsOf(board, side).filter((pawn) =>
    (FILES[wing as keyof typeof FILES] as readonly number[]).includes(fileOf(pawn)),
  );

/** Whether the pawn can neither step nor capture a man. */
function isStuck(board: SlowBoard, pawn: string): boolean {
  const side = board.sideOn(pawn) ?? 'white';
  const stop = ahead(pawn, side);
  return (
    (stop === undefined || board.letter(stop) !== '') &&
    !strikes(board, pawn).some((to) => board.sideOn(to) === other(side))
  );
}

/** What the pawn's road to a square says: free of pawns, the first man on it, and the moves it takes. */
function road(board: SlowBoard, pawn: string, to: string, side: SideName) {
  const ranks = relative(to, side) - relative(pawn, side);
  const squares = Array.from({ length: Math.max(0, ranks) }, (_, index) => ahead(pawn, side, index + 1) ?? '');
  const moves = relative(pawn, side) === 2 && ranks >= 2 ? ranks - 1 : ranks;
  return { moves, man: squares.find((square) => board.letter(square) !== '') ?? null };
}

const passed: Checker = (board, { side, word, count, words, fact, text }) => {
  const pawn = word('pawn');
  const sentries = pawnsOf(board, other(side)).filter(
    (enemy) => Math.abs(fileOf(enemy) - fileOf(pawn)) <= 1 && relative(enemy, side) > relative(pawn, side),
  );
  const rank = relative(pawn, side);
  const guards = neighbours(board, side, pawn).filter((each) => relative(each, side) === rank - 1);
  const stop = ahead(pawn, side);
  const blocker = fact<Man | null>('blocker');
  return [
    sentries.length > 0 && `${sentries} can stop ${pawn}`,
    count('moves') !== (rank === 2 ? 5 : 8 - rank) && 'moves to the last rank',
    !same(words('guards'), guards) && text.includes('protected') && 'guards',
    (blocker?.square ?? null) !== (stop && board.letter(stop) ? stop : null) && 'blocker',
  ];
};

const lever: Checker = (board, { side, word, count, fact, text }) => {
  const [pawn, on, against] = [word('pawn'), word('on'), word('against')];
  const { moves, man } = road(board, pawn, on, side);
  const strikesFrom = [
    at(fileOf(on) - 1, relative(on, side) + 1, side),
    at(fileOf(on) + 1, relative(on, side) + 1, side),
  ];
  const support = pawnsOf(board, side).some((each) => each !== pawn && board.attacks(each, on));
  return [
    !board.is(pawn, side, 'pawn') && 'no such pawn',
    !board.is(against, other(side), 'pawn') && 'nothing to strike',
    !strikesFrom.includes(against) && 'does not strike',
    count('moves') !== moves && `moves: ${moves}`,
    (fact<Man | null>('blocker')?.square ?? null) !== man && `blocker: ${man}`,
    text.includes('support') !== support && `support: ${support}`,
  ];
};

const majority: Checker = (board, { side, word, words, count }) => {
  const own = onWing(board, side, word('wing'));
  const enemy = onWing(board, other(side), word('wing'));
  const doubles = words('doubled');
  return [
    count('own') !== own.length && 'own pawns',
    count('enemy') !== enemy.length && 'enemy pawns',
    own.length <= enemy.length && 'no majority',
    doubles.some((pawn) => !own.some((each) => each !== pawn && fileOf(each) === fileOf(pawn))) && 'not doubled',
    doubles.length > 0 && new Set(own.map(fileOf)).size > new Set(enemy.map(fileOf)).size && 'not crippled',
  ];
};

/** Files apart that have pawns, as groups. */
function islands(board: SlowBoard, side: SideName): number {
  const files = new Set(pawnsOf(board, side).map(fileOf));
  return [...files].filter((file) => !files.has(file - 1)).length;
}

export const PAWN_CHECKS: Readonly<Record<string, Checker>> = {
  // The name and its clause are held by the tests of the structures; here the clause must be in the text.
  'named-structure': (_board, { word, text }) => [!text.toLowerCase().includes(word('lead').toLowerCase()) && 'lead'],
  'centre-fixed': (board, { fact }) => [
    fact<Pair[]>('pairs').some(([a, b]) => ahead(a, board.sideOn(a) ?? 'white') !== b || board.kindOn(b) !== 'pawn') &&
      'no ram',
    (['white', 'black'] as const).some((side) =>
      pawnsOf(board, side).some((pawn) => [3, 4].includes(fileOf(pawn)) && !isStuck(board, pawn)),
    ) && 'a centre pawn can move',
  ],
  'centre-open': (board) => [
    (['white', 'black'] as const).some((side) => onWing(board, side, 'centre').length > 0) && 'a pawn stands there',
  ],
  'centre-tension': (board, { fact }) => [
    fact<Pair[]>('pairs').some(
      ([a, b]) => !board.attacks(a, b) || !board.attacks(b, a) || board.sideOn(a) === board.sideOn(b),
    ) && 'cannot take each other',
  ],
  'isolated-pawn': (board, { side, word, flag }) => {
    const pawn = word('pawn');
    const halfOpen = !pawnsOf(board, other(side)).some((each) => fileOf(each) === fileOf(pawn));
    return [
      !board.is(pawn, side, 'pawn') && 'no pawn',
      neighbours(board, side, pawn).length > 0 && 'has neighbours',
      flag('halfOpen') !== halfOpen && 'half-open',
    ];
  },
  'doubled-pawns': (board, { side, words, flag }) => {
    const pawns = words('pawns');
    const onFile = pawnsOf(board, side).filter((each) => fileOf(each) === fileOf(pawns[0] ?? ''));
    const alone = pawns.every((pawn) => neighbours(board, side, pawn).length === 0);
    return [
      !same(pawns, onFile) && 'not all on one file',
      pawns.length < 2 && 'one only',
      flag('isolated') !== alone && 'isolated',
    ];
  },
  'backward-pawn': (board, { side, word, flag, fact }) => {
    const pawn = word('pawn');
    const stop = ahead(pawn, side) ?? '';
    const enemyPawns = pawnsOf(board, other(side));
    const held = enemyPawns.some((each) => board.attacks(each, stop))
      ? 'pawn'
      : board.command(stop) === other(side)
        ? 'command'
        : null;
    const close = neighbours(board, side, pawn);
    return [
      close.length === 0 && 'isolated',
      close.some((each) => relative(each, side) <= relative(pawn, side)) && 'a neighbour can guard it',
      word('stop') !== stop && 'stop',
      fact<string | null>('stopHeldBy') !== held && `held by ${held}`,
      flag('halfOpen') === enemyPawns.some((each) => fileOf(each) === fileOf(pawn)) && 'half-open',
    ];
  },
  'passed-pawn': passed,
  'protected-passed-pawn': passed,
  'candidate-pawn': (board, { side, word }) => {
    const pawn = word('pawn');
    const rank = relative(pawn, side);
    const helpers = neighbours(board, side, pawn).filter((each) => relative(each, side) <= rank).length;
    const sentries = neighbours(board, other(side), pawn).filter((each) => relative(each, side) > rank).length;
    const before = [...pawnsOf(board, 'white'), ...pawnsOf(board, 'black')].filter(
      (each) => fileOf(each) === fileOf(pawn) && relative(each, side) > rank,
    );
    return [before.length > 0 && 'a pawn stands before it', helpers < sentries && 'outnumbered'];
  },
  'pawn-chain': (board, { side, words }) => {
    const pawns = words('pawns');
    const [base = ''] = pawns;
    return [
      pawns.some((pawn) => !board.is(pawn, side, 'pawn')) && 'no pawn',
      pawns.slice(1).some((pawn, index) => !board.attacks(pawns[index] ?? '', pawn)) && 'not guarded by the one before',
      pawnsOf(board, side).some((each) => board.attacks(each, base)) && 'the base is guarded',
    ];
  },
  rams: (board, { fact }) => [
    fact<Pair[]>('pairs').some(
      ([a, b]) =>
        ahead(a, board.sideOn(a) ?? 'white') !== b || board.kindOn(a) !== 'pawn' || board.kindOn(b) !== 'pawn',
    ) && 'no ram',
  ],
  'lever-ready': lever,
  'lever-coming': lever,
  'minority-attack': (board, { side, word, count }) => [
    count('own') !== onWing(board, side, word('wing')).length && 'own',
    count('enemy') !== onWing(board, other(side), word('wing')).length && 'enemy',
    count('own') >= count('enemy') && 'no minority',
    count('moves') !== road(board, word('pawn'), word('on'), side).moves && 'moves',
    !board.is(word('against'), other(side), 'pawn') && 'nothing to strike',
  ],
  majority,
  'crippled-majority': majority,
  'hanging-pawns': (board, { side, words }) => {
    const [a = '', b = ''] = words('pawns');
    const files = [fileOf(a), fileOf(b)];
    const others = pawnsOf(board, side).filter(
      (each) => each !== a && each !== b && files.some((file) => Math.abs(fileOf(each) - file) <= 1),
    );
    return [
      (!beside(a, b) || relative(a, side) !== relative(b, side)) && 'not abreast',
      others.length > 0 && `beside them ${others}`,
      pawnsOf(board, other(side)).some((each) => files.includes(fileOf(each))) && 'not half-open',
    ];
  },
  islands: (board, { word, count }) => {
    const fewer = word('fewer') as SideName;
    return [
      islands(board, fewer) !== count('fewest') && 'fewest',
      islands(board, other(fewer)) !== count('most') && 'most',
    ];
  },
  'pawns-on-colour': (board, { side, word, count }) => {
    const pawns = pawnsOf(board, side);
    const on = pawns.filter((pawn) => isLight(pawn) === (word('colour') === 'light'));
    return [on.length !== count('count') && 'count', pawns.length !== count('total') && 'total'];
  },
};
