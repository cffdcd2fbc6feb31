/** Structure sheets over HTTP: all of them, one, and one held against a position. */
import { describe, expect, it } from 'vitest';
import type { SheetAnswer, StructureSheetJson, StructuresAnswer } from '@/engine/reading/schema/sheets';
import { contracts } from '@/openapi/contracts';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import type { Problem } from '@/openapi/schemas/problem';
import { call, promisedJson } from './caller';

const { getSheet, getStructure, listStructures } = contracts;

describe('GET /structures', () => {
  it('answers every sheet once, with an ETag', async () => {
    const response = await call(listStructures);
    expect(response.headers.get('etag')).toMatch(/^"/);
    const { structures } = await promisedJson<StructuresAnswer>(listStructures, response);
    expect(structures).toHaveLength(42);
    expect(new Set(structures.map(({ id }) => id)).size).toBe(42);
  });

  it('answers one as the list has it', async () => {
    const list = await promisedJson<StructuresAnswer>(listStructures, await call(listStructures));
    const one = await promisedJson<StructureSheetJson>(
      getStructure,
      await call(getStructure, { params: { id: 'hedgehog' } }),
    );
    expect(one).toEqual(list.structures.find(({ id }) => id === 'hedgehog'));
    expect(one).toMatchObject({ name: 'hedgehog', leader: 'black' });
  });

  it('knows no other id', async () => {
    const response = await call(getStructure, { params: { id: 'porcupine' } });
    expect(response.status).toBe(404);
    expect((await promisedJson<Problem>(getStructure, response)).detail).toContain('porcupine');
  });
});

describe('GET /sheets', () => {
  it('holds the sheet of the Carlsbad structure against the position', async () => {
    const response = await call(getSheet, { query: { fen: EXAMPLE_FEN } });
    const { fen, sheet } = await promisedJson<SheetAnswer>(getSheet, response);
    expect(fen).toBe(EXAMPLE_FEN);
    expect(sheet).toMatchObject({ id: 'carlsbad', side: 'white', differs: 0 });
    // The b-pawn goes b2-b4-b5: two moves, the double step being one.
    expect(sheet?.white.levers[0]).toMatchObject({
      on: 'b5',
      against: 'c6',
      from: 'b2',
      state: 'needs-moves',
      moves: 2,
    });
    const rook = sheet?.white.posts.find(({ kind, square }) => kind === 'rook' && square === 'c1');
    expect(rook).toMatchObject({
      state: 'free',
      users: [
        { from: 'a1', moves: 1 },
        { from: 'f1', moves: 1 },
      ],
    });
  });

  it('answers null for pawns without a name', async () => {
    const response = await call(getSheet, { query: { fen: '4k3/p7/8/8/8/8/P7/4K3 w - - 0 1' } });
    expect((await promisedJson<SheetAnswer>(getSheet, response)).sheet).toBeNull();
  });

  it('refuses a FEN with its fault', async () => {
    const response = await call(getSheet, { query: { fen: 'nonsense' } });
    expect(response.status).toBe(422);
    expect(await promisedJson<Problem>(getSheet, response)).toMatchObject({ code: 'fen-refused' });
  });
});
