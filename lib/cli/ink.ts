/** Colours of the terminal, for those who want them. */

export interface Ink {
  readonly bold: (text: string) => string;
  readonly faint: (text: string) => string;
  readonly white: (text: string) => string;
  readonly black: (text: string) => string;
}

const plain = (text: string): string => text;

function wrapped(open: number, close: number): (text: string) => string {
  return (text) => `\u001b[${open}m${text}\u001b[${close}m`;
}

/** The sides' inks are ochre and indigo, as on a plate; the terminal's yellow and blue are nearest. */
export function inkFor(colour: boolean): Ink {
  if (!colour) return { bold: plain, faint: plain, white: plain, black: plain };
  return { bold: wrapped(1, 22), faint: wrapped(2, 22), white: wrapped(33, 39), black: wrapped(34, 39) };
}
