/** A drawing with its caption and legend under it, as it goes into a file. */
import { captionMarks, legendMarks } from './below';
import type { Drawing, LegendItem } from './types';

/** The drawing with title, text and legend below; `text` should say of what position it is. */
export function captioned(drawing: Drawing, text: string, legend: readonly LegendItem[]): Drawing {
  const { width, height, title } = drawing;
  const caption = captionMarks(title, text, 4, height + 8, width - 8);
  const key = legendMarks(legend, 4, caption.end + 14, width - 8);
  return { ...drawing, height: Math.ceil(key.end + 8), marks: [...drawing.marks, ...caption.marks, ...key.marks] };
}
