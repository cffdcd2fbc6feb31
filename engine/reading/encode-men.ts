/** Men, kings, files and diagonals as JSON. */
import { type AttackMap, menOfMask } from '../attacks';
import { fileName, squareName } from '../board';
import type { DiagonalValue, FileValue } from '../files';
import type { KingValue, ManValue } from '../men';
import { opponent } from '../types';
import { names, namesBySide } from './encode-squares';
import type { Reading } from './schema';

/** The men in square order. */
export function encodeMen(map: AttackMap, men: readonly ManValue[]): Reading['men'] {
  return men.map((man) => ({
    square: squareName(man.square),
    side: man.side,
    kind: man.kind,
    moves: names(man.moves),
    safeMoves: names(man.safeMoves),
    sees: man.sees,
    seesAhead: man.seesAhead,
    pinned: man.pinned,
    enPrise: man.enPrise,
    attackers: names(menOfMask(map, opponent(man.side), man.attackers)),
    defenders: names(menOfMask(map, man.side, man.defenders)),
    duties: man.duties.map(({ square, loses, by }) => ({ square: squareName(square), loses, by })),
    trapped: man.trapped,
    notes: [...man.notes],
  }));
}

/** A king, null where a diagram has none. */
export function encodeKing(king: KingValue | null): Reading['kings']['white'] {
  return (
    king && {
      square: squareName(king.square),
      shelter: king.shelter.map(({ file, pawn, advanced }) => ({
        file: fileName(file),
        pawn: pawn === null ? null : squareName(pawn),
        advanced,
      })),
      openBeside: king.openBeside.map(fileName),
      reachedBy: names(king.reachedBy),
      guardedBy: names(king.guardedBy),
      flights: names(king.flights),
      luft: names(king.luft),
      luftMoves: king.luftMoves.map(({ from, to }) => ({ from: squareName(from), to: squareName(to) })),
      weakBackRank: king.weakBackRank,
    }
  );
}

/** The eight files. */
export function encodeFiles(files: readonly FileValue[]): Reading['files'] {
  return files.map(({ file, status, halfOpenFor, heavy, control, entries, targets }) => ({
    file: fileName(file),
    status,
    halfOpenFor,
    heavy: namesBySide(heavy),
    control,
    entries: namesBySide(entries),
    targets: targets.map(({ square, side }) => ({ square: squareName(square), side })),
  }));
}

/** The diagonals of bishops and queens. */
export function encodeDiagonals(diagonals: readonly DiagonalValue[]): Reading['diagonals'] {
  return diagonals.map(({ from, direction, squares, stoppedBy, stopperFixed }) => ({
    from: squareName(from),
    direction,
    squares: names(squares),
    stoppedBy: stoppedBy === null ? null : squareName(stoppedBy),
    stopperFixed,
  }));
}
