/** The demo workspace: its positions come from the lines that are written beside them, and its notes are true. */
import { Chess, type Square } from 'chess.js';
import { describe, expect, it } from 'vitest';
import { DEMO_PEOPLE, DEMO_STUDIES } from '@/db/seed';
import { readFen } from '@/engine';
import type { DemoPosition } from '@/db/demo/types';
import { positionRequestSchema, studyRequestSchema } from '@/openapi/schemas/studies';

const POSITIONS = DEMO_STUDIES.flatMap(({ positions }) => positions);

/**
 * What each note rests on, in the words of the reading, which other tests hold against other sources. Every figure of a
 * note is here too.
 */
const GROUNDS: Readonly<Record<string, readonly string[]>> = {
  'What the pawn gives': [
    'The pawn on d4 is isolated',
    'The queen on d1 is tied to the pawn on d4',
    'The knight on f3 is tied to the pawn on d4',
    'd5 is an outpost for Black: no white pawn can ever challenge it, and the pawn on e6 supports it',
    'The e-file is half-open for White',
    'c5 and e5 are White’s support points',
  ],
  'The square in front': [
    'The knight on d5 stands on an outpost: no white pawn can ever challenge it, and the pawn on e6 supports it',
    'The knight on e5 is there on loan: the pawn on f7 can challenge it in one move, once the knight on f6 has moved',
    'c6 is weak for good: no black pawn can guard it any more',
    'a6 is weak for good: no black pawn can guard it any more',
    'White’s men have more freedom: 38 safe moves in all, against 19',
  ],
  'The pawn goes through': ['The centre is in tension: e6 and d5 attack each other'],
  'Two isolated pawns, and nobody weak': [
    'The pawn on d4 is isolated',
    'The pawn on d5 is isolated',
    'White commands c5',
    'White commands e5',
    'Black commands c4',
    'Black commands e4',
    'White owns the e-file: the rook on e1 stands there alone, but with no safe way in yet',
    'The bishop on b3 looks at a wall: its way forward ends at the black pawn on d5',
  ],
  'The same pawn on the other side': [
    'd4 is an outpost for White: no black pawn can ever challenge it',
    'Two white men get there in one move: the knight on f3 and the bishop on e3',
    'The knight on a4 is out of play: two safe moves, and three moves from the centre',
    'White commands c5: a black minor piece there would be lost, a white one would not. Two white men',
    'Black commands c4',
    'Black commands e4',
    'The e-file is half-open for Black and bites on e2: no pawn guards the pawn there',
  ],
  'One pawn attacks two': [
    'White has a minority attack on the queenside: one pawn against two, and the pawn from b4 strikes at c6 from b5, one move away',
    'Black owns the a-file: the rook on a8 stands there alone',
    'c4 is an outpost for Black: no white pawn can ever challenge it, and the pawn on d5 supports it. The black knight on f6 gets there in three moves',
  ],
  'What it was for': [
    'The pawn on c6 is backward: no pawn can come to guard it, and a white pawn holds its stop square c5. The c-file is half-open for White',
    'c5 is an outpost for White',
    'The white knight on c3 gets there in two moves',
    'White owns the b-file: the rook on b1 can enter on b7',
    'Four of Black’s five pawns stand on light squares',
    'e5 is disputed: a minor piece of either side would be lost there',
  ],
  'The centre instead': [
    'The lever e3-e4 is ready: it strikes at d5, with a pawn to support it',
    'e4 is disputed: a minor piece of either side would be lost there, with three white attackers against two',
    'The e-file is half-open for Black and bites on e3: no pawn guards the pawn there. The rook on e8 stands on the file',
    'The bishop on e6 is Black’s problem piece: five of seven pawns stand on its colour',
    'The lever c6-c5',
  ],
  'Kings on the same wing, pawns on the other': [
    'The lever f7-f5 is ready: it strikes at g4, with a pawn to support it',
    'The lever h7-h5 is ready: it strikes at g4, with a pawn to support it',
    'White commands e5: a black minor piece there would be lost, a white one would not. Two white men bear on it, no black one',
    'The bishop on e6 is Black’s problem piece: six of seven pawns stand on its colour',
  ],
  'First of all: offer the bishop': [
    'Six of White’s eight pawns stand on dark squares',
    'The centre is in tension: d4 and c5 attack each other',
    'The lever b2-b4 is ready: it strikes at c5',
    'The lever f7-f6 is ready: it strikes at e5',
  ],
  Locked: [
    'The centre is fixed: d4 against d5 and e5 against e6',
    'The bishop on d7 is Black’s problem piece: five of seven pawns stand on its colour',
    'The bishop on d7 looks at a wall: its way forward ends at its own pawn on e6',
    'The lever f7-f6 is ready: it strikes at e5',
    'd6 is an outpost for White: no black pawn can ever challenge it, and the pawn on e5 supports it. The white knight on c2 gets there in three moves',
  ],
  'After the lever': [
    'The f-file is half-open for Black and bites on f2: no pawn guards the pawn there. The rook on f8 stands on the file',
    'e5 is an outpost for White: no black pawn can ever challenge it, and the pawn on d4 supports it',
    'The pawn on e6 is backward',
    'The rook on f1 can take the half-open e-file: it is one move from e1',
    'The lever e6-e5, one move away, strikes at the pawn on d4 that helps to shut it in',
  ],
  'The centre is let go': [
    'The white knight on f3 gets there in one move',
    'the pawn on c2 can support it in one move, once the knight on c3 has moved',
    'e4 is an outpost for Black: no white pawn can ever challenge it, and the pawn on d5 supports it. The black knight on c5 gets there in one move',
    'c5 is weak for good',
    'c6 is weak for good',
    'd6 is weak for good',
    'six of seven pawns stand on its colour',
  ],
  'No hole yet': [
    'e6 guards d5 and d6 guards e5',
    'd5 is disputed: a minor piece of either side would be lost there, with two white attackers against two',
    'The lever e4-e5 is ready',
    'The lever f4-f5 is ready',
    'The lever d6-d5 is ready',
    'The lever e6-e5 is ready',
  ],
  'The hole': [
    'd5 is an outpost for White: no black pawn can ever challenge it, and the pawn on e4 supports it. The white knight on c3 gets there in one move',
    'The pawn on d6 is backward',
    'Black commands f4',
    'd4 is disputed: a minor piece of either side would be lost there',
    'The c-file is half-open for Black and bites on c2: no pawn guards the pawn there',
  ],
  'The guard is exchanged': [
    'The knight on d5 stands on an outpost: no black pawn can ever challenge it, and the pawn on e4 supports it',
    'f5 is an outpost for White: no black pawn can ever challenge it, and the pawn on e4 supports it',
    'Black has the bishop pair: White has not',
    'The g-file is half-open for Black',
    'The lever f6-f5',
  ],
  'Who can challenge the knight?': [
    'The knight on d5 stands on an outpost: no black pawn can ever challenge it',
    'Black has the bishop pair: White has not',
    'Black has a minority attack on the queenside: two pawns against three, and the pawn from b5 strikes at c3 from b4, one move away',
  ],
  'The hole is filled': [
    'White has the majority on the queenside: three pawns against two',
    'Black has the majority in the centre: two pawns against one',
    'The pawn on e5 can become passed: no pawn stands before it on the e-file',
    'White has the lever c5 against d6 in two moves',
  ],
};

