/** Statements about men, kings and totals, counted again. */
import { ALL, at, fileOf, isLight, other, relative, type SideName, type SlowBoard } from './board';
import { type Checker, same } from './checker';

interface Man {
  readonly kind: string;
  readonly square: string;
}

const MOST: Readonly<Record<string, number>> = { knight: 8, bishop: 13, rook: 14, queen: 27 };
const CENTRE = ['d4', 'e4', 'd5', 'e5'];
const squaresOf = (men: readonly Man[]) => men.map(({ square }) => square);
const enemyHalf = (squares: readonly string[], side: SideName) =>
  squares.filter((square) => relative(square, side) >= 5).length;

function toCentre(board: SlowBoard, square: string): number | null {
  const reach = board.reach(square);
  const moves = CENTRE.flatMap((centre) => reach.get(centre) ?? []);
  return moves.length > 0 ? Math.min(...moves) : null;
}

const placed: Checker = (board, { side, count, fact }) => {
  const { kind, square } = fact<Man>('man');
  const share = (each: string) => board.safeMoves(each).length / (MOST[board.kindOn(each) ?? ''] ?? 1);
  return [
    board.safeMoves(square).length !== count('safeMoves') && `safe moves: ${board.safeMoves(square).length}`,
    MOST[kind] !== count('most') && 'most',
    enemyHalf(board.seen(square), side) !== count('enemyHalf') && 'enemy half',
    toCentre(board, square) !== fact<number | null>('toCentre') && `to the centre: ${toCentre(board, square)}`,
    !Number.isFinite(share(square)) && 'share',
  ];
};

/** Pawns on the bishop's colour that enemy pawns fix, files c to f. */
function fixedOn(board: SlowBoard, side: SideName, light: boolean): string[] {
  const enemyPawns = board.men(other(side), 'pawn');
  return board.men(side, 'pawn').filter((pawn) => {
    const stop = at(fileOf(pawn), relative(pawn, side) + 1, side) ?? '';
    const held = board.is(stop, other(side), 'pawn') || enemyPawns.some((enemy) => board.attacks(enemy, stop));
    const takes = enemyPawns.some((enemy) => board.attacks(pawn, enemy));
    return isLight(pawn) === light && fileOf(pawn) >= 2 && fileOf(pawn) <= 5 && held && !takes;
  });
}

const onColour = (board: SlowBoard, side: SideName, bishop: string) =>
  board.men(side, 'pawn').filter((pawn) => isLight(pawn) === isLight(bishop)).length;

const bishopCounts: Checker = (board, { side, word, count }) => [
  onColour(board, side, word('square')) !== count('onColour') && 'on its colour',
  board.men(side, 'pawn').length !== count('pawns') && 'pawns',
  count('onColour') * 2 < count('pawns') && 'less than half',
  fixedOn(board, side, isLight(word('square'))).length === 0 && 'none is fixed',
];

/** What is lost on a friendly man's square when this man leaves, beyond what is lost there already. */
function dutyLoss(board: SlowBoard, ward: string, without: string): number {
  const side = board.sideOn(ward) ?? 'white';
  return board.loss(side, board.kindOn(ward) ?? '', ward, without) - board.enPrise(ward);
}

const kingOf = (board: SlowBoard, side: SideName) => board.men(side, 'king')[0] ?? '';
const zone = (king: string) =>
  ALL.filter(
    (square) =>
      Math.abs(fileOf(square) - fileOf(king)) <= 1 && Math.abs(Number(square.charAt(1)) - Number(king.charAt(1))) <= 1,
  );
const heavy = (board: SlowBoard, side: SideName) => [...board.men(side, 'rook'), ...board.men(side, 'queen')];
const luft = (board: SlowBoard, king: string) => board.flights(king).filter((to) => to.charAt(1) !== king.charAt(1));
const bearing = (board: SlowBoard, side: SideName, squares: readonly string[]) =>
  board
    .men(side)
    .filter((from) => board.kindOn(from) !== 'king' && squares.some((square) => board.attacks(from, square)));

function room(board: SlowBoard, side: SideName): number {
  return [2, 3, 4, 5].reduce((sum, file) => {
    const ranks = board
      .men(side, 'pawn')
      .filter((pawn) => fileOf(pawn) === file)
      .map((pawn) => relative(pawn, side));
    return sum + (ranks.length > 0 ? Math.max(...ranks) - 1 : 0);
  }, 0);
}

