/**
 * Notes in the margin: the leading statements left and right of the board, each joined by a hairline to its square.
 *
 * A hairline leaves the end of the head, runs level to the strip, slants there only, then runs level on a grid
 * line through the channel to the square's edge, where it ends in a slab bracket. On one side every note has a grid line
 * of its own and the notes stand in the order of their lines, so that lines cannot cross; none lies on a man.
 */
import type { SquareName } from '@/engine/types';
import { brokenLines, textWidth } from './measure';
import { cellOf, frameInset, n } from './place';
import type { BoardPlace, Mark, Paint, PlacedNote } from './types';
import { bodyOf } from './words';

const HEAD = { size: 14, line: 19 };
const BODY = { size: 13.5, line: 19 };
/** Most notes on one side of the board. */
const SIDE_MAX = 3;
const GAP = 22;
const STRIP = 58;

interface Column {
  readonly side: 'left' | 'right';
  readonly x: number;
  readonly width: number;
}

interface Candidate {
  readonly note: PlacedNote;
  readonly column: Column;
  readonly headLines: readonly string[];
  readonly bodyLines: readonly string[];
  readonly height: number;
  /** Grid line on the board, 0 to 8 from the top. */
  line: number;
  /** Top of the note. */
  top: number;
}

/** Margin notes as marks, renumbered down the left margin, then the right; notes that do not fit are left out. */
export function marginNotes(
  board: BoardPlace,
  figureWidth: number,
  bounds: { readonly top: number; readonly bottom: number },
  notes: readonly PlacedNote[],
  chosen: string | null,
): { marks: Mark[]; notes: PlacedNote[] } {
  const inset = frameInset(board.size);
  const left: Column = { side: 'left', x: 0, width: Math.min(292, board.x - inset - STRIP) };
  const rightStart = board.x + 8 * board.size + inset + STRIP;
  const right: Column = { side: 'right', x: rightStart, width: Math.min(292, figureWidth - rightStart) };
  const placed = [...assign(board, notes, left, right)];
  const onLeft = settle(
    board,
    bounds,
    placed.filter(({ column }) => column.side === 'left'),
    [],
  );
  const onRight = settle(
    board,
    bounds,
    placed.filter(({ column }) => column.side === 'right'),
    onLeft,
  );
  const kept = [...onLeft, ...onRight];
  const numbered = kept.map((candidate, index) => ({ ...candidate, note: { ...candidate.note, number: index + 1 } }));
  return {
    marks: numbered.map((candidate) => noteMarks(board, candidate, chosen)),
    notes: numbered.map(({ note }) => note),
  };
}

/** Each note to the side that makes the shorter run, three a side at most. */
function* assign(board: BoardPlace, notes: readonly PlacedNote[], left: Column, right: Column): Generator<Candidate> {
  const counts = { left: 0, right: 0 };
  for (const note of notes) {
    const { column } = cellOf(board, note.square);
    const nearer = column < 4 ? left : right;
    const farther = nearer === left ? right : left;
    const chosen = counts[nearer.side] < SIDE_MAX ? nearer : counts[farther.side] < SIDE_MAX ? farther : null;
    if (!chosen) continue;
    counts[chosen.side]++;
    const headLines = brokenLines(note.statement.head, chosen.width - 22, HEAD.size, 700);
    const body = bodyOf(note.statement);
    const bodyLines = body ? brokenLines(body, chosen.width - 22, BODY.size, 400) : [];
    yield {
      note,
      column: chosen,
      headLines,
      bodyLines,
      height: headLines.length * HEAD.line + bodyLines.length * BODY.line,
      line: 0,
      top: 0,
    };
  }
}

/** Gives each note of one side its own grid line, then pushes the notes apart and clamps them to the figure. */
function settle(
  board: BoardPlace,
  bounds: { readonly top: number; readonly bottom: number },
  candidates: readonly Candidate[],
  opposite: readonly Candidate[],
): Candidate[] {
  const used = new Set<number>();
  const fitting: Candidate[] = [];
  for (const candidate of candidates) {
    const { row, column } = cellOf(board, candidate.note.square);
    // Two runs from opposite sides may share a grid line only where they do not meet.
    const meets = (line: number) =>
      opposite.some((other) => other.line === line && cellOf(board, other.note.square).column + 1 > column);
    const free = [row + 1, row].filter((each) => !used.has(each) && !meets(each));
    const line = free.find((each) => each > 0 && each < 8) ?? free[0];
    if (line === undefined) continue;
    used.add(line);
    candidate.line = line;
    fitting.push(candidate);
  }
  const total = (list: readonly Candidate[]) => list.reduce((sum, { height }) => sum + height + GAP, -GAP);
  while (fitting.length > 0 && total(fitting) > bounds.bottom - bounds.top) fitting.pop();
  fitting.sort((a, b) => a.line - b.line);
  for (const candidate of fitting) candidate.top = lineY(board, candidate.line) - 13;
  for (let round = 0; round < 60; round++) {
    fitting.forEach((candidate, index) => {
      const next = fitting[index + 1];
      if (!next) return;
      const overlap = candidate.top + candidate.height + GAP - next.top;
      if (overlap <= 0) return;
      candidate.top -= overlap / 2;
      next.top += overlap / 2;
    });
    for (const candidate of fitting) {
      candidate.top = Math.min(Math.max(candidate.top, bounds.top), bounds.bottom - candidate.height);
    }
  }
  // Clamping can leave a last overlap: push down from the top, then up from the bottom.
  fitting.forEach((candidate, index) => {
    const previous = fitting[index - 1];
    if (previous) candidate.top = Math.max(candidate.top, previous.top + previous.height + GAP);
  });
  for (let index = fitting.length - 1; index >= 0; index--) {
    const candidate = fitting[index] as Candidate;
    const next = fitting[index + 1];
    candidate.top = Math.min(
      candidate.top,
      next ? next.top - GAP - candidate.height : bounds.bottom - candidate.height,
    );
  }
  return fitting;
}

