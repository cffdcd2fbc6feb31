/** JSON written by a schema is what JSON.stringify writes of what the schema lets through. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { jsonWriter } from '@/lib/api/writer';
import { batchLineSchema } from '@/openapi/schemas/readings';

const schema = z.object({
  text: z.string(),
  'an odd "name"': z.number().nullable(),
  choice: z.enum(['a', 'it’s "b"']),
  flag: z.boolean().optional(),
  list: z.array(z.object({ n: z.int(), inner: z.array(z.string()).optional() })),
  facts: z.record(z.string(), z.unknown()),
});

const values = fc.record(
  {
    text: fc.string({ unit: 'binary' }),
    'an odd "name"': fc.oneof(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.constant(null)),
    choice: fc.constantFrom('a', 'it’s "b"'),
    flag: fc.boolean(),
    list: fc.array(fc.record({ n: fc.integer(), inner: fc.array(fc.string()) }, { requiredKeys: ['n'] })),
    facts: fc.dictionary(fc.string(), fc.jsonValue()),
  },
  { requiredKeys: ['text', 'an odd "name"', 'choice', 'list', 'facts'] },
);

/** Fields in the order of the schema, as the writer has them: zod's parse gives them so too. */
const plainly = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

describe('jsonWriter', () => {
  const write = jsonWriter(schema);

  it('writes any value so that reading it gives the value back', () => {
    fc.assert(
      fc.property(values, (value) => {
        expect(JSON.parse(write(value) ?? '')).toEqual(plainly(value));
      }),
    );
  });

  it('leaves out, at any depth, what the schema does not name', () => {
    const value = {
      text: 'x',
      'an odd "name"': null,
      choice: 'a',
      list: [{ n: 1, secret: 1 }],
      facts: { free: 1 },
      password: 'x',
    };
    expect(JSON.parse(write(value) ?? '')).toEqual({
      text: 'x',
      'an odd "name"': null,
      choice: 'a',
      list: [{ n: 1 }],
      facts: { free: 1 },
    });
  });

  it('writes a choice of objects by the fields that the value has', () => {
    const line = jsonWriter(batchLineSchema);
    const bad = { error: { code: 'rank-count', field: 'board', message: '"ä"' }, line: 3 };
    expect(line({ ...bad, fen: undefined })).toBe(JSON.stringify(bad));
  });

  it('never writes what is not JSON for a number', () => {
    expect(jsonWriter(z.array(z.number()))([1, Number.NaN, Number.POSITIVE_INFINITY])).toBe('[1,null,null]');
  });
});
