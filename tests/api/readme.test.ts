/** What the README shows is what the service answers. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { contracts } from '@/openapi/contracts';
import { call } from './caller';

it('the README’s request gives the README’s answer', async () => {
  const readme = readFileSync('README.md', 'utf8');
  const body = /-d '(\{.*\})'/.exec(readme)?.[1] ?? '';
  const answer = /```json\n([\s\S]*?)```/.exec(readme)?.[1] ?? '';
  const response = await call(contracts.createReading, { body: JSON.parse(body) });
  expect(await response.json()).toEqual(JSON.parse(answer));
});
