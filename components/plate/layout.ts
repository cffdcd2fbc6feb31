/** A plate from a reading and a layer: sums only, drawn by others. */
import type { Reading, Statement } from '@/engine/reading/schema';
import type { SquareName } from '@/engine/types';
import { captionMarks, legendMarks, listMarks } from './below';
import { frame, ground, patterns } from './frame';
import { commandMarks } from './layers/command';
import { entryMarks, fileMarks } from './layers/files';
import { mobilityFigures, mobilityTints } from './layers/mobility';
import { outpostMarks } from './layers/outposts';
import { isMiddle, pipMarks } from './layers/pips';
import { weakMarks } from './layers/weak';
import { legendOf } from './legend';
import { manMarks } from './men';
import { marginNotes, numberMarks } from './notes';
import { box, cornerOf, frameInset, framedSide, n, sizeFor } from './place';
import type { BoardPlace, Mark, PlacedNote, Plate, PlateRequest } from './types';
import { altText, captionText, captionTitle } from './words';

/** From this width on notes stand in the margin; below it they become numbers and a list. */
export const MARGIN_FROM = 900;
/** Room that margin notes and their strips take on each side at least, px. */
const NOTE_ROOM = 300;
const SIZE_MAX = 72;

/** Lays out a plate. Widths below 120 are taken as 120. */
export function plateOf(request: PlateRequest): Plate {
  const { reading, layer, print = false, flipped = false, chosen = null, man = null, heat = null } = request;
  const width = Math.max(120, request.width);
  const id = request.id ?? 'p';
  const extra = request.extra ?? null;
  const wanted = request.notes ?? (width >= MARGIN_FROM ? 'margin' : 'numbers');
  const inMargin = wanted === 'margin' && width >= MARGIN_FROM;
  const size = Math.min(
    SIZE_MAX,
    sizeFor(inMargin ? width - 2 * NOTE_ROOM : width - 2),
    width >= MARGIN_FROM ? SIZE_MAX : 80,
  );
  const side = framedSide(size);
  const inset = frameInset(size);
  const board: BoardPlace = { x: (width - side) / 2 + inset, y: 1 + inset, size, flipped };
  const noted = wanted === 'none' ? [] : notesOf(reading, request.noted ?? reading.lead);

  const where = `${id} ${n(board.x)} ${n(board.y)} ${n(size)} ${flipped}${print}`;
  const marks: Mark[] = [
    { type: 'group', key: 'ground', stamp: where, marks: ground(board, id) },
    { type: 'group', key: 'under', marks: [...under(request, board, id), ...(extra?.under?.(board) ?? [])] },
    { type: 'group', key: 'men', marks: men(reading, board, where, layer === 'mobility' ? man : null) },
    { type: 'group', key: 'over', marks: [...over(request, board, where, heat), ...(extra?.over?.(board) ?? [])] },
    { type: 'group', key: 'frame', stamp: where, marks: frame(board) },
  ];
  if (layer === 'command' || layer === 'files')
    marks.push({ type: 'group', key: 'files', marks: fileMarks(reading, board) });
  const bottom = 1 + side;
  let notes: PlacedNote[] = noted;
  if (inMargin) {
    const placed = marginNotes(board, width, { top: 2, bottom }, noted, chosen);
    notes = placed.notes;
    marks.push({ type: 'group', key: 'notes', marks: placed.marks });
  } else if (noted.length > 0) {
    marks.push({
      type: 'group',
      key: 'notes',
      marks: numberMarks(board, noted, new Set(reading.men.map(({ square }) => square)), chosen),
    });
  }
  marks.push({ type: 'group', key: 'lit', marks: litMarks(request.lit ?? [], board) });

  const legend = [...legendOf(reading, layer, board, id, print), ...(extra?.legend ?? [])];
  const title = request.caption?.title ?? captionTitle(reading, layer, man);
  const text = request.caption ? (request.caption.text ?? '') : captionText(reading, layer);
  let height = bottom + 1;
  if ((request.below ?? 'drawn') === 'drawn') {
    const left = inMargin ? board.x - inset : 2;
    const room = inMargin ? side : width - 4;
    const caption = captionMarks(title, text, left, bottom + 12, room);
    const key = legendMarks(legend, left, caption.end + 14, room);
    const list = inMargin ? { marks: [], end: key.end } : listMarks(notes, left, key.end + 14, room);
    marks.push(...caption.marks, ...key.marks, ...list.marks);
    height = list.end + 8;
  }
  return {
    width,
    height: Math.ceil(height),
    board,
    patterns: patterns(board, id, print),
    marks,
    title,
    text,
    alt: extra ? `${altText(reading, layer, man)} ${extra.alt}` : altText(reading, layer, man),
    notes,
    legend,
  };
}

/** What lies under the men. */
function under(
  { reading, layer, print = false, man = null, heat }: PlateRequest,
  board: BoardPlace,
  id: string,
): Mark[] {
  switch (layer) {
    case 'command':
      return [
        ...commandMarks(reading, board, id, print),
        ...weakMarks(reading.weakSquares, board, { all: false, print }),
      ];
    case 'weak':
      return weakMarks(reading.weakSquares, board, { all: true, print });
    case 'files':
      return entryMarks(reading, board);
    case 'mobility':
      return heat ? mobilityTints(heat, board, man) : [];
    case 'position':
    case 'control':
    case 'outposts':
      return [];
  }
}

/** What lies over the men. */
function over(
  { reading, layer, print = false, man = null }: PlateRequest,
  board: BoardPlace,
  where: string,
  heat: PlateRequest['heat'],
): Mark[] {
  switch (layer) {
    case 'command':
      return [
        ...pipMarks(reading.squares.filter(isMiddle), board, where),
        ...outpostMarks(reading.outposts, board, print),
      ];
    case 'control':
      return pipMarks(reading.squares, board, where);
    case 'outposts':
      return outpostMarks(reading.outposts, board, print);
    case 'mobility':
      return heat ? mobilityFigures(heat, board, man) : [];
    case 'position':
    case 'weak':
    case 'files':
      return [];
  }
}

function men(reading: Reading, board: BoardPlace, where: string, asked: SquareName | null): Mark[] {
  const marks = reading.men.map(({ side, kind, square }): Mark => {
    const { x, y } = cornerOf(board, square);
    return {
      type: 'group',
      key: square,
      stamp: `${where} ${side} ${kind}`,
      marks: manMarks(side, kind, x, y, board.size),
    };
  });
  if (asked === null) return marks;
  const { x, y } = cornerOf(board, asked);
  const edge = box(x + 2, y + 2, board.size - 4, board.size - 4);
  return [
    ...marks,
    { type: 'group', key: 'asked', marks: [{ type: 'path', d: edge, stroke: 'pick', width: 2, fill: 'none' }] },
  ];
}

function litMarks(lit: readonly SquareName[], board: BoardPlace): Mark[] {
  return lit.map((square): Mark => {
    const { x, y } = cornerOf(board, square);
    return {
      type: 'path',
      d: box(x + 1.5, y + 1.5, board.size - 3, board.size - 3),
      stroke: 'pick',
      width: 2.6,
      fill: 'none',
    };
  });
}

/** Statements to note, in order, each with the square that its bracket takes. */
function notesOf(reading: Reading, keys: readonly string[]): PlacedNote[] {
  return keys
    .map((key) => reading.statements.find((statement) => statement.key === key))
    .filter((statement): statement is Statement => statement !== undefined)
    .flatMap((statement, index) => {
      const square = statement.squares[0] ?? statement.men[0];
      return square ? [{ number: index + 1, statement, square }] : [];
    });
}
