/** Jobs of import: lines of FENs become positions of a study, games of a PGN become its games. */
import { insertChanges } from '@/db/queries/changes';
import type { DoneItem, JobItemRow, JobRow } from '@/db/queries/jobs';
import { insertPositions } from '@/db/queries/studies';
import { touchStudy } from '@/db/queries/study-list';
import { countPositions, lastOrder } from '@/db/queries/study-positions';
import type { Db } from '@/db/client';
import { AppError } from '@/lib/errors';
import { positionKept } from '@/lib/services/studies/answers';
import { keyed } from '@/lib/services/studies/keyed';
import { STUDY_POSITIONS_MAX, TITLE_LENGTH_MAX } from '@/openapi/schemas/studies';
import type { JobKind } from './worker';

/** A line of a list of FENs. A title may follow a tab. */
interface FenLine {
  readonly line: number;
  readonly text: string;
}

interface NewPosition {
  readonly fen: string;
  readonly positionKey: string;
  readonly title: string;
}

/** Imports a lot of lines. A bad line fails with its number in the text, and the good ones are kept. */
export const importJob: JobKind = {
  compute: async ({ now }, job, items) => {
    const done: DoneItem[] = [];
    const made: NewPosition[] = [];
    for (const item of items) {
      const read = lineRead(item);
      done.push(read.item);
      if (read.position) made.push(read.position);
    }
    return { items: done, store: (tx) => keep(tx, job, made, now()) };
  },
};

function lineRead({ number, input }: JobItemRow): { readonly item: DoneItem; readonly position?: NewPosition } {
  const { line, text } = input as FenLine;
  const [fen = '', ...title] = text.split('\t');
  try {
    const position = { ...keyed(fen), title: title.join(' ').trim().slice(0, TITLE_LENGTH_MAX) };
    return { item: { number, state: 'done', output: { line, fen: position.fen } }, position };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return {
      item: { number, state: 'failed', output: { line, error: error.faults[0] ?? { message: error.message } } },
    };
  }
}

async function keep(tx: Db, job: JobRow, made: readonly NewPosition[], at: Date): Promise<void> {
  if (made.length === 0) return;
  const studyId = String(job.input.study);
  if ((await countPositions(tx, studyId)) + made.length > STUDY_POSITIONS_MAX)
    throw new Error(`The study would hold more than ${STUDY_POSITIONS_MAX} positions.`);
  const last = Math.floor(Number((await lastOrder(tx, studyId)) ?? 0));
  const author = { userId: job.createdBy, keyId: job.keyId };
  const rows = await insertPositions(
    tx,
    made.map((position, place) => ({
      ...position,
      studyId,
      order: String(last + place + 1),
      createdBy: job.createdBy,
      createdAt: at,
      updatedAt: at,
    })),
  );
  await touchStudy(tx, studyId, at);
  await insertChanges(
    tx,
    rows.map((row) => ({
      ...author,
      workspaceId: job.workspaceId,
      studyId,
      entity: 'position',
      entityId: row.id,
      version: row.version,
      kind: 'create',
      at,
      before: null,
      after: positionKept(row),
    })),
  );
}
