/**
 * Writes the tables and the straight-line kernels of shared/attitude: `npm run generate`.
 * The files are committed, and a test compares them with what this would write.
 */
import { writeFileSync } from 'node:fs';
import { generatedFiles } from './generated-files.ts';

for (const [path, source] of generatedFiles()) {
  writeFileSync(new URL(`../attitude/${path}`, import.meta.url), source);
  console.log(`shared/attitude/${path}`);
}