function lineY(board: BoardPlace, line: number): number {
  return board.y + line * board.size;
}

/** Paint of a note's head: the ink of the side that it speaks of. */
export function headPaint({ statement }: PlacedNote): Paint {
  return statement.side === 'white' ? 'ochre' : statement.side === 'black' ? 'indigo' : 'ink';
}

function noteMarks(
  board: BoardPlace,
  { note, column, headLines, bodyLines, line, top }: Candidate,
  chosen: string | null,
): Mark {
  const isChosen = note.statement.key === chosen;
  const x = column.x + 22;
  const marks: Mark[] = [
    { type: 'text', x: column.x + 4, y: top + 14, text: String(note.number), size: 13, weight: 500, fill: 'soft' },
    ...headLines.map(
      (text, i): Mark => ({
        type: 'text',
        x,
        y: top + 14 + i * HEAD.line,
        text,
        size: HEAD.size,
        weight: 700,
        fill: headPaint(note),
      }),
    ),
    ...bodyLines.map(
      (text, i): Mark => ({
        type: 'text',
        x,
        y: top + 13 + (headLines.length + i) * BODY.line,
        text,
        size: BODY.size,
        weight: 400,
        fill: 'ink',
      }),
    ),
  ];
  const inset = frameInset(board.size);
  const edge = nearEdge(board, note.square, column.side);
  const stroke = isChosen ? 'pick' : 'ink';
  const level = top + 9.5;
  const headEnd = x + textWidth(headLines[0] ?? '', HEAD.size, 700) + 12;
  const gridY = lineY(board, line);
  const d =
    column.side === 'left'
      ? `M${n(Math.min(headEnd, column.x + column.width + 4))} ${n(level)}H${n(board.x - inset - STRIP + 8)}L${n(board.x - inset - 6)} ${n(gridY)}H${n(edge)}`
      : `M${n(column.x - 6)} ${n(level)}H${n(column.x - 16)}L${n(board.x + 8 * board.size + inset + 6)} ${n(gridY)}H${n(edge)}`;
  marks.push(
    { type: 'path', d, stroke, width: isChosen ? 1.3 : 0.8, fill: 'none' },
    bracket(board, note.square, line, isChosen),
  );
  return { type: 'group', statement: note.statement.key, marks };
}

/** Where the level run meets the square: its edge on the note's side. */
function nearEdge(board: BoardPlace, square: SquareName, side: 'left' | 'right'): number {
  const { column } = cellOf(board, square);
  return board.x + (side === 'left' ? column : column + 1) * board.size;
}

/** A slab bracket along the square's edge on the grid line, upturned at both ends into the square. */
function bracket(board: BoardPlace, square: SquareName, line: number, chosen: boolean): Mark {
  const { column, row } = cellOf(board, square);
  const x = board.x + column * board.size;
  const y = lineY(board, line);
  const up = (line === row ? 1 : -1) * 0.15 * board.size;
  return {
    type: 'path',
    d: `M${n(x)} ${n(y + up)}V${n(y)}H${n(x + board.size)}V${n(y + up)}`,
    stroke: chosen ? 'pick' : 'ink',
    width: chosen ? 2.8 : 2.2,
    join: 'miter',
    fill: 'none',
  };
}

/** Numbers on the board, for narrow plates: lower right on an empty square, upper right outside a man. */
export function numberMarks(
  board: BoardPlace,
  notes: readonly PlacedNote[],
  occupied: ReadonlySet<SquareName>,
  chosen: string | null,
): Mark[] {
  const onSquare = new Map<SquareName, number>();
  return notes.map((note): Mark => {
    const { column, row } = cellOf(board, note.square);
    const before = onSquare.get(note.square) ?? 0;
    onSquare.set(note.square, before + 1);
    const r = Math.max(7, 0.135 * board.size);
    const x = board.x + (column + 1) * board.size - r - 1 - before * (2 * r + 1);
    const y = board.y + (occupied.has(note.square) ? row * board.size + r + 1 : (row + 1) * board.size - r - 1);
    return {
      type: 'group',
      statement: note.statement.key,
      marks: [
        { type: 'circle', x, y, r, fill: note.statement.key === chosen ? 'pick' : 'ink', stroke: 'paper', width: 1 },
        {
          type: 'text',
          x,
          y: y + r * 0.42,
          text: String(note.number),
          size: r * 1.25,
          weight: 700,
          fill: 'paper',
          anchor: 'middle',
        },
      ],
    };
  });
}
