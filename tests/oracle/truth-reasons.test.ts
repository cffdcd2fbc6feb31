/** Take away what bears a sentence out, and the sentence goes; and three sentences that are easily got wrong. */
import { describe, expect, it } from 'vitest';
import { readFen, type Statement } from '@/engine';
import { realPositions } from '../support/real-positions';
import { isTrue } from '../support/truth';
import { colourOf, fileOf, nameOf, other, Scene, type Side, squareOf, step } from '../support/truth/scene';

function fenOf(board: readonly string[], mover: Side): string {
  const ranks = [7, 6, 5, 4, 3, 2, 1, 0].map((rank) =>
    board
      .slice(rank * 8, rank * 8 + 8)
      .map((letter) => letter || '1')
      .join('')
      .replace(/1+/g, (run) => String(run.length)),
  );
  return `${ranks.join('/')} ${mover === 'white' ? 'w' : 'b'} - - 0 1`;
}

function statementsOf(fen: string): readonly Statement[] {
  const reading = readFen(fen, 'diagram');
  if (!reading.ok) throw new Error(`refused: ${fen}`);
  return reading.value.statements;
}

const put = (scene: Scene, square: number, letter: string) =>
  scene.board.map((each, at) => (at === square ? letter : each));
const pawnOf = (side: Side | null) => (side === 'black' ? 'p' : 'P');
const isFree = (scene: Scene, square: number) =>
  square >= 8 && square < 56 && scene.letter(square) === '' && square !== scene.passing;
const first = (scene: Scene, squares: readonly number[]) => squares.find((square) => isFree(scene, square)) ?? -1;
const text = (fact: unknown) => String(fact);
const manOn = (fact: unknown) => (fact as { square: string }).square;

interface Row {
  readonly id: Statement['id'];
  readonly change: string;
  /** The board after the change; null where it cannot be made. */
  readonly make: (scene: Scene, statement: Statement) => readonly string[] | null;
  /** What the two statements are about; the same id about the same must be gone. */
  readonly about: (statement: Statement) => string;
}

/** Puts a pawn of the side on the first free square of a list. */
const addPawn = (scene: Scene, side: Side, squares: readonly number[]) => {
  const square = first(scene, squares);
  return square < 0 ? null : put(scene, square, pawnOf(side));
};
const sideOf = ({ side }: Statement): Side => side ?? 'white';

const ROWS: readonly Row[] = [
  {
    id: 'weak-for-good',
    change: 'a pawn that guards the square',
    make: (scene, one) =>
      addPawn(
        scene,
        sideOf(one),
        [-1, 1].map((files) => step(sideOf(one), squareOf(text(one.facts['square'])), files, -1)),
      ),
    about: ({ side, facts }) => `${side} ${text(facts['square'])}`,
  },
  {
    id: 'outpost-free',
    change: 'an enemy pawn that attacks the square',
    make: (scene, one) =>
      addPawn(
        scene,
        other(sideOf(one)),
        [-1, 1].map((files) => step(sideOf(one), squareOf(text(one.facts['square'])), files, 1)),
      ),
    about: ({ side, facts }) => `${side} ${text(facts['square'])}`,
  },
  {
    id: 'file-owned',
    change: 'a pawn on the file',
    make: (scene, one) =>
      addPawn(
        scene,
        'white',
        [1, 2, 3, 4, 5, 6].map((rank) => rank * 8 + 'abcdefgh'.indexOf(text(one.facts['file']))),
      ),
    about: ({ facts }) => text(facts['file']),
  },
  {
    id: 'isolated-pawn',
    change: 'an own pawn on the next file',
    make: (scene, { side, facts }) => {
      const file = fileOf(squareOf(text(facts['pawn'])));
      const next = file === 0 ? 1 : file - 1;
      return addPawn(
        scene,
        side ?? 'white',
        [1, 2, 3, 4, 5, 6].map((rank) => rank * 8 + next),
      );
    },
    about: ({ facts }) => text(facts['pawn']),
  },
  {
    id: 'passed-pawn',
    change: 'an enemy pawn ahead of it',
    make: (scene, one) =>
      addPawn(
        scene,
        other(sideOf(one)),
        [-1, 0, 1].map((files) => step(sideOf(one), squareOf(text(one.facts['pawn'])), files, 1)),
      ),
    about: ({ facts }) => text(facts['pawn']),
  },
  {
    id: 'long-diagonal-open',
    change: 'a pawn on the next square of the diagonal',
    make: (scene, one) => addPawn(scene, sideOf(one), [squareOf(text(one.squares[0]))]),
    about: ({ facts }) => manOn(facts['man']),
  },
  {
    id: 'pinned',
    change: 'the pinning man taken off',
    make: (scene, one) => put(scene, squareOf(manOn(one.facts['pinner'])), ''),
    about: ({ facts }) => manOn(facts['man']) + manOn(facts['pinner']),
  },
  {
    id: 'en-prise',
    change: 'every attacker taken off',
    make: (scene, one) => {
      const attackers = scene.attackers(other(sideOf(one)), squareOf(manOn(one.facts['man'])));
      if (attackers.includes(scene.king(other(sideOf(one))))) return null;
      let left = scene.without(-1);
      for (
        let next = attackers;
        next.length > 0;
        next = left.attackers(other(sideOf(one)), squareOf(manOn(one.facts['man'])))
      )
        for (const at of next) left = left.without(at);
      return left.board;
    },
    about: ({ facts }) => manOn(facts['man']),
  },
  {
    id: 'loose',
    change: 'a pawn that guards it',
    make: (scene, one) =>
      addPawn(
        scene,
        sideOf(one),
        [-1, 1].map((files) => step(sideOf(one), squareOf(manOn(one.facts['man'])), files, -1)),
      ),
    about: ({ facts }) => manOn(facts['man']),
  },
];

