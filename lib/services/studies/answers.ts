/** Rows as the API answers them. */
import type { CountedStudy } from '@/db/queries/study-list';
import type { PositionRow } from '@/db/queries/studies';
import type { PositionAnswer, StudyAnswer } from '@/openapi/schemas/studies';

/** A study as promised. */
export function studyAnswer(row: CountedStudy): StudyAnswer {
  return {
    id: row.id,
    title: row.title,
    summary: row.summary,
    positions: row.positions,
    version: row.version,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
    deletedAt: row.deletedAt?.toISOString() ?? null,
  };
}

/** A position as promised. */
export function positionAnswer(row: PositionRow): PositionAnswer {
  return {
    id: row.id,
    fen: row.fen,
    title: row.title,
    note: row.note,
    marks: row.marks as PositionAnswer['marks'],
    layer: row.layer as PositionAnswer['layer'],
    man: row.man as PositionAnswer['man'],
    version: row.version,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}

/** What history keeps of a study. */
export function studyKept({ title, summary }: Pick<CountedStudy, 'title' | 'summary'>): Record<string, unknown> {
  return { title, summary };
}

/** What history keeps of a position, and what a restore brings back. */
export function positionKept({ fen, title, note, marks, layer, man, order }: PositionRow): Record<string, unknown> {
  return { fen, title, note, marks, layer, man, order };
}
