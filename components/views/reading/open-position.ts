/** What was typed, as a position to show: strictly where it is legal, as a diagram where it is not. */
import { type Fault, formatFen, parseFen, type Position } from '@/engine/board';

export interface Opened {
  /** The text as it was typed. */
  readonly text: string;
  /** The position to show; null where not even a diagram can be read from the text. */
  readonly position: Position | null;
  /** Why the text was refused, or what the diagram lacks. */
  readonly faults: readonly Fault[];
}

/** Opens a text. Nothing typed is lost: it comes back beside what was made of it. */
export function openPosition(text: string): Opened {
  const strict = parseFen(text, 'strict');
  if (strict.ok) return { text, position: strict.value.position, faults: [] };
  const diagram = parseFen(text, 'diagram');
  if (diagram.ok) return { text, position: diagram.value.position, faults: diagram.value.warnings };
  return { text, position: null, faults: strict.fault };
}

/** The position's FEN, as the field shows it after an edit. */
export function textOf(position: Position): string {
  return formatFen(position);
}

/** Whether a text is a game rather than a FEN: it has a tag in brackets or a numbered move. */
export function looksLikeGame(text: string): boolean {
  return /^\s*\[\w+\s+"/m.test(text) || /(^|\s)\d+\.+\s*[a-hKQRBNO]/.test(text);
}
