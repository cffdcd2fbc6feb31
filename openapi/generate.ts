/** `npm run generate`: writes openapi.json and types.gen.ts from the contracts. */
import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import openapiTS, { astToString, type OpenAPI3 } from 'openapi-typescript';
import { apiDocument } from './document';

/** The generated files as text; in the types a field with a default may be left out, by their name. */
export async function generatedFiles(): Promise<Readonly<Record<'openapi.json' | 'types.gen.ts', string>>> {
  const text = `${JSON.stringify(apiDocument(), null, 2)}\n`;
  const types = astToString(
    await openapiTS(JSON.parse(text) as OpenAPI3, { immutable: true, defaultNonNullable: false }),
  );
  return {
    'openapi.json': text,
    'types.gen.ts': `/** Generated from the contracts by \`npm run generate\`; not written by hand. */\n${types}`,
  };
}

/** Writes the generated files beside this one. */
async function generate(): Promise<void> {
  for (const [name, text] of Object.entries(await generatedFiles())) {
    writeFileSync(fileURLToPath(new URL(name, import.meta.url)), text);
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) await generate();
