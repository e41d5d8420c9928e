import { existsSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** A file of the project, wherever this module was built to: upwards from here to package.json. */
export function projectFile(relative: string): string {
  let directory = path.dirname(fileURLToPath(import.meta.url));
  while (!existsSync(path.join(directory, 'package.json'))) {
    const parent = path.dirname(directory);
    if (parent === directory) throw new Error('package.json is not above this program');
    directory = parent;
  }
  return path.join(directory, relative);
}
