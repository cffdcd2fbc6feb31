/** A reading as a page of text, 80 columns wide: the board, the counts, what matters most, then theme by theme. */
import { THEMES, type Theme } from '@/engine/types';
import type { Reading, Statement } from '@/engine/reading/schema';
import { boardText } from './board-text';
import type { Ink } from './ink';
import { COLUMNS, item, wrap } from './wrap';

const HEADINGS: Readonly<Record<Theme, string>> = {
  structure: 'Pawns and structure',
  squares: 'Weak squares',
  outposts: 'Outposts',
  files: 'Files and diagonals',
  men: 'Men',
  king: 'Kings',
  control: 'Control',
};

/** The whole page, ending with a line break. */
export function readingText(reading: Reading, ink: Ink): string {
  const lead = reading.lead.flatMap((key) => reading.statements.filter((statement) => statement.key === key));
  const rest = reading.statements.filter((statement) => !reading.lead.includes(statement.key));
  const sections = [
    [...wrap(reading.fen, COLUMNS), headline(reading)],
    beside(boardText(reading, ink), totalsText(reading)),
    warningsText(reading, ink),
    section('What matters most', lead, ink),
    ...THEMES.map((theme) =>
      section(
        HEADINGS[theme],
        rest.filter((statement) => statement.theme === theme),
        ink,
      ),
    ),
  ];
  return `${sections
    .filter((lines) => lines.length > 0)
    .map((lines) => lines.join('\n'))
    .join('\n\n')}\n`;
}

function headline({ sideToMove, pawns }: Reading): string {
  const mover = sideToMove === 'white' ? 'White to move.' : 'Black to move.';
  return pawns.structure ? `${mover} Structure: ${pawns.structure.name}.` : mover;
}

const TOTALS = [
  ['squares controlled', 'controlled'],
  ['squares commanded', 'commanded'],
  ['in the enemy half', 'enemyHalf'],
  ['in the centre', 'centre'],
  ['in the wider centre', 'extendedCentre'],
  ['safe moves', 'safeMoves'],
] as const;

function totalsText({ totals }: Reading): string[] {
  const line = (label: string, white: string | number, black: string | number): string =>
    `${label.padEnd(22)}${String(white).padStart(7)}${String(black).padStart(8)}`;
  return [
    line('', 'White', 'Black'),
    ...TOTALS.map(([label, key]) => line(label, totals.white[key], totals.black[key])),
  ];
}

/** Two blocks of lines side by side; the board's lines are all of one width on paper. */
function beside(board: readonly string[], counts: readonly string[]): string[] {
  return board.map((line, index) => (counts[index] ? `${line}      ${counts[index]}` : line));
}

function warningsText({ warnings }: Reading, ink: Ink): string[] {
  if (warnings.length === 0) return [];
  return [ink.bold('Read as a diagram'), ...warnings.flatMap((fault) => item('  ', fault.message))];
}

function section(heading: string, statements: readonly Statement[], ink: Ink): string[] {
  if (statements.length === 0) return [];
  return [ink.bold(heading), ...statements.flatMap((statement) => statementText(statement, ink))];
}

/** The claim stands out in the side's ink, so far as it lies on the first line. */
function statementText({ side, head, text }: Statement, ink: Ink): string[] {
  const [first = '', ...others] = item('  - ', text);
  const inked = side === null ? ink.bold : side === 'white' ? ink.white : ink.black;
  const claim = first.slice(4, 4 + head.length);
  return [`  - ${inked(claim)}${first.slice(4 + claim.length)}`, ...others];
}
