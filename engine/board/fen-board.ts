/** The first field of a FEN: eight ranks from the eighth down, each adding up to eight squares. */
import { type Fault, fault } from './fault';
import { squareAt } from './squares';

const LETTERS = ' PNBRQK  pnbrqk';
const ORDINALS = ['eighth', 'seventh', 'sixth', 'fifth', 'fourth', 'third', 'second', 'first'];
const COUNT_WORDS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];

/** Letter of a man's code, an empty text for none. */
export function manLetter(code: number): string {
  return LETTERS[code]?.trim() ?? '';
}

/** Code of a FEN letter; undefined where it is none. */
export function codeOfLetter(letter: string): number | undefined {
  const code = letter === ' ' ? -1 : LETTERS.indexOf(letter);
  return code > 0 && letter.length === 1 ? code : undefined;
}

/** A small count as a word, a greater one as a figure. */
export function inWords(count: number): string {
  return COUNT_WORDS[count] ?? String(count);
}

/** Reads the board field into 64 codes, a1 first; faults are added to the list. */
export function readBoard(field: string, faults: Fault[]): Uint8Array {
  const board = new Uint8Array(64);
  const ranks = field.split('/');
  if (ranks.length !== 8) {
    faults.push(
      fault(
        'board',
        'rank-count',
        `The board has ${inWords(ranks.length)} ${ranks.length === 1 ? 'rank' : 'ranks'}; it needs eight, parted by "/".`,
      ),
    );
    return board;
  }
  ranks.forEach((rank, row) => readRank(rank, row, board, faults));
  return board;
}

function readRank(rank: string, row: number, board: Uint8Array, faults: Fault[]): void {
  const name = ORDINALS[row] ?? '';
  let file = 0;
  let previousWasDigit = false;
  for (const letter of rank) {
    const isDigit = letter >= '1' && letter <= '8';
    if (isDigit) {
      if (previousWasDigit) {
        faults.push(
          fault('board', 'digits-together', `The ${name} rank has two figures side by side; write their sum.`),
        );
      }
      file += Number(letter);
    } else {
      const code = codeOfLetter(letter);
      if (code === undefined) {
        faults.push(
          fault(
            'board',
            'unknown-letter',
            `The ${name} rank has "${letter}", which is no man and no number of empty squares.`,
          ),
        );
        return;
      }
      const square = squareAt(file, 7 - row);
      if (square !== undefined) board[square] = code;
      file++;
    }
    previousWasDigit = isDigit;
  }
  if (file !== 8) {
    faults.push(
      fault(
        'board',
        'rank-length',
        `The ${name} rank adds up to ${inWords(file)} ${file === 1 ? 'square' : 'squares'}; it needs eight.`,
      ),
    );
  }
}

/** The board field of 64 codes. */
export function writeBoard(board: Readonly<Uint8Array>): string {
  const ranks: string[] = [];
  for (let rank = 7; rank >= 0; rank--) {
    let text = '';
    let empty = 0;
    for (let file = 0; file < 8; file++) {
      const letter = manLetter(board[rank * 8 + file] ?? 0);
      if (letter === '') {
        empty++;
        continue;
      }
      text += (empty > 0 ? String(empty) : '') + letter;
      empty = 0;
    }
    ranks.push(text + (empty > 0 ? String(empty) : ''));
  }
  return ranks.join('/');
}
