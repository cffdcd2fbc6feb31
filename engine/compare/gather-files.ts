/** Facts of files: opened or shut, for one side or both; a side that controls one now, or no longer. */
import { inView, type ManAt } from '../explain';
import { RANKS, SIDES, type Side, type SquareName } from '../types';
import type { DifferenceFact, FileOpened } from './facts';
import type { Board, Given } from './given';

type FileReading = Board['files'][number];

/** What is said of the files that differ, the a-file first. */
export function fileFacts({ a, b }: Given): DifferenceFact[] {
  return a.files.flatMap((before, place): DifferenceFact[] => {
    const after = b.files[place]!;
    const { file } = before;
    const squares = RANKS.map((rank): SquareName => `${file}${rank}`);
    const opened = openedFacts(before, after, squares);
    const taken = SIDES.filter((side) => (before.control === side) !== (after.control === side));
    return [
      ...opened,
      ...taken.map((side) => {
        const good = after.control === side;
        return { id: 'file-taken', side, good, squares, file, heavy: heavyOn(b, after, side) } as const;
      }),
    ];
  });
}

/** For whom a file is open, wholly or half. */
function isOpenFor({ status, halfOpenFor }: FileReading, side: Side): boolean {
  return status === 'open' || halfOpenFor === side;
}

function openedFacts(before: FileReading, after: FileReading, squares: readonly SquareName[]): FileOpened[] {
  const gains = SIDES.filter((side) => isOpenFor(after, side) && !isOpenFor(before, side));
  const losses = SIDES.filter((side) => isOpenFor(before, side) && !isOpenFor(after, side));
  const changed = gains.length > 0 ? gains : losses;
  if (changed.length === 0) return [];
  return [
    {
      id: 'file-opened',
      side: changed.length === 1 ? changed[0]! : null,
      good: gains.length > 0,
      squares,
      file: before.file,
      status: { a: before.status, b: after.status },
      halfOpenFor: { a: before.halfOpenFor, b: after.halfOpenFor },
    },
  ];
}

function heavyOn({ men }: Board, { heavy }: FileReading, side: Side): ManAt[] {
  return inView(heavy[side], side).flatMap((square) => {
    const man = men.find((each) => each.square === square);
    return man ? [{ kind: man.kind, square }] : [];
  });
}
