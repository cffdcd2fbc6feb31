/**
 * Glyphs that are written as signs, with their numbers (PGN Standard, 12 March 1994, section 10; the signs of positions
 * are those of the printed opening manuals, common practice).
 */
export const GLYPHS: ReadonlyMap<string, number> = new Map([
  ['!', 1],
  ['?', 2],
  ['!!', 3],
  ['??', 4],
  ['!?', 5],
  ['?!', 6],
  ['□', 7],
  ['=', 10],
  ['∞', 13],
  ['+=', 14],
  ['+/=', 14],
  ['⩲', 14],
  ['=+', 15],
  ['=/+', 15],
  ['⩱', 15],
  ['±', 16],
  ['+/-', 16],
  ['∓', 17],
  ['-/+', 17],
  ['+-', 18],
  ['-+', 19],
]);
