/** THE table of arrows: what each folder may import. `layers.test.ts` fails on any other import. */
import type { Import } from './sources';

/** One arrow: to a folder (or file) of ours, perhaps for types only, perhaps from a part of the folder only. */
interface Arrow {
  readonly to: string;
  readonly from?: string;
  readonly typesOnly?: true;
}

/** A folder may always import itself. Packages are bounded where the house says so. */
export const ARROWS: Readonly<Record<string, readonly Arrow[]>> = {
  engine: [],
  openapi: [{ to: 'engine' }],
  db: [{ to: 'engine', typesOnly: true }],
  components: [{ to: 'engine' }, { to: 'openapi/client' }, { to: 'openapi', typesOnly: true }],
  lib: [{ to: 'engine' }, { to: 'openapi' }, { to: 'db' }, { to: 'components/plate', from: 'lib/figures' }],
  app: [{ to: 'components' }, { to: 'lib' }, { to: 'openapi' }, { to: 'engine' }],
  'proxy.ts': [{ to: 'lib' }],
  'instrumentation.ts': [{ to: 'lib' }],
};

/** The folders of engine/ in reading order: each imports only those before it. The first two are files that all may import. */
export const ENGINE_ORDER = [
  'types',
  'result',
  'board',
  'rules',
  'attacks',
  'exchange',
  'reach',
  'pawns',
  'structures',
  'squares',
  'files',
  'men',
  'tactics',
  'posts',
  'routes',
  'explain',
  'reading',
  'compare',
  'games',
] as const;

/** Packages that engine/ may import, each with the one place that may. */
export const ENGINE_PACKAGES: Readonly<Record<string, string>> = {
  zod: 'engine/reading/schema/',
  'chess.js': 'engine/rules/',
};

/** The JSON's vocabulary has the types of a reading for all; what it has at run time (zod) never reaches the browser. */
export const SCHEMA = 'engine/reading/schema';

/** Whether a path is a folder's own or inside it. */
export function isWithin(path: string, folder: string): boolean {
  return path === folder || path.startsWith(`${folder}/`);
}

/** The name by which the table knows a file's place: its top folder, or the file itself at the root. */
export function placeOf(path: string): string {
  return path.split('/')[0] ?? path;
}

/** Whether the table has an arrow from the file at `path` along this import of ours. */
export function isAllowed(path: string, { target, typeOnly }: Import & { readonly target: string }): boolean {
  const place = placeOf(path);
  if (isWithin(target, place)) return true;
  return (ARROWS[place] ?? []).some(
    ({ to, from = place, typesOnly }) => isWithin(target, to) && isWithin(path, from) && (typeOnly || !typesOnly),
  );
}

/** A path's place in the engine's order; -1 for engine/index and whatever the order does not know. */
export function engineRank(path: string): number {
  return ENGINE_ORDER.indexOf((path.split('/')[1] ?? '').replace(/\.ts$/, '') as (typeof ENGINE_ORDER)[number]);
}
