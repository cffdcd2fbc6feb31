/**
 * The table of weights that ranks posts: what each part counts, how much one more of it is worth, and why.
 *
 * A post is weighed by the difference of these counts, the man there against the man where it stands now. The
 * figures come from `tests/bench/fit-judgement.ts`: the choice among the quiet piece moves of a position (a
 * conditional logit) on 7,949 moves of strong players and 347 positions of a published test of positional play, with
 * each sign held to what the handbooks teach. A weight of 0 is a part that is shown but adds nothing once the
 * others are there.
 */
export interface PostPart {
  readonly name: string;
  /** The same as a short noun, for a table or a legend. */
  readonly label: string;
  /** What is counted, for the side as a whole unless it says 'the man'. */
  readonly counts: string;
  readonly weight: number;
  /** The reason, in a coach's words. */
  readonly reason: string;
}

export const PARTS = [
  {
    name: 'lost',
    label: 'pawns’ worth lost by force',
    counts: 'pawns, up to five, that the enemy wins by force, he to move',
    weight: -1.79,
    reason: 'Nothing a post gives is worth a piece: first see what can be taken.',
  },
  {
    name: 'hanging',
    label: 'pawns’ worth hanging',
    counts: 'pawns lost by exchange, added up over all own men',
    weight: -0.23,
    reason: 'A second loose man is the next double attack.',
  },
  {
    name: 'wins',
    label: 'pawns’ worth won by force',
    counts: 'pawns, up to five, won by force whatever the enemy answers',
    weight: 1.55,
    reason: 'If it wins something outright, play it.',
  },
  {
    name: 'threatens',
    label: 'threats to win something',
    counts: '1 where something would be won if the enemy passed (a check apart: he cannot)',
    weight: 1.16,
    reason: 'A threat gains the time for the next improvement.',
  },
  {
    name: 'check',
    label: 'checks',
    counts: '1 where the enemy king stands in check',
    weight: -1.64,
    reason: 'A check that wins nothing only helps the king to a better square.',
  },
  {
    name: 'underCheaper',
    label: 'own pieces attacked by a cheaper man',
    counts: 'own pieces that a cheaper enemy man attacks',
    weight: -0.9,
    reason: 'What a cheaper man attacks must move again.',
  },
  {
    name: 'pawnHit',
    label: 'pawns that can hit it within a move',
    counts: '1 where an enemy pawn hits the man now or after one move',
    weight: -0.32,
    reason: 'Do not go where a pawn sends you back.',
  },
  {
    name: 'outpost',
    label: 'supported posts that no pawn can challenge',
    counts: '1 for a minor man on ranks 4 to 6 that no enemy pawn can ever drive off and an own pawn supports',
    weight: 0.45,
    reason: 'A supported square beyond the pawns is a home.',
  },
  {
    name: 'safeMoves',
    label: 'safe moves of the man',
    counts: 'moves of the man, up to eight, to squares where nothing cheaper hits it',
    weight: 0.05,
    reason: 'A man is worth the squares it can go to.',
  },
  {
    name: 'rookMoves',
    label: 'safe moves of the rooks',
    counts: 'such moves of all own rooks',
    weight: 0.06,
    reason: 'Rooks are the last to find work; make room for them.',
  },
  {
    name: 'openFile',
    label: 'rooks on open files',
    counts: 'own rooks on open files',
    weight: 1.31,
    reason: 'Rooks belong on open files.',
  },
  {
    name: 'halfOpenFile',
    label: 'rooks on half-open files',
    counts: 'own rooks on files without own pawns that an enemy pawn closes',
    weight: 0.54,
    reason: 'A half-open file presses on the pawn at its end.',
  },
  {
    name: 'fileTarget',
    label: 'weak pawns at the end of a file',
    counts: 'weak enemy pawns at the end of those files',
    weight: 0.44,
    reason: 'A file needs something to bite on.',
  },
  {
    name: 'doubled',
    label: 'heavy men doubled on a file',
    counts: 'own rooks and queens behind the first on a file',
    weight: 0.3,
    reason: 'Two on a file are more than twice one.',
  },
  {
    name: 'seventh',
    label: 'heavy men on the seventh rank',
    counts: 'own rooks and queens on the seventh rank',
    weight: 1.37,
    reason: 'On the seventh a rook eats pawns and cages the king.',
  },
  {
    name: 'joined',
    label: 'rooks that guard each other',
    counts: 'own rooks guarded by the other',
    weight: 0.18,
    reason: 'Connected rooks need no minding.',
  },
  {
    name: 'centre',
    label: 'attacks on the four centre squares',
    counts: 'attacks of own pieces on d4, e4, d5, e5',
    weight: 0.15,
    reason: 'Pieces that bear on the centre bear on both wings.',
  },
  {
    name: 'knightCentre',
    label: 'steps of the knight from the rim',
    counts: 'steps of an own knight from the rim: 0 in a corner, 6 in the centre (the man, if a knight)',
    weight: 0.38,
    reason: 'A knight on the rim is dim.',
  },
  {
    name: 'weakSquares',
    label: 'enemy weak squares in hand',
    counts: 'weak squares of the enemy attacked or held by own pieces',
    weight: 0.15,
    reason: 'Aim at the squares his pawns no longer guard.',
  },
  {
    name: 'outnumbers',
    label: 'squares where own men outnumber',
    counts: 'squares no pawn guards where own men outnumber the enemy, less those where he does',
    weight: 0.11,
    reason: 'The side with more men on a square decides who may use it.',
  },
  {
    name: 'enemyHalf',
    label: 'squares attacked in the enemy half',
    counts: 'squares attacked in the enemy half',
    weight: 0,
    reason: 'Space is counted by what one does with it: shown, and left to the other parts.',
  },
  {
    name: 'targets',
    label: 'attacks on weak enemy pawns',
    counts: 'attacks of own pieces on weak enemy pawns',
    weight: 0.02,
    reason: 'Weak pawns tie men down once they are attacked.',
  },
  {
    name: 'guardsWeak',
    label: 'guards of own weak pawns',
    counts: 'guards of own weak pawns that the enemy attacks',
    weight: 0.25,
    reason: 'Look after your own weak points before they fall.',
  },
  {
    name: 'blockade',
    label: 'pawns blockaded',
    counts: '1 where the man stops a passed, isolated or backward pawn',
    weight: 0.36,
    reason: 'Stand in front of the pawn that wants to go.',
  },
  {
    name: 'diagonal',
    label: 'open diagonal squares of the bishops',
    counts: 'squares that own bishops see before a pawn stops them',
    weight: 0.11,
    reason: 'A bishop wants a long diagonal.',
  },
  {
    name: 'eyes',
    label: 'lines on king or queen through one man',
    counts: 'own sliders that look at the enemy king or queen through one man',
    weight: 0.42,
    reason: 'A line to king or queen makes the man between uneasy.',
  },
  {
    name: 'fromEnemyKing',
    label: 'steps to the enemy king',
    counts: "king's steps from the man to the enemy king",
    weight: -0.14,
    reason: 'Bring the men towards the king.',
  },
  {
    name: 'fromOwnKing',
    label: 'steps to the own king',
    counts: "king's steps from the man to its own king",
    weight: -0.11,
    reason: 'Do not strand men far from home.',
  },
  {
    name: 'facesEqual',
    label: 'own pieces attacked by an equal',
    counts: 'own pieces attacked by an equal',
    weight: -0.48,
    reason: 'Trade on purpose, not in passing.',
  },
  {
    name: 'heavy',
    label: 'moves of a heavy man',
    counts: '1 where the man that moves is a rook or queen',
    weight: -0.64,
    reason: 'Bring the minor men first, and the worst placed before the best.',
  },
  {
    name: 'atHome',
    label: 'minor men still at home',
    counts: 'own knights and bishops on the first rank',
    weight: -0.23,
    reason: 'Develop.',
  },
  {
    name: 'castlingKept',
    label: 'castlings kept',
    counts: 'castlings whose right and rook are still there',
    weight: 0.6,
    reason: 'Do not give castling away by a rook move.',
  },
  {
    name: 'betweenToCastle',
    label: 'men in the way of castling',
    counts: 'men in the way of the nearer castling still allowed',
    weight: -0.67,
    reason: 'Clear the way for the king.',
  },
  {
    name: 'inPawnsWay',
    label: 'pieces in the way of a centre pawn',
    counts: 'own pieces right before an own centre pawn on its first squares',
    weight: -0.3,
    reason: 'Do not stand on the pawns’ feet.',
  },
] as const satisfies readonly PostPart[];

export type PartName = (typeof PARTS)[number]['name'];

/** Place of each part in the table and in rows of counts. */
export const PLACE: Readonly<Record<PartName, number>> = Object.fromEntries(
  PARTS.map(({ name }, index) => [name, index]),
) as Record<PartName, number>;

/** What each further move of a route costs, in the table's units: a post two moves away must be that much better. */
export const MOVE_COST = 2;

/** What a preparation costs besides, in moves: it shows the plan before the man has stirred. */
export const PREPARATION_MOVES = 2;
