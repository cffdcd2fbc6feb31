/** Bundles the bench as the application is bundled, and runs it: plain transpiling would slow the engine down and measure that. */
import { pathToFileURL } from 'node:url';
import { build } from 'vite';

const root = process.cwd();
const outDir = `${root}/node_modules/.cache/waypost-bench`;
await build({
  configFile: false,
  logLevel: 'error',
  root,
  resolve: { alias: { '@': root } },
  build: {
    ssr: 'tests/bench/index.ts',
    outDir,
    emptyOutDir: true,
    target: 'node20',
    minify: false,
    rollupOptions: { output: { entryFileNames: 'index.mjs', chunkFileNames: '[name].mjs' } },
  },
});
await import(pathToFileURL(`${outDir}/index.mjs`).href);