const balance =
  (total: (board: SlowBoard, side: SideName) => number): Checker =>
  (board, { side, count }) => [
    total(board, side) !== count('more') && `more: ${total(board, side)}`,
    total(board, other(side)) !== count('fewer') && `fewer: ${total(board, other(side))}`,
  ];

export const MEN_CHECKS: Readonly<Record<string, Checker>> = {
  'best-placed': placed,
  'worst-placed': placed,
  'bad-bishop': (board, claims) => [
    ...bishopCounts(board, claims),
    !same(claims.words('fixed'), fixedOn(board, claims.side, isLight(claims.word('square')))) && 'fixed pawns',
    claims.flag('tradeable') !==
      board.men(other(claims.side), 'bishop').some((each) => isLight(each) === isLight(claims.word('square'))) &&
      'tradeable',
  ],
  'bad-but-active': (board, claims) => [
    ...bishopCounts(board, claims),
    board.safeMoves(claims.word('square')).length !== claims.count('safeMoves') && 'safe moves',
  ],
  'knight-on-rim': (board, { word, count }) => [
    ![0, 7].includes(fileOf(word('square'))) && 'not on the rim',
    board.seen(word('square')).length !== count('sees') && 'sees',
  ],
  'out-of-play': (board, { count, fact }) => {
    const { square } = fact<Man>('man');
    const moves = toCentre(board, square);
    return [
      board.safeMoves(square).length !== count('safeMoves') && 'safe moves',
      moves !== fact<number | null>('toCentre') && 'to the centre',
      moves !== null && moves < 3 && 'near the centre',
    ];
  },
  trapped: (board, { side, flag, fact }) => {
    const { square } = fact<Man>('man');
    return [
      board.safeMoves(square).length > 0 && `safe: ${board.safeMoves(square)}`,
      flag('attacked') !== board.attackers(other(side), square).length > 0 && 'attacked',
    ];
  },
  pinned: (board, { side, word, fact }) => {
    const [man, pinner, king] = [fact<Man>('man').square, fact<Man>('pinner').square, word('king')];
    const [files, ranks] = [
      Math.sign(fileOf(man) - fileOf(king)),
      Math.sign(Number(man.charAt(1)) - Number(king.charAt(1))),
    ];
    return [
      kingOf(board, side) !== king && 'king',
      board.first(king, files, ranks) !== man && 'not next to the king on the line',
      board.first(man, files, ranks) !== pinner && 'not the next on the line',
      (board.sideOn(pinner) !== other(side) || !board.attacks(pinner, man)) && 'does not pin',
    ];
  },
  overloaded: (board, { side, fact }) => {
    const man = fact<Man>('man').square;
    const wards = squaresOf(fact<Man[]>('guards'));
    return [
      wards.length !== 2 && 'not two',
      wards.some((ward) => dutyLoss(board, ward, man) <= 0) && 'does not need it',
      wards.some((ward) => board.attackers(other(side), ward).length === 0) && 'not attacked',
    ];
  },
  tied: (board, { count, fact, word }) => {
    const [man, ward] = [fact<Man>('man').square, fact<Man>('ward').square];
    return [
      dutyLoss(board, ward, man) !== count('loses') && `loses ${dutyLoss(board, ward, man)}`,
      word('by') === 'screen' && board.attacks(man, ward) && board.enPrise(ward) > 0 && 'guards it',
    ];
  },
  loose: (board, { side, fact }) => [board.attackers(side, fact<Man>('man').square).length > 0 && 'guarded'],
  'en-prise': (board, { side, count, fact }) => {
    const { square } = fact<Man>('man');
    return [
      board.enPrise(square) !== count('gain') && `gain ${board.enPrise(square)}`,
      board.attackers(side, square).length !== count('guards') && 'guards',
    ];
  },
  'bishop-pair': (board, { side }) => {
    const pair = (of: SideName) => new Set(board.men(of, 'bishop').map(isLight)).size === 2;
    return [!pair(side) && 'no pair', pair(other(side)) && 'the enemy has it too'];
  },
  'bishop-against-knight': (board, { side, word, count }) => {
    const minors = (of: SideName) => [...board.men(of, 'bishop'), ...board.men(of, 'knight')];
    return [
      !same(minors(side), [word('bishop')]) && 'bishop',
      !same(minors(other(side)), [word('knight')]) && 'knight',
      onColour(board, side, word('bishop')) !== count('onColour') && 'on its colour',
      board.men(side, 'pawn').length !== count('pawns') && 'pawns',
    ];
  },
  'blocked-in': (board, { side, fact }) => {
    const { square } = fact<Man>('man');
    const seen = board.seen(square);
    return [
      !same(seen, squaresOf(fact<Man[]>('by'))) && 'blockers',
      seen.some((to) => board.sideOn(to) !== side) && 'has a move',
    ];
  },
  'in-check': (board, { side, fact }) => [
    !same(board.attackers(other(side), kingOf(board, side)), squaresOf(fact<Man[]>('checkers'))) && 'checkers',
  ],
  'shelter-whole': (board, { side, words }) => [
    words('pawns').some((pawn) => !board.is(pawn, side, 'pawn') || relative(pawn, side) !== 2) && 'moved',
    words('pawns').length !==
      [-1, 0, 1].filter((files) => at(fileOf(kingOf(board, side)) + files, 1, side) !== undefined).length && 'not all',
  ],
  'shelter-broken': (board, { side, word, words }) => {
    const before = (file: string) =>
      board
        .men(side, 'pawn')
        .filter((pawn) => pawn.charAt(0) === file && relative(pawn, side) >= relative(word('king'), side));
    return [
      words('bare').some((file) => before(file).length > 0) && 'a pawn stands before it',
      words('advanced').some((pawn) => relative(pawn, side) < 4 || !board.is(pawn, side, 'pawn')) && 'not gone ahead',
    ];
  },
  'no-luft': (board, { side, word, flag, fact }) => {
    const king = word('king');
    const gives = fact<{ from: string; to: string }[]>('gives');
    return [
      luft(board, king).length > 0 && `luft: ${luft(board, king)}`,
      relative(king, side) !== 1 && 'not on its back rank',
      flag('noFlight') !== (board.flights(king).length === 0) && 'flights',
      gives.some(
        ({ from, to }) =>
          !board.moves(from).includes(to) ||
          board
            .played(from, to)
            .flights(king)
            .every((each) => each.charAt(1) === king.charAt(1)),
      ) && 'gives none',
    ];
  },
  'no-flight': (board, { word }) => [board.flights(word('king')).length > 0 && 'has a flight'],
  'open-line-beside-king': (board, { side, words, word, fact }) => {
    const enemy = other(side);
    const files = words('files');
    return [
      files.some((file) => board.men(enemy, 'pawn').some((pawn) => pawn.charAt(0) === file)) &&
        'an enemy pawn closes it',
      files.some((file) => Math.abs(fileOf(`${file}1`) - fileOf(word('king'))) > 1) && 'not beside the king',
      !same(
        squaresOf(fact<Man[]>('heavy')),
        heavy(board, enemy).filter((square) => files.includes(square.charAt(0))),
      ) && 'heavy men',
      heavy(board, enemy).length === 0 && 'no heavy man',
    ];
  },
  'king-zone': (board, { side, word, count, fact }) => [
    !same(squaresOf(fact<Man[]>('attackers')), bearing(board, other(side), zone(word('king')))) && 'attackers',
    bearing(board, side, zone(word('king'))).length !== count('guards') && 'guards',
  ],
  'weak-back-rank': (board, { side, word }) => [
    luft(board, word('king')).length > 0 && 'luft',
    heavy(board, side).some((square) => relative(square, side) === 1) && 'guarded',
    heavy(board, other(side)).length === 0 && 'no heavy enemy',
  ],
  reach: balance((board, side) =>
    enemyHalf(
      ALL.filter((square) => board.attackers(side, square).length > 0),
      side,
    ),
  ),
  'safe-moves': balance((board, side) => board.men(side).reduce((sum, from) => sum + board.safeMoves(from).length, 0)),
  space: balance(room),
  command: balance((board, side) => ALL.filter((square) => board.command(square) === side).length),
};
