import { existsSync } from 'node:fs';
import path from 'node:path';
import { root } from './install.mjs';

/** The production start: what npm run build made, and nothing else. */
const main = path.join(root, 'dist/server/main.js');
if (!existsSync(main)) {
  console.error('Dextral has not been built: npm ci && npm run build.');
  process.exit(2);
}
await import(main);
