/** Every sentence that positions of real games bring forth: one of each kind to be read, and the rules of writing for all. */
import { readFileSync, writeFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { newDesk, parseFen, readValues, THEMES } from '@/engine';
import { explain, type StatementValue } from '@/engine/explain';
import { PHRASES } from '@/engine/explain/phrases';
import { realPositions } from '../../../support/real-positions';

const desk = newDesk();
const readings = realPositions(4000).map((fen) => {
  const admitted = parseFen(fen, 'strict');
  if (!admitted.ok) throw new Error(`refused: ${fen}`);
  return { fen, ...explain(readValues(admitted.value.position, desk)) };
});
const all = readings.flatMap(({ statements }) => statements);

/** Statements that break a rule, as text. */
const breaking = (rule: (statement: StatementValue) => boolean) =>
  [...new Set(all.filter((each) => !rule(each)).map(({ text }) => text))].slice(0, 10);

describe('the sentences', () => {
  it('one of every kind reads as it did', () => {
    const file = 'tests/golden/kinds.txt';
    const lines = THEMES.flatMap((theme) => {
      const ids = [...new Set(all.filter((each) => each.theme === theme).map(({ id }) => id))].sort();
      return ids.map((id) => `${theme.padEnd(10)}${id.padEnd(23)}${all.find((each) => each.id === id)?.text}`);
    });
    const text = `${lines.join('\n')}\n`;
    if (process.env.UPDATE === '1') writeFileSync(file, text);
    expect(text).toBe(readFileSync(file, 'utf8'));
  });

  it('every phrase is spoken in some real game', () => {
    const spoken = new Set(all.map(({ id }) => id));
    expect(Object.keys(PHRASES).filter((id) => !spoken.has(id as StatementValue['id']))).toEqual([]);
  });

  it('end with one full stop, with no gap, no blank and nothing undefined', () => {
    expect(breaking(({ text }) => /[^.]\.$/.test(text))).toEqual([]);
    expect(breaking(({ text }) => !/ {2}| [.,:;]|undefined|null|NaN|\[object|['"]/.test(text))).toEqual([]);
  });

  it('begin with a capital or with a square, each of them', () => {
    expect(breaking(({ text }) => text.split('. ').every((sentence) => /^([A-Z]|[a-h][1-8])/.test(sentence)))).toEqual(
      [],
    );
  });

  it('count in the singular after one and in the plural after more', () => {
    const noun = '(move|pawn|square|man|guard|attacker|safe move|enemy pawn|pawn island|pair)';
    expect(breaking(({ text }) => !new RegExp(`\\b[Oo]ne ${noun}s\\b`).test(text))).toEqual([]);
    // 'Black has two pawn islands': a noun that stands before another has no plural.
    const many = '(two|three|four|five|six|seven|eight|nine|ten|eleven|twelve|\\d\\d)';
    expect(breaking(({ text }) => !new RegExp(`\\b${many} ${noun}\\b(?!’| island)`, 'i').test(text))).toEqual([]);
    expect(breaking(({ text }) => !/\bThe \w+s on [^.:]* (stands|gets|attacks)\b/.test(text))).toEqual([]);
  });

  it('are no longer than a note takes: heads up to 60 characters, texts up to 260', () => {
    expect(breaking(({ head }) => head.length <= 60)).toEqual([]);
    expect(breaking(({ text }) => text.length <= 260)).toEqual([]);
  });

  it('claim nothing that no count carries', () => {
    expect(
      breaking(({ text }) => !/\b(winning|won|lost position|strong|dangerous|better for|clearly|huge)\b/i.test(text)),
    ).toEqual([]);
  });
});

describe('a reading', () => {
  it('has no statement twice, and no more than a person reads', () => {
    for (const { fen, statements } of readings) {
      expect(new Set(statements.map(({ key }) => key)).size, fen).toBe(statements.length);
      expect(new Set(statements.map(({ text }) => text)).size, fen).toBe(statements.length);
      expect(statements.length, fen).toBeLessThanOrEqual(48);
    }
  });

  it('runs from the heaviest statement to the lightest', () => {
    for (const { fen, statements } of readings) {
      const weights = statements.map(({ weight }) => weight);
      expect(weights, fen).toEqual([...weights].sort((a, b) => b - a));
    }
  });

  it('leads with five at most, one a theme and one a man, each pointing at the board', () => {
    for (const { fen, statements, lead } of readings) {
      const leading = statements.filter(({ key }) => lead.includes(key));
      const men = leading.flatMap((each) => each.men);
      expect(leading.length, fen).toBe(lead.length);
      expect(lead.length, fen).toBeLessThanOrEqual(5);
      expect(new Set(leading.map(({ theme }) => theme)).size, fen).toBe(leading.length);
      expect(new Set(men).size, fen).toBe(men.length);
      expect(
        leading.every((each) => each.squares.length + each.men.length > 0),
        fen,
      ).toBe(true);
    }
  });
});
