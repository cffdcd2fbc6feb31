/** The OpenAPI document: valid, fresh, and its examples work. */
import { readFileSync } from 'node:fs';
import { compileErrors, validate } from '@readme/openapi-parser';
import { afterAll, describe, expect, it } from 'vitest';
import { contractList } from '@/openapi/contracts';
import { apiDocument } from '@/openapi/document';
import { generatedFiles } from '@/openapi/generate';
import { exampleWorld, renewed } from '@/tests/support/example-world';
import { call, mediaOf, promisedJson, promisedLines } from './caller';

describe('the OpenAPI document', async () => {
  const example = await exampleWorld();
  afterAll(() => example.close());

  it('is valid OpenAPI 3.1', async () => {
    const copy = JSON.parse(JSON.stringify(apiDocument()));
    const result = await validate(copy);
    expect(result.valid ? [] : compileErrors(result)).toEqual([]);
    expect(copy.openapi).toBe('3.1.0');
  });

  it('as committed, with its types, is what `npm run generate` writes', async () => {
    for (const [name, text] of Object.entries(await generatedFiles())) {
      expect(
        readFileSync(`openapi/${name}`, 'utf8') === text,
        `openapi/${name} is stale: run \`npm run generate\``,
      ).toBe(true);
    }
  });

  it('names every call once', () => {
    const ids = contractList.map((contract) => contract.id);
    expect(new Set(ids).size).toBe(ids.length);
    const addresses = contractList.map(({ method, path }) => `${method} ${path}`);
    expect(new Set(addresses).size).toBe(addresses.length);
  });

  it('describes every field of a request and keeps unknown ones out', () => {
    const schemas = (apiDocument().components as { schemas: Record<string, { additionalProperties?: boolean }> })
      .schemas;
    expect(schemas.ReadingRequest?.additionalProperties).toBe(false);
    expect(schemas.BatchRequest?.additionalProperties).toBe(false);
    // Replies promise that fields may be added, so a client may not refuse them.
    expect(schemas.Reading?.additionalProperties).toBeUndefined();
  });

  it.each(contractList.map((contract) => [contract.id, contract] as const))(
    'the example of %s is answered as promised',
    async (_, contract) => {
      const response = await call(contract, {
        ...contract.example,
        headers: await (await renewed(example)).headersFor(contract),
      });
      expect(response.status, await response.clone().text()).toBe(contract.status ?? 200);
      if (contract.reply.form !== 'none') expect(mediaOf(response)).toBe(contract.reply.media);
      if (contract.reply.form === 'json') await promisedJson(contract, response);
      if (contract.reply.form === 'lines') expect(await promisedLines(contract, response)).toHaveLength(3);
    },
  );
});
