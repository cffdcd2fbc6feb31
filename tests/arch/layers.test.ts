/** Nothing points back: every import of every file follows an arrow of the table. */
import { describe, expect, it } from 'vitest';
import { ENGINE_ORDER, ENGINE_PACKAGES, engineRank, isAllowed, isWithin, placeOf, SCHEMA } from './arrows';
import { type Import, importsOf, isClient, type Source, sources } from './sources';

const ALL = sources();
const ENGINE = ALL.filter(({ path }) => isWithin(path, 'engine'));

type OwnImport = Import & { readonly target: string };

/** Imports of our own files, as 'from -> to', that a rule does not allow. */
function faults(files: readonly Source[], allows: (path: string, found: OwnImport) => boolean): readonly string[] {
  return files.flatMap(({ path, imports }) =>
    imports.flatMap(({ specifier, target, typeOnly }) =>
      target === undefined || allows(path, { specifier, target, typeOnly }) ? [] : [`${path} -> ${specifier}`],
    ),
  );
}

describe('arrows between folders', () => {
  it('are only those of the table', () => {
    expect(ALL.length).toBeGreaterThan(50);
    expect(faults(ALL, isAllowed)).toEqual([]);
  });

  it.each([
    ['engine/board/fen.ts', "import { env } from '@/lib/env';", false],
    ['engine/board/fen.ts', "import { env } from '../../lib/env';", false],
    ['openapi/document.ts', "import { readFen } from '@/engine';", true],
    ['openapi/document.ts', "export * from '@/lib/env';", false],
    ['db/schema/readings.ts', "import type { Reading } from '@/engine';", true],
    ['db/schema/readings.ts', "import { type Reading, readFen } from '@/engine';", false],
    ['components/plate/layout.ts', "import { readFen } from '@/engine';", true],
    ['components/plate/layout.ts', "import { client } from '@/openapi/client';", true],
    ['components/plate/layout.ts', "import type { Mode } from '@/openapi/schemas/ids';", true],
    ['components/plate/layout.ts', "import { MODES } from '@/openapi/schemas/ids';", false],
    ['components/plate/layout.ts', "import type { Context } from '@/lib/context';", false],
    ['lib/figures/plate.ts', "import { layout } from '@/components/plate/layout';", true],
    ['lib/api/route.ts', "import { layout } from '@/components/plate/layout';", false],
    ['app/page.tsx', "const db = await import('@/db/client');", false],
    ['app/page.tsx', "type Db = import('../db/client').Db;", false],
  ])('%s with %s: %s', (path, text, allowed) => {
    expect(faults([{ path, text, imports: importsOf(path, text) }], isAllowed)).toHaveLength(allowed ? 0 : 1);
  });
});

describe('engine/', () => {
  it('has only folders that the order knows', () => {
    expect(ENGINE.map(({ path }) => path).filter((path) => path !== 'engine/index.ts' && engineRank(path) < 0)).toEqual(
      [],
    );
  });

  it('is read in order: a folder imports only what stands before it', () => {
    const later = (path: string, { target, typeOnly }: OwnImport): boolean =>
      path === 'engine/index.ts' ||
      engineRank(target) <= engineRank(path) ||
      // The vocabulary of the JSON, as types: nothing is left of it at run time.
      (typeOnly && isWithin(target, SCHEMA));
    expect(faults(ENGINE, later)).toEqual([]);
  });

  it('imports a folder by its index, except its own', () => {
    const byIndex = (path: string, { target }: OwnImport): boolean => {
      const [, folder, ...inside] = target.split('/');
      const own = folder === path.split('/')[1] || engineRank(path) < 0;
      return own || inside.length === 0 || inside.join('/') === 'index' || isWithin(target, SCHEMA);
    };
    expect(faults(ENGINE, byIndex)).toEqual([]);
  });

  it('imports itself by relative paths, and packages only through their doors', () => {
    const found = ENGINE.flatMap(({ path, imports }) => imports.map((each) => ({ path, ...each })));
    expect(found.filter(({ specifier }) => specifier.startsWith('@/'))).toEqual([]);
    const packages = found.filter(({ target }) => target === undefined);
    expect(packages.filter(({ path, specifier }) => !path.startsWith(ENGINE_PACKAGES[specifier] ?? 'nowhere'))).toEqual(
      [],
    );
    expect(packages.length).toBeGreaterThan(0);
  });

  it('keeps zod out of the browser: its schemas are imported as types', () => {
    const asTypes = (path: string, { target, typeOnly }: OwnImport): boolean =>
      typeOnly || !isWithin(target, SCHEMA) || isWithin(path, SCHEMA);
    const browser = ALL.filter(({ path }) => ['engine', 'components'].includes(placeOf(path)));
    expect(faults(browser, asTypes)).toEqual([]);
  });

  it('names each folder once in the order', () => {
    expect(new Set(ENGINE_ORDER).size).toBe(ENGINE_ORDER.length);
  });
});

describe('"use client"', () => {
  it('stands in leaves named interactive, and where Next asks for it', () => {
    const elsewhere = ALL.filter(isClient)
      .map(({ path }) => path)
      .filter(
        (path) => !/^components\/(.*\/)?interactive[^/]*\.tsx$/.test(path) && !/^app\/(.*\/)?error\.tsx$/.test(path),
      );
    expect(elsewhere).toEqual([]);
    expect(ALL.filter(isClient).length).toBeGreaterThan(0);
  });
});

describe('the environment', () => {
  it('is read in one place, and by what runs before that place can be loaded', () => {
    const readers = ALL.filter(({ text }) => text.includes('process.env')).map(({ path }) => path);
    // Next leaves out of a bundle what stands behind its own variable, and only when it stands there in these words.
    const known = ['lib/env.ts', 'instrumentation.ts'];
    expect(readers.filter((path) => !known.includes(path) && !/^lib\/cli\/.*\.mjs$/.test(path))).toEqual([]);
    expect(readers).toContain('lib/env.ts');
  });
});
