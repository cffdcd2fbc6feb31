/** Text to lines of a bounded width. */

/** The width of everything the terminal commands write, in characters. */
export const COLUMNS = 80;

/** The words of a text in lines of at most `width` characters; a word that is longer stands alone. */
export function wrap(text: string, width: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(/\s+/).filter((part) => part !== '')) {
    if (line !== '' && line.length + 1 + word.length > width) {
      lines.push(line);
      line = word;
    } else {
      line = line === '' ? word : `${line} ${word}`;
    }
  }
  return line === '' ? lines : [...lines, line];
}

/** A paragraph whose first line begins with a mark and whose others stand under the text. */
export function item(mark: string, text: string, columns: number = COLUMNS): string[] {
  const indent = ' '.repeat(mark.length);
  return wrap(text, columns - mark.length).map((line, index) => (index === 0 ? mark : indent) + line);
}
