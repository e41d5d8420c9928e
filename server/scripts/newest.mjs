import { existsSync, readdirSync, statSync } from 'node:fs';
import path from 'node:path';

/** Time of the last change below the given files and folders, in milliseconds; 0 when there is nothing. */
export function newestChange(entries) {
  return Math.max(0, ...entries.map((entry) => {
    if (!existsSync(entry)) return 0;
    const stats = statSync(entry);
    if (!stats.isDirectory()) return stats.mtimeMs;
    return newestChange(readdirSync(entry).map((name) => path.join(entry, name)));
  }));
}
