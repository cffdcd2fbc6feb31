/** The table of structures is sound, and the matcher does what it says. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DIFFERS_MAX, nameStructure, PREPARED, prepared, STRUCTURES, structureLead } from '@/engine/structures';
import { opponent, type Side } from '@/engine/types';
import { diagram, turned } from '../../../support/pawn-boards';
import { positionOf, soundBoardsOf, tokensOf } from '../../../support/structure-boards';

describe('the table', () => {
  it('has two dozen structures at least, each with its own id and name, a source and a lead', () => {
    expect(STRUCTURES.length).toBeGreaterThanOrEqual(24);
    expect(new Set(STRUCTURES.map(({ id }) => id)).size).toBe(STRUCTURES.length);
    expect(new Set(STRUCTURES.map(({ name }) => name)).size).toBe(STRUCTURES.length);
    for (const { id, source, lead } of STRUCTURES) {
      expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/);
      expect(source).toMatch(/from memory|\d{4}|common practice/);
      expect(lead).toMatch(/^[^.]+$/);
    }
  });

  it.each(STRUCTURES.map((model) => [model.id, model] as const))(
    '%s demands one pawn a file, or says why not',
    (_, model) => {
      for (const side of [model.white, model.black]) {
        const files = tokensOf(side).map((token) => token.charAt(0));
        const doubled = files.filter((file, index) => files.indexOf(file) !== index);
        const named = tokensOf(side).filter((token) => doubled.includes(token.charAt(0)));
        // Doubled pawns are always in the core: the name stands on them.
        for (const token of named) expect(side.core).toContain(token);
        for (const bare of (side.bare ?? '').split(' ')) if (bare.length === 1) expect(files).not.toContain(bare);
        expect(files.length).toBeLessThanOrEqual(8);
      }
    },
  );

  it('refuses a misspelt square', () => {
    const model = STRUCTURES[0];
    expect(model).toBeDefined();
    if (model) expect(() => prepared({ ...model, white: { core: 'd9', usual: 'a' } })).toThrow('d9');
    if (model) expect(() => prepared({ ...model, black: { core: 'd5', usual: 'x' } })).toThrow('x');
  });

  it('is prepared for both colours, once where the colours are alike', () => {
    const alike = new Set(PREPARED.filter(({ symmetric }) => symmetric).map(({ model }) => model.id));
    expect([...alike].sort()).toEqual(['exchange-french', 'symmetrical-english']);
    expect(PREPARED.length).toBe(2 * STRUCTURES.length - alike.size);
  });
});

describe('a whole model on the board', () => {
  it.each(STRUCTURES.map((model) => [model.id, model] as const))(
    '%s is named, itself or a more telling one',
    (id, model) => {
      fc.assert(
        fc.property(soundBoardsOf(model), (pawns) => {
          const match = nameStructure(positionOf(pawns));
          expect(match).not.toBeNull();
          if (match?.id !== id) {
            const own = PREPARED.find((one) => one.model === model)?.specificity ?? 0;
            const found = PREPARED.find((one) => one.model.id === match?.id);
            expect((found?.specificity ?? 0) - (match?.differs ?? 0)).toBeGreaterThanOrEqual(own);
          }
        }),
        { numRuns: 40 },
      );
    },
  );

  it('changes sides with the colours and nothing else', () => {
    fc.assert(
      fc.property(fc.constantFrom(...STRUCTURES).chain(soundBoardsOf), fc.nat({ max: 15 }), (pawns, dropped) => {
        const position = positionOf(pawns.filter((_, index) => index !== dropped));
        const match = nameStructure(position);
        const other = nameStructure(turned(position));
        const expected = match && { id: match.id, side: opponent(match.side), differs: match.differs };
        expect(other && { id: other.id, side: other.side, differs: other.differs }).toEqual(expected);
      }),
      { numRuns: 600 },
    );
  });
});

const CARLSBAD = '6k1/pp3ppp/2p5/3p4/3P4/4P3/PP3PPP/6K1';

type DifferRow = readonly [fen: string, differs: number | null, reason: string];
const DIFFERS: readonly DifferRow[] = [
  [`${CARLSBAD} w`, 0, 'the model'],
  ['6k1/1p3pp1/p1p4p/3p4/PP1P4/4P1P1/5P1P/6K1 w', 0, 'wing pawns may have advanced'],
  ['6k1/pp3ppp/2p5/3p4/3P4/4P3/PP3PP1/6K1 w', 1, 'the h-pawn is gone'],
  ['6k1/pp3p2/2p5/3p4/3P4/4P3/PP3PPP/6K1 w', 2, 'two pawns are gone'],
  ['6k1/pp6/2p5/3p4/3P4/4P3/PP3PPP/6K1 w', null, 'three are too many'],
  ['6k1/pp3ppp/2p5/3p4/3P4/2P1P3/PP3PPP/6K1 w', null, 'a white c-pawn takes the point away'],
];

describe('pawns that differ', () => {
  it.each(DIFFERS)('%s: %s: %s', (fen, differs) => {
    const match = nameStructure(diagram(fen));
    const found = match?.id === 'carlsbad' ? match.differs : null;
    expect(found).toBe(differs);
    expect(DIFFERS_MAX).toBe(2);
  });
});

describe('the lead', () => {
  it('names sides and turns squares with the colours', () => {
    const say = (position: ReturnType<typeof diagram>) => {
      const match = nameStructure(position);
      return match && [match.side as Side, match.reversed, structureLead(match)];
    };
    expect(say(diagram(`${CARLSBAD} w`))).toEqual([
      'white',
      false,
      'the c-file is half-open for White, the e-file for Black; the book plan is b4-b5, against c6',
    ]);
    expect(say(turned(diagram(`${CARLSBAD} w`)))).toEqual([
      'black',
      true,
      'the c-file is half-open for Black, the e-file for White; the book plan is b5-b4, against c3',
    ]);
  });

  it('leaves no mark of the template in any structure', () => {
    for (const { model, leader, reversed } of PREPARED) {
      const lead = structureLead({ id: model.id, name: model.name, side: leader, differs: 0, reversed, model });
      expect(lead).not.toMatch(/[{}]|NaN|undefined/);
    }
  });
});
