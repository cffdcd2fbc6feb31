/**
 * Targets: a minor man that no own pawn guards, on a file open or half-open for the enemy, with two or more of the
 * enemy's heavy men behind one another on that file against it (common practice).
 */
import { inView, type ManAt } from '../explain';
import { opponent, type FileName, type Side, type SquareName } from '../types';
import type { TargetChange } from './facts';
import type { Board, Given } from './given';

interface Target {
  readonly side: Side;
  readonly man: ManAt;
  readonly file: FileName;
  readonly heavy: readonly ManAt[];
}

/** Heavy men behind one another from which on a minor man is a target. */
const HEAVY_MIN = 2;

const found = new WeakMap<Board, readonly Target[]>();

function targetsOf(board: Board): readonly Target[] {
  const known = found.get(board);
  if (known) return known;
  const targets = board.men.flatMap((man) =>
    man.kind === 'knight' || man.kind === 'bishop' ? targetAt(board, man.square, man.side, man.kind) : [],
  );
  found.set(board, targets);
  return targets;
}

function targetAt({ squares, files }: Board, at: SquareName, side: Side, kind: ManAt['kind']): Target[] {
  const enemy = opponent(side);
  const file = files.find((each) => each.file === at.charAt(0));
  const place = squares.find(({ square }) => square === at);
  if (!file || !place || !(file.status === 'open' || file.halfOpenFor === enemy)) return [];
  const kindOn = (square: SquareName): ManAt['kind'] | undefined =>
    squares.find((each) => each.square === square)?.occupant?.kind;
  if (place.attackers[side].some((square) => kindOn(square) === 'pawn')) return [];
  const onFile = [...place.attackers[enemy], ...place.behind[enemy]].filter((square) =>
    file.heavy[enemy].includes(square),
  );
  if (onFile.length < HEAVY_MIN) return [];
  const heavy = inView(onFile, enemy).map((square) => ({ kind: kindOn(square)!, square }));
  return [{ side, man: { kind, square: at }, file: file.file, heavy }];
}

/** Minor men that have become targets, and those that are none any more though they are still on the board. */
export function targetFacts({ a, b, men }: Given): TargetChange[] {
  const [before, after] = [targetsOf(a), targetsOf(b)];
  if (before.length === 0 && after.length === 0) return [];
  const cameFrom = new Map(men.flatMap(({ squares }) => (squares.b === null ? [] : [[squares.b, squares.a]])));
  const wentTo = new Map(men.flatMap(({ squares }) => (squares.a === null ? [] : [[squares.a, squares.b]])));
  const other = (map: ReadonlyMap<SquareName | null, SquareName | null>, square: SquareName): SquareName | null =>
    map.has(square) ? map.get(square)! : square;
  const isIn = (targets: readonly Target[], square: SquareName | null): boolean =>
    targets.some(({ man }) => man.square === square);
  const made = after.filter(({ man }) => !isIn(before, other(cameFrom, man.square)));
  const gone = before.flatMap((target) => {
    const square = other(wentTo, target.man.square);
    return square === null || isIn(after, square) ? [] : [{ ...target, man: { kind: target.man.kind, square } }];
  });
  return [
    ...made.map((target) => ({ ...target, id: 'target-made', good: false, squares: [target.man.square] }) as const),
    ...gone.map((target) => ({ ...target, id: 'target-gone', good: true, squares: [target.man.square] }) as const),
  ];
}