describe('the sentence goes with its reason', () => {
  it.each(ROWS)('$id: $change', { timeout: 120_000 }, ({ id, make, about }) => {
    const left: string[] = [];
    let tried = 0;
    for (const fen of realPositions(1000)) {
      const scene = Scene.ofFen(fen);
      for (const statement of statementsOf(fen).filter((each) => each.id === id)) {
        const board = make(scene, statement);
        if (!board) continue;
        tried++;
        const changed = fenOf(board, scene.mover);
        const same = statementsOf(changed).some((each) => each.id === id && about(each) === about(statement));
        if (same) left.push(`${fen}\n  ${changed}\n  ${statement.text}`);
      }
      if (tried > 120) break;
    }
    expect(tried).toBeGreaterThan(10);
    expect(left).toEqual([]);
  });
});

describe('sentences that are easily got wrong', () => {
  const says = (fen: string, words: string) => statementsOf(fen).filter((each) => each.text.includes(words));

  it('a knight comes to a square of its own colour in an even number of moves', () => {
    const comers = realPositions(300).flatMap((fen) =>
      statementsOf(fen).flatMap(({ id, facts }) =>
        id.startsWith('weak-') || id === 'outpost-free'
          ? ((facts['comers'] ?? []) as { kind: string; square: string; moves: number }[])
              .filter(({ kind }) => kind === 'knight')
              .map(({ square, moves }) => {
                const isSame = colourOf(squareOf(square)) === colourOf(squareOf(text(facts['square'])));
                return (moves % 2 === 0) === isSame;
              })
          : [],
      ),
    );
    expect(comers.length).toBeGreaterThan(300);
    expect(comers).not.toContain(false);
  });

  it('a knight that is the only guard of a square does not get there safely itself', () => {
    const words = 'knight on c3 gets there in one move';
    const alone = '6k1/pp3ppp/3p1n2/8/8/2N5/PPP2PPP/6K1 w - - 0 1';
    const helped = '6k1/pp3ppp/3p1n2/8/4P3/2N5/PPP2PPP/6K1 w - - 0 1';
    expect(says(alone, words).filter((each) => each.facts['square'] === 'd5')).toEqual([]);
    expect(says(helped, words).map((each) => each.facts['square'])).toContain('d5');
  });

  it('a queen does not guard past a man that blocks her', () => {
    const words = 'The knight on d5 is loose: no white man guards it';
    expect(says('6k1/pp3ppp/8/3N4/8/3B4/PP3PPP/3Q2K1 w - - 0 1', words)).toHaveLength(1);
    expect(says('6k1/pp3ppp/8/3N4/8/8/PP2BPPP/3Q2K1 w - - 0 1', words)).toEqual([]);
  });
});

describe('the checkers themselves', () => {
  const spoil = (value: unknown): unknown =>
    typeof value === 'number' ? value + 1 : typeof value === 'boolean' ? !value : value;

  it('call every count that is one too high and every word too many false', () => {
    const missed: string[] = [];
    let tried = 0;
    for (const fen of realPositions(60)) {
      const scene = Scene.ofFen(fen);
      for (const statement of statementsOf(fen)) {
        const spoilt: Statement[] = Object.entries(statement.facts)
          .filter(([, value]) => typeof value === 'number' || typeof value === 'boolean')
          .map(([name, value]) => ({ ...statement, facts: { ...statement.facts, [name]: spoil(value) } }));
        spoilt.push({ ...statement, text: `${statement.text} White is winning.` });
        for (const each of spoilt) {
          tried++;
          if (isTrue(scene, each) === null) missed.push(`${fen} ${each.id} ${JSON.stringify(each.facts)}`);
        }
      }
    }
    expect(tried).toBeGreaterThan(2000);
    expect(missed).toEqual([]);
  });

  it('call the statements of one position false of its mirror', () => {
    const fen = 'r1bq1rk1/pp1nb1pp/2p1pn2/3p1p2/2PP4/1P3NP1/P1QNPPBP/R1B2RK1 w - - 0 10';
    const scene = Scene.ofFen(fen);
    const mirrored = scene.with(scene.board.map((_, at) => scene.letter(at ^ 7)));
    const outposts = statementsOf(fen).filter((each) => each.id === 'outpost-free' && each.facts['square'] === 'e5');
    expect(outposts.map((each) => isTrue(scene, each))).toEqual([null]);
    expect(outposts.map((each) => isTrue(mirrored, each))).not.toContain(null);
    expect(nameOf(squareOf('e5') ^ 7)).toBe('d5');
  });
});
