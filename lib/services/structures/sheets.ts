/** Structure sheets as the engine has them. */
import { encodeSheets } from '@/engine';
import type { StructureSheetJson, StructuresAnswer } from '@/engine/reading/schema/sheets';
import { AppError } from '@/lib/errors';

let made: StructuresAnswer | undefined;

/** Every sheet, made once a process. */
export function listSheets(): StructuresAnswer {
  made ??= encodeSheets();
  return made;
}

/** The sheet of one structure. Throws `not-found` for an id that no structure has. */
export function structureSheet(id: string): StructureSheetJson {
  const found = listSheets().structures.find((sheet) => sheet.id === id);
  if (!found) throw new AppError('not-found', `There is no structure of the id "${id}".`);
  return found;
}