/** Counts that a note gives and no sentence of the reading has. */
const SAFE_MOVES: Readonly<Record<string, readonly [number, number]>> = {
  'What the pawn gives': [33, 27],
  'The square in front': [38, 19],
  'No hole yet': [32, 23],
};

/** Men that a note counts on a square, White's and Black's, by the rules library. */
const ATTACKERS: Readonly<Record<string, readonly [Square, string, string]>> = {
  'What the pawn gives': ['d4', 'd1 f3', 'c6 d8'],
  'The pawn goes through': ['d5', 'a2 c3 d1', 'd8 e6 f6'],
  'The centre instead': ['e4', 'c3 d3 f3', 'd5 f6'],
  'Kings on the same wing, pawns on the other': ['e5', 'd4 f3', ''],
  'No hole yet': ['d5', 'c3 e4', 'e6 f6'],
  'The hole': ['d5', 'c3 d1 e4', 'e6 f6'],
};

function readingOf({ fen }: DemoPosition) {
  const result = readFen(fen, 'strict');
  if (!result.ok) throw new Error(`${fen}: ${result.fault[0].code}`);
  return result.value;
}

describe('the demo studies', () => {
  it('are four at least, of four positions at least, each with a title of its own and a note', () => {
    expect(DEMO_STUDIES.length).toBeGreaterThanOrEqual(3);
    for (const { positions } of DEMO_STUDIES) expect(positions.length).toBeGreaterThanOrEqual(4);
    expect(new Set(POSITIONS.map(({ title }) => title)).size).toBe(POSITIONS.length);
    expect(Object.keys(GROUNDS).sort()).toEqual(POSITIONS.map(({ title }) => title).sort());
    for (const { note } of POSITIONS) expect(note.split(/\s+/).length).toBeGreaterThan(60);
    console.log(`demo: ${DEMO_STUDIES.length} studies, ${POSITIONS.length} positions`);
  });

  it('are what the API takes', () => {
    for (const { title, summary } of DEMO_STUDIES)
      expect(studyRequestSchema.safeParse({ title, summary }).success).toBe(true);
    for (const { line: _, ...position } of POSITIONS) {
      expect(positionRequestSchema.safeParse(position).error?.issues ?? []).toEqual([]);
    }
  });

  it.each(POSITIONS)('$title: the line leads to the position', ({ line, fen }) => {
    const game = new Chess();
    for (const san of line.split(' ')) game.move(san);
    expect(game.fen()).toBe(fen);
  });

  it.each(POSITIONS)('$title: the reading says what the note says', (position) => {
    const { statements } = readingOf(position);
    const text = statements.map((statement) => statement.text).join('\n');
    for (const ground of GROUNDS[position.title] ?? []) expect(text).toContain(ground);
  });

  it.each(Object.entries(SAFE_MOVES))('%s: the safe moves are counted right', (title, [white, black]) => {
    const position = POSITIONS.find((one) => one.title === title);
    if (!position) throw new Error(`no position ${title}`);
    const { totals } = readingOf(position);
    expect([totals.white.safeMoves, totals.black.safeMoves]).toEqual([white, black]);
    expect(position.note).toMatch(new RegExp(`${white}.*${black}`, 's'));
  });

  it.each(Object.entries(ATTACKERS))(
    '%s: the men that bear on the square are counted right',
    (title, [square, white, black]) => {
      const game = new Chess(POSITIONS.find((one) => one.title === title)?.fen);
      expect(game.attackers(square, 'w').sort().join(' ')).toBe(white);
      expect(game.attackers(square, 'b').sort().join(' ')).toBe(black);
    },
  );

  it('show people of a domain kept for examples, one in each role', () => {
    for (const { email } of DEMO_PEOPLE) expect(email).toMatch(/^[a-z]+@lantern-quay\.example$/);
    expect(DEMO_PEOPLE.map(({ role }) => role)).toEqual(['owner', 'coach', 'writer', 'student']);
  });
});
