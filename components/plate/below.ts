/** What stands below the board inside a figure: caption, legend, and the numbered list of notes. */
import { LEGEND_FIGURE } from './legend';
import { brokenLines, textWidth } from './measure';
import { headPaint } from './notes';
import type { LegendItem, Mark, PlacedNote } from './types';
import { bodyOf } from './words';

/** Caption lines from y downwards; returns the marks and where they end. */
export function captionMarks(
  title: string,
  text: string,
  x: number,
  y: number,
  width: number,
): { marks: Mark[]; end: number } {
  const marks: Mark[] = [];
  let at = y;
  for (const line of brokenLines(title, width, 17, 700)) {
    at += 24;
    marks.push({ type: 'text', x, y: at - 6, text: line, size: 17, weight: 700, fill: 'ink' });
  }
  for (const line of text ? brokenLines(text, width, 13, 400) : []) {
    at += 19;
    marks.push({ type: 'text', x, y: at - 4, text: line, size: 13, weight: 400, fill: 'soft' });
  }
  return { marks, end: at };
}

/** Legend items in rows that fit the width. */
export function legendMarks(
  items: readonly LegendItem[],
  x: number,
  y: number,
  width: number,
): { marks: Mark[]; end: number } {
  const marks: Mark[] = [];
  let left = x;
  let top = y;
  for (const { label, marks: figure } of items) {
    const wide = LEGEND_FIGURE.width + 8 + textWidth(label, 12, 400);
    if (left > x && left + wide > x + width) {
      left = x;
      top += 22;
    }
    marks.push(...figure.map((mark) => shifted(mark, left, top)));
    marks.push({
      type: 'text',
      x: left + LEGEND_FIGURE.width + 8,
      y: top + 12,
      text: label,
      size: 12,
      weight: 400,
      fill: 'soft',
    });
    left += wide + 20;
  }
  return { marks, end: items.length > 0 ? top + LEGEND_FIGURE.height : y };
}

/** The same mark elsewhere. */
function shifted(mark: Mark, x: number, y: number): Mark {
  if (mark.type === 'path')
    return { ...mark, move: { x: x + (mark.move?.x ?? 0), y: y + (mark.move?.y ?? 0), scale: mark.move?.scale ?? 1 } };
  if (mark.type === 'group') return { ...mark, marks: mark.marks.map((child) => shifted(child, x, y)) };
  return { ...mark, x: mark.x + x, y: mark.y + y };
}

/** The numbered list under a narrow plate. */
export function listMarks(
  notes: readonly PlacedNote[],
  x: number,
  y: number,
  width: number,
): { marks: Mark[]; end: number } {
  const marks: Mark[] = [];
  let at = y;
  for (const note of notes) {
    marks.push({
      type: 'path',
      d: `M${x} ${Math.round(at) + 0.5}h${Math.round(width)}`,
      stroke: 'rule',
      width: 1,
      fill: 'none',
    });
    at += 10;
    const group: Mark[] = [
      { type: 'circle', x: x + 10, y: at + 10, r: 10, fill: 'ink' },
      {
        type: 'text',
        x: x + 10,
        y: at + 14.6,
        text: String(note.number),
        size: 13,
        weight: 700,
        fill: 'paper',
        anchor: 'middle',
      },
    ];
    for (const line of brokenLines(note.statement.head, width - 34, 14, 700)) {
      at += 20;
      group.push({ type: 'text', x: x + 34, y: at - 5, text: line, size: 14, weight: 700, fill: headPaint(note) });
    }
    for (const line of brokenLines(bodyOf(note.statement), width - 34, 14, 400)) {
      at += 20;
      group.push({ type: 'text', x: x + 34, y: at - 5, text: line, size: 14, weight: 400, fill: 'ink' });
    }
    marks.push({ type: 'group', statement: note.statement.key, marks: group });
    at += 10;
  }
  return { marks, end: at };
}
