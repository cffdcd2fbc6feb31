/**
 * Every statement of real positions, counted again by plain code on a board of letters that shares nothing with the
 * engine. STATEMENTS_POSITIONS says how many of the 20,000 positions; 300 unless said.
 */
import { expect, it } from 'vitest';
import { readFen } from '@/engine';
import type { FactId } from '@/engine/explain';
import { SlowBoard } from '../support/recount/board';
import { type Checker, claimsOf } from '../support/recount/checker';
import { MEN_CHECKS } from '../support/recount/men';
import { PAWN_CHECKS } from '../support/recount/pawns';
import { SQUARE_CHECKS } from '../support/recount/squares';
import { realPositions } from '../support/real-positions';

const CHECKS: Readonly<Record<string, Checker>> = { ...PAWN_CHECKS, ...SQUARE_CHECKS, ...MEN_CHECKS };
const POSITIONS = Number(process.env.STATEMENTS_POSITIONS ?? 300);

it(`no statement of ${POSITIONS} positions of real games is false`, { timeout: 3_600_000 }, () => {
  const wrong: string[] = [];
  const seen = new Map<FactId | string, number>();
  for (const fen of realPositions(POSITIONS)) {
    const reading = readFen(fen);
    if (!reading.ok) throw new Error(`${fen}: ${reading.fault[0].message}`);
    const board = new SlowBoard(fen);
    for (const statement of reading.value.statements) {
      seen.set(statement.id, (seen.get(statement.id) ?? 0) + 1);
      const checker = CHECKS[statement.id];
      if (!checker) throw new Error(`no checker for ${statement.id}`);
      const faults = checker(board, claimsOf(statement)).filter((each) => each !== false);
      if (faults.length > 0) wrong.push(`${fen} | ${statement.text} | ${faults.join('; ')}`);
    }
  }
  expect(seen.size).toBeGreaterThan(50);
  expect(wrong).toEqual([]);
});
