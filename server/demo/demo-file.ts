import { readFile, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Role } from '#shared/api/roles.ts';

/** What the demo tells scripts and people: kept beside the database, readable by its owner only. */
export interface DemoFile {
  readonly url: string;
  readonly accounts: readonly { readonly email: string; readonly password: string; readonly role: Role }[];
  readonly keys: readonly { readonly role: Role; readonly secret: string }[];
}

const fileIn = (dataDirectory: string) => path.join(dataDirectory, 'demo.json');

export async function readDemoFile(dataDirectory: string): Promise<DemoFile | null> {
  try {
    return JSON.parse(await readFile(fileIn(dataDirectory), 'utf8')) as DemoFile;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}

/** Replaces the file in one step, so that nobody reads half of it. */
export async function writeDemoFile(dataDirectory: string, facts: DemoFile): Promise<void> {
  const temporary = `${fileIn(dataDirectory)}.new`;
  await writeFile(temporary, `${JSON.stringify(facts, null, 2)}\n`, { mode: 0o600 });
  await rename(temporary, fileIn(dataDirectory));
}
