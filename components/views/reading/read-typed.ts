/** What was typed and sent off: a FEN, or a game whose last position is taken. */
import { looksLikeGame, textOf } from './open-position';
import type { Act } from './state';

/** What comes of a text: it is read, or refused with its faults. */
export type ReadAct = Extract<Act, { readonly type: 'read' | 'refused' }>;

/** Reads a FEN at once; a game goes through the library of notations, which is fetched only then. */
export async function readTyped(text: string, act: (act: ReadAct) => void): Promise<void> {
  if (!looksLikeGame(text)) {
    act({ type: 'read', text });
    return;
  }
  const { replayPgn } = await import('@/engine/rules/notation');
  const game = replayPgn(text);
  if (!game.ok) act({ type: 'refused', text, faults: [game.fault] });
  else act({ type: 'read', text: textOf(game.value.positions[game.value.positions.length - 1] ?? game.value.start) });
}
