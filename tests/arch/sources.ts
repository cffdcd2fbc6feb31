/** The project's source files and what each of them imports, read by the compiler's own parser. */
import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';

const ROOT = fileURLToPath(new URL('../..', import.meta.url));
const FOLDERS = ['app', 'components', 'db', 'engine', 'lib', 'openapi'] as const;
const ROOT_FILES = ['proxy.ts', 'instrumentation.ts'] as const;
const SOURCE = /\.(ts|tsx|mjs)$/;

/** One import, export-from or import() of a file. */
export interface Import {
  /** As written: './squares', '@/engine', 'zod'. */
  readonly specifier: string;
  /** Path from the project's folder without ending, for a file of ours; undefined for a package. */
  readonly target: string | undefined;
  /** Nothing of it is left at run time. */
  readonly typeOnly: boolean;
}

export interface Source {
  /** Path from the project's folder. */
  readonly path: string;
  readonly text: string;
  readonly imports: readonly Import[];
}

/** Every source file that is shipped; tests and configuration are not among them. */
export function sources(): readonly Source[] {
  const inFolders = FOLDERS.flatMap((folder) => filesUnder(join(ROOT, folder)));
  const atRoot = ROOT_FILES.map((file) => join(ROOT, file)).filter((file) => ts.sys.fileExists(file));
  return [...inFolders, ...atRoot].map(readSource);
}

/** The imports that a text at a path has. */
export function importsOf(path: string, text: string): readonly Import[] {
  const file = ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true);
  const found: Import[] = [];
  const add = (specifier: ts.Node | undefined, typeOnly: boolean): void => {
    if (specifier === undefined || !ts.isStringLiteral(specifier)) return;
    found.push({ specifier: specifier.text, target: targetOf(path, specifier.text), typeOnly });
  };
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node)) add(node.moduleSpecifier, isTypeImport(node.importClause));
    else if (ts.isExportDeclaration(node)) add(node.moduleSpecifier, node.isTypeOnly);
    else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) add(node.argument.literal, true);
    else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      add(node.arguments[0], false);
    }
    ts.forEachChild(node, visit);
  };
  visit(file);
  return found;
}

/** Whether the file says that it and what it imports run in the browser. */
export function isClient({ path, text }: Source): boolean {
  const first = ts.createSourceFile(path, text, ts.ScriptTarget.Latest).statements[0];
  return (
    first !== undefined &&
    ts.isExpressionStatement(first) &&
    ts.isStringLiteral(first.expression) &&
    first.expression.text === 'use client'
  );
}

function isTypeImport(clause: ts.ImportClause | undefined): boolean {
  if (clause === undefined) return false;
  if (clause.isTypeOnly) return true;
  const named = clause.namedBindings;
  if (clause.name !== undefined || named === undefined || !ts.isNamedImports(named)) return false;
  return named.elements.length > 0 && named.elements.every((element) => element.isTypeOnly);
}

function targetOf(path: string, specifier: string): string | undefined {
  const bare = specifier.replace(SOURCE, '');
  if (bare.startsWith('@/')) return bare.slice(2);
  if (bare.startsWith('.')) return relative(ROOT, resolve(ROOT, dirname(path), bare)).replaceAll('\\', '/');
  return undefined;
}

function filesUnder(folder: string): readonly string[] {
  if (!ts.sys.directoryExists(folder)) return [];
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => SOURCE.test(name))
    .map((name) => join(folder, name));
}

function readSource(file: string): Source {
  const path = relative(ROOT, file).replaceAll('\\', '/');
  const text = readFileSync(file, 'utf8');
  return { path, text, imports: importsOf(path, text) };
}
