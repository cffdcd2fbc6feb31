/** The pieces that sentences are made from. */
import { describe, expect, it } from 'vitest';
import {
  capital,
  comersSentence,
  counted,
  filesNamed,
  inView,
  inWords,
  listed,
  pawnsStand,
  possessive,
  theFiles,
  theMen,
} from '@/engine/explain/words';

describe('counts', () => {
  it.each([
    [0, 'no moves'],
    [1, 'one move'],
    [2, 'two moves'],
    [12, 'twelve moves'],
    [13, '13 moves'],
  ])('%i is said as %s', (count, text) => expect(counted(count, 'move')).toBe(text));

  it('are words up to twelve and figures beyond', () =>
    expect([11, 12, 13, 27].map(inWords)).toEqual(['eleven', 'twelve', '13', '27']));

  it.each([
    [1, 1, 'one of one pawn stands'],
    [1, 3, 'one of three pawns stands'],
    [5, 8, 'five of eight pawns stand'],
    [7, 7, 'all seven pawns stand'],
  ])('%i of %i pawns: %s', (count, total, text) => expect(pawnsStand(count, total)).toBe(text));
});

describe('lists and names', () => {
  it('a list has commas and one word before its last', () => {
    expect(listed([])).toBe('');
    expect(listed(['d4'])).toBe('d4');
    expect(listed(['d4', 'e5'])).toBe('d4 and e5');
    expect(listed(['d4', 'e5', 'f6'], 'or')).toBe('d4, e5 or f6');
  });

  it('men of one kind stand together', () => {
    expect(
      theMen([
        { kind: 'rook', square: 'a1' },
        { kind: 'queen', square: 'c2' },
        { kind: 'rook', square: 'f1' },
      ]),
    ).toBe('the rooks on a1 and f1 and the queen on c2');
  });

  it('a square’s name keeps its small letter at the beginning of a sentence', () => {
    expect(capital('d5 is weak')).toBe('d5 is weak');
    expect(capital('both knights')).toBe('Both knights');
  });

  it.each([
    [['c'], 'c-file', 'The c-file'],
    [['c', 'e'], 'c- and e-files', 'The c- and e-files'],
    [['c', 'd', 'e'], 'files c, d and e', 'Files c, d and e'],
  ])('files %j', (files, within, first) => {
    expect(filesNamed(files)).toBe(within);
    expect(theFiles(files)).toBe(first);
  });

  it('the apostrophe is the printers’', () => expect(possessive('white')).toBe('White’s'));

  it('squares run by file, then by rank as the side counts it', () => {
    expect(inView(['e5', 'c3', 'c7'], 'white')).toEqual(['c3', 'c7', 'e5']);
    expect(inView(['e4', 'c6', 'c2'], 'black')).toEqual(['c6', 'c2', 'e4']);
  });
});

describe('who gets there', () => {
  const knight = (square: 'b8' | 'd6' | 'g8', moves: number) => ({ kind: 'knight', square, moves }) as const;

  it('names both knights where the side has two, and their squares where it has three', () => {
    const two = [knight('b8', 2), knight('g8', 2)];
    expect(comersSentence(two, 'black', 2)).toBe('Both black knights get there in two moves');
    expect(comersSentence(two, 'black', 3)).toBe('The black knights on b8 and g8 get there in two moves');
  });

  it('names the soonest alone', () => {
    expect(comersSentence([knight('d6', 1), knight('b8', 3)], 'black', 2)).toBe(
      'The black knight on d6 gets there in one move',
    );
  });

  it('says nothing of a man that stands there, nor of nobody', () => {
    expect(comersSentence([knight('d6', 0)], 'black', 1)).toBeNull();
    expect(comersSentence([], 'black', 0)).toBeNull();
  });

  it('counts more than three men and does not name them', () => {
    const rooks = (['a8', 'f8'] as const).map((square) => ({ kind: 'rook', square, moves: 2 }) as const);
    expect(comersSentence([knight('b8', 2), knight('g8', 2), ...rooks], 'black', 2)).toBe(
      'Four black men get there in two moves',
    );
  });
});
