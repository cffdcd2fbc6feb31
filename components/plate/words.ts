/** Caption and alt text of a plate, written from the reading; and how a statement is parted into head and body. */
import type { Reading, Statement } from '@/engine/reading/schema';
import type { SquareName } from '@/engine/types';
import type { Layer } from './types';

export const LAYER_NAMES: Readonly<Record<Layer, string>> = {
  position: 'Position',
  control: 'Control',
  command: 'Command',
  weak: 'Weak squares',
  outposts: 'Outposts',
  files: 'Files',
  mobility: 'Mobility',
};

const LAYER_TEXTS: Readonly<Record<Exclude<Layer, 'mobility'>, string>> = {
  position: 'The men as they stand.',
  control: 'Pips count attackers: White’s hollow, below; Black’s solid, above; half size behind another.',
  command:
    'Command of squares, tested by exchange. Pips on ranks 3 to 6 count attackers: White’s hollow, below; Black’s solid, above.',
  weak: 'Rings mark squares that no pawn can guard, in the colour of the side that suffers; faint where little hangs on them.',
  outposts: 'Pennants mark outposts and posts held or within reach, in the colour of the side that may use them.',
  files: 'Rules in the margin mark open and half-open files, ticks entry squares, corners targets.',
};

/** 'White to move.' */
export function moverText({ sideToMove }: Reading): string {
  return `${sideToMove === 'white' ? 'White' : 'Black'} to move.`;
}

/** The man of a mobility plate in words: 'knight on d7'. */
export function manText(reading: Reading, man: SquareName | null | undefined): string {
  const found = reading.men.find(({ square }) => square === man);
  return found ? `${found.kind} on ${found.square}` : 'man';
}

/** Title of a plate: the structure's name where there is one. */
export function captionTitle(reading: Reading, layer: Layer, man: SquareName | null | undefined): string {
  if (layer === 'mobility') return `The ${manText(reading, man)}, asked on every square`;
  const { structure } = reading.pawns;
  const name = structure ? structure.name.charAt(0).toUpperCase() + structure.name.slice(1) : null;
  return name ? `${name}: ${LAYER_NAMES[layer].toLowerCase()}` : LAYER_NAMES[layer];
}

/** Second line of the caption: who is to move, and what the marks count. */
export function captionText(reading: Reading, layer: Layer): string {
  const what =
    layer === 'mobility'
      ? `Safe moves it would have from there, tinted where it can get; in brackets where it would itself be lost by exchange.`
      : LAYER_TEXTS[layer];
  return `${moverText(reading)} ${what}`;
}

/** Alt text: layer, side to move, men, and the leading statements in full. */
export function altText(reading: Reading, layer: Layer, man: SquareName | null | undefined): string {
  const list = (side: 'white' | 'black') =>
    reading.men
      .filter((each) => each.side === side)
      .sort((a, b) => KIND_ORDER.indexOf(a.kind) - KIND_ORDER.indexOf(b.kind))
      .map(({ kind, square }) => `${kind} ${square}`)
      .join(', ');
  const leading = reading.lead.flatMap((key) => reading.statements.find((each) => each.key === key)?.text ?? []);
  const layerWords =
    layer === 'mobility' ? `mobility of the ${manText(reading, man)}` : LAYER_NAMES[layer].toLowerCase();
  return [
    `Chess plate, ${layerWords}. ${moverText(reading)}`,
    `White: ${list('white') || 'no men'}.`,
    `Black: ${list('black') || 'no men'}.`,
    ...leading,
  ].join(' ');
}

const KIND_ORDER = ['king', 'queen', 'rook', 'bishop', 'knight', 'pawn'];

/** What follows the head of a statement, as a text of its own: capital first, unless a square or a move begins it. */
export function bodyOf({ head, text }: Pick<Statement, 'head' | 'text'>): string {
  const rest = text.slice(head.length).replace(/^[:.]\s*/, '');
  return /^[a-h][1-8]/.test(rest) ? rest : rest.charAt(0).toUpperCase() + rest.slice(1);
}
