/** Every test without a browser: units, the engine against others, goldens, the API, the layers. */
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

export default defineConfig({
  resolve: { alias: [{ find: /^@\//, replacement: root }] },
  test: {
    include: ['tests/**/*.test.{ts,tsx}'],
    testTimeout: 20_000,
  },
});
