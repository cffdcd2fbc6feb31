/** A study taken along, whole. */
import { gamesOf } from '@/db/queries/games';
import { resultsOf } from '@/db/queries/results';
import { positionsOf } from '@/db/queries/studies';
import { writePgn } from '@/engine/games';
import type { Context } from '@/lib/context';
import { resultAnswer } from '@/lib/services/results/results';
import type { ResultAnswer } from '@/openapi/schemas/results';
import { RESULT_KINDS } from '@/openapi/schemas/results';
import type { PositionAnswer, StudyAnswer } from '@/openapi/schemas/studies';
import { readableStudy } from './access';
import { positionAnswer, studyAnswer } from './answers';

interface Wanted {
  readonly id: string;
}

/** Everything in a study. */
export async function exportJson(
  ctx: Context,
  { id }: Wanted,
): Promise<{ study: StudyAnswer; positions: PositionAnswer[]; results: ResultAnswer[]; games: string[] }> {
  const { study } = await readableStudy(ctx, id);
  const results = [];
  for (const kind of RESULT_KINDS) results.push(...(await resultsOf(ctx.db, id, kind)));
  return {
    study: studyAnswer(study),
    positions: (await positionsOf(ctx.db, id)).map(positionAnswer),
    results: results.map(resultAnswer),
    games: (await gamesOf(ctx.db, id)).map(({ pgn }) => pgn),
  };
}

/** Positions as games without moves (PGN Standard 9.7), then the games. */
export async function exportPgn(ctx: Context, wanted: Wanted): Promise<string> {
  const { study, positions, games } = await exportJson(ctx, wanted);
  const written = positions.map(({ fen, title, note }) =>
    writePgn({
      tags: { Event: title || study.title, SetUp: '1', FEN: fen },
      comments: note === '' ? [] : [note],
      moves: [],
      result: '*',
      first: { fullmove: Number(fen.split(' ')[5] ?? 1), side: fen.split(' ')[1] === 'b' ? 'black' : 'white' },
    }),
  );
  return [...written, ...games.map((pgn) => `${pgn.trim()}\n\n`)].join('');
}

const HEADS = ['place', 'title', 'fen', 'layer', 'man', 'note'];

/** One line a position (RFC 4180). A cell that a spreadsheet would take for a formula gets an apostrophe before it. */
export async function exportCsv(ctx: Context, { id }: Wanted): Promise<string> {
  await readableStudy(ctx, id);
  const rows = (await positionsOf(ctx.db, id)).map(({ title, fen, layer, man, note }, place) => [
    String(place + 1),
    title,
    fen,
    layer ?? '',
    man ?? '',
    note,
  ]);
  return [HEADS, ...rows].map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}

function cell(text: string): string {
  const harmless = /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}
