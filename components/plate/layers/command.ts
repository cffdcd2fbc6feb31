/** Command as a political map: a pale wash, and a strong band just inside each frontier. */
import type { Reading } from '@/engine/reading/schema';
import { box, cornerOf } from '../place';
import type { BoardPlace, Mark } from '../types';

type Command = Reading['squares'][number]['command'];

const BAND = 0.1;

/** Washes, bands and cross-hatching of the whole board. */
export function commandMarks(reading: Reading, board: BoardPlace, id: string, print: boolean): Mark[] {
  const states: Command[][] = Array.from({ length: 8 }, () => []);
  for (const { square, command } of reading.squares) {
    const { x, y } = cornerOf(board, square);
    const row = Math.round((y - board.y) / board.size);
    const column = Math.round((x - board.x) / board.size);
    const line = states[row];
    if (line) line[column] = command;
  }
  const disputed = areas(board, states, 'disputed');
  const marks: Mark[] = [];
  if (disputed) {
    marks.push(
      { type: 'path', d: disputed, fill: 'paper' },
      { type: 'path', d: disputed, fill: { pattern: `${id}cross` } },
    );
  }
  for (const side of ['white', 'black'] as const) {
    const area = areas(board, states, side);
    const band = bands(board, states, side);
    const [wash, washA, bandA, pattern] =
      side === 'white'
        ? (['ochre-wash', 'wash-a', 'band-a', `${id}dots`] as const)
        : (['indigo-wash', 'iwash-a', 'iband-a', `${id}lines`] as const);
    if (!print) {
      marks.push(
        { type: 'path', d: area, fill: wash, strength: washA },
        { type: 'path', d: band, fill: wash, strength: bandA },
      );
    } else {
      marks.push({ type: 'path', d: band, fill: 'paper' });
    }
    marks.push({ type: 'path', d: band, fill: { pattern } });
  }
  if (print) marks.push({ type: 'path', d: frontiers(board, states), stroke: 'ink', width: 0.9, fill: 'none' });
  return marks.filter((mark) => mark.type !== 'path' || mark.d !== '');
}

function areas(board: BoardPlace, states: readonly (readonly Command[])[], state: Command): string {
  let d = '';
  states.forEach((line, row) =>
    line.forEach((each, column) => {
      if (each === state) d += box(board.x + column * board.size, board.y + row * board.size, board.size, board.size);
    }),
  );
  return d;
}

/** Bands along edges where the neighbour has another state, inner corners filled; none along the board's edge. */
function bands(board: BoardPlace, states: readonly (readonly Command[])[], state: Command): string {
  const s = board.size;
  const b = s * BAND;
  const other = (row: number, column: number) => {
    const each = states[row]?.[column];
    return each !== undefined && each !== state;
  };
  let d = '';
  states.forEach((line, row) =>
    line.forEach((each, column) => {
      if (each !== state) return;
      const x = board.x + column * s;
      const y = board.y + row * s;
      const [up, down, left, right] = [
        other(row - 1, column),
        other(row + 1, column),
        other(row, column - 1),
        other(row, column + 1),
      ];
      if (up) d += box(x, y, s, b);
      if (down) d += box(x, y + s - b, s, b);
      if (left) d += box(x, y + (up ? b : 0), b, s - (up ? b : 0) - (down ? b : 0));
      if (right) d += box(x + s - b, y + (up ? b : 0), b, s - (up ? b : 0) - (down ? b : 0));
      if (!up && !left && other(row - 1, column - 1)) d += box(x, y, b, b);
      if (!up && !right && other(row - 1, column + 1)) d += box(x + s - b, y, b, b);
      if (!down && !left && other(row + 1, column - 1)) d += box(x, y + s - b, b, b);
      if (!down && !right && other(row + 1, column + 1)) d += box(x + s - b, y + s - b, b, b);
    }),
  );
  return d;
}

/** A line along every frontier, for print without tints. */
function frontiers(board: BoardPlace, states: readonly (readonly Command[])[]): string {
  const s = board.size;
  let d = '';
  states.forEach((line, row) =>
    line.forEach((each, column) => {
      const x = board.x + column * s;
      const y = board.y + row * s;
      if (column < 7 && line[column + 1] !== each) d += `M${x + s} ${y}v${s}`;
      if (row < 7 && states[row + 1]?.[column] !== each) d += `M${x} ${y + s}h${s}`;
    }),
  );
  return d;
}
