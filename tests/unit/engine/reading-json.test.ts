/** The JSON of a reading, written straight from values, is what the schema writes of the reading made as a value. */
import { describe, expect, it } from 'vitest';
import { newDesk, readFen, writeFen } from '@/engine';
import { readingSchema } from '@/engine/reading/schema';
import { jsonWriter } from '@/lib/api/writer';
import { READING_PARTS } from '@/openapi/schemas/ids';
import { readingPartsSchema } from '@/openapi/schemas/readings';
import { realPositions } from '../../support/real-positions';

const write = jsonWriter(readingSchema);
const desk = newDesk();
const decoder = new TextDecoder('utf-8', { fatal: true });

/** What teachers draw: no kings, a board full of queens, nothing at all. */
const DIAGRAMS = [
  '8/8/8/3p4/3P4/8/8/8 w - - 0 1',
  'qqqqqqqq/qqqqqqqq/8/8/8/8/QQQQQQQQ/QQQQQQQQ b - - 3 9',
  '8/8/8/8/8/8/8/8 w - - 0 1',
  'P6p/8/8/8/4k3/8/8/p6P w KQkq e3 0 1',
];

describe('the JSON of a reading', () => {
  it.each([
    ['strict', realPositions(2000)],
    ['diagram', DIAGRAMS],
  ] as const)(
    'is, to the character, what the schema lets through of its value: %s',
    (mode, fens) => {
      for (const [index, fen] of fens.entries()) {
        const value = readFen(fen, mode, desk);
        const text = writeFen(fen, mode, undefined, desk);
        if (!value.ok || !text.ok) throw new Error(`refused: ${fen}`);
        const json = decoder.decode(text.value.json);
        expect(json).toBe(write(value.value));
        // The schema's own check takes longer than all the rest.
        if (index % 20 === 0) expect(JSON.parse(json)).toStrictEqual(readingSchema.parse(value.value));
        expect(text.value.warnings).toEqual(value.value.warnings);
      }
    },
    60_000,
  );

  it('has the parts that were asked for, in the order of the schema', () => {
    const [fen = ''] = realPositions(1);
    const whole = readFen(fen, 'strict');
    if (!whole.ok) throw new Error(fen);
    const { engine, mode, warnings, sideToMove } = whole.value;
    for (const part of READING_PARTS) {
      const text = writeFen(fen, 'strict', ['lead', part, part]);
      const picked = { engine, fen: whole.value.fen, mode, warnings, sideToMove, lead: whole.value.lead };
      const expected = jsonWriter(readingPartsSchema)({ ...picked, [part]: whole.value[part] });
      expect(text.ok && decoder.decode(text.value.json)).toBe(expected);
    }
  });

  it('refuses what the door refuses', () => {
    expect(writeFen('8/8', 'strict')).toEqual(readFen('8/8', 'strict'));
  });
});
