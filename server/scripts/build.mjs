import path from 'node:path';
import { build } from 'esbuild';
import { root } from './install.mjs';

/** Builds the server to plain JavaScript: its own code in a few files, packages left where npm put them. */
await build({
  absWorkingDir: root,
  entryPoints: { main: 'server/main.ts', 'cross-check-worker': 'server/cross-check/worker.ts', 'identification-worker': 'server/identification/worker.ts', 'batch-worker': 'server/streaming/worker.ts' },
  outdir: path.join(root, 'dist/server'),
  bundle: true,
  splitting: true,
  format: 'esm',
  platform: 'node',
  target: 'node20',
  packages: 'external',
  sourcemap: true,
  logLevel: 'warning',
  chunkNames: 'chunks/[name]-[hash]',
});
