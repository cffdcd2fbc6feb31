/** Boards on which a whole model of the table of structures stands, made from its text by plain means. */
import fc from 'fast-check';
import { manCode, type Position, sq } from '@/engine/board';
import type { StructureModel, StructureSide } from '@/engine/structures';
import { FILES, RANKS, type SquareName } from '@/engine/types';
import { diagram } from './pawn-boards';

/** The squares a token allows, in the order written; a file letter allows its squares from the second to the seventh rank. */
function squaresOf(token: string): SquareName[] {
  return token
    .split('|')
    .flatMap((part) =>
      RANKS.slice(1, 7).flatMap((rank) =>
        FILES.map((file): SquareName => `${file}${rank}`).filter((name) => name === part || name.charAt(0) === part),
      ),
    );
}

/** The pawns of a side of a model, as tokens. */
export const tokensOf = (side: StructureSide) =>
  `${side.core ?? ''} ${side.usual}`.split(' ').filter((token) => token !== '');

/** A random board on which the whole model stands, each pawn on one of its squares. */
function boardsOf(model: StructureModel): fc.Arbitrary<string[]> {
  const pawns = (side: StructureSide, letter: string) =>
    tokensOf(side).map((token) => fc.constantFrom(...squaresOf(token)).map((square) => `${letter}${square}`));
  return fc.tuple(...pawns(model.white, 'P'), ...pawns(model.black, 'p'));
}

/** As `boardsOf`, without boards that contradict the model. */
export const soundBoardsOf = (model: StructureModel) => boardsOf(model).filter((pawns) => isSound(model, pawns));

/** The position of pawns written as `Pd4` for a white one, `pd5` for a black one. */
export function positionOf(pawns: readonly string[]): Position {
  const empty = diagram('8/8/8/8/8/8/8/8 w');
  const board = Uint8Array.from(empty.board);
  for (const pawn of pawns) {
    board[sq(pawn.slice(1) as SquareName)] = manCode(pawn.charAt(0) === 'P' ? 'white' : 'black', 'pawn');
  }
  return { ...empty, board };
}

/** No two pawns on a square, and none on a square that the model wants bare. */
function isSound(model: StructureModel, pawns: readonly string[]): boolean {
  const bare = [...tokensIn(model.white.bare, 'P'), ...tokensIn(model.black.bare, 'p')];
  return (
    new Set(pawns.map((pawn) => pawn.slice(1))).size === pawns.length && !pawns.some((pawn) => bare.includes(pawn))
  );
}

function tokensIn(text = '', letter: string): string[] {
  return text.split(' ').map((token) => `${letter}${token}`);
}
