/** The board in letters: White's men in capitals, Black's small, dark squares hatched as in printed books. */
import { FILES, type Kind, RANKS, type Side } from '@/engine/types';
import type { Reading } from '@/engine/reading/schema';
import type { Ink } from './ink';

const LETTERS: Readonly<Record<Kind, string>> = {
  pawn: 'P',
  knight: 'N',
  bishop: 'B',
  rook: 'R',
  queen: 'Q',
  king: 'K',
};

/** Ten lines: eight ranks, the frame's foot and the files. White stands below. */
export function boardText(reading: Reading, ink: Ink): string[] {
  const men = new Map(reading.men.map((man) => [man.square as string, man]));
  const ranks = RANKS.map((rank, rankIndex) => {
    const cells = FILES.map((file, fileIndex) => {
      const man = men.get(file + rank);
      return man ? letterOf(man.side, man.kind, ink) : emptySquare((rankIndex + fileIndex) % 2 === 0, ink);
    });
    return `${rank} | ${cells.join(' ')} |`;
  }).reverse();
  return [...ranks, `  +${'-'.repeat(17)}+`, `    ${FILES.join(' ')}`];
}

function letterOf(side: Side, kind: Kind, ink: Ink): string {
  return side === 'white' ? ink.white(ink.bold(LETTERS[kind])) : ink.black(ink.bold(LETTERS[kind].toLowerCase()));
}

function emptySquare(dark: boolean, ink: Ink): string {
  return dark ? ink.faint(':') : ' ';
}
