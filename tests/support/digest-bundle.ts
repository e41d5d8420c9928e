import { build } from 'esbuild';

/** tests/support/digest.ts and the core with it as one script that defines `core`, for any engine. */
export async function digestBundle(): Promise<string> {
  const { outputFiles } = await build({ entryPoints: ['tests/support/digest.ts'], bundle: true, format: 'iife', globalName: 'core', write: false, target: 'es2022' });
  return outputFiles[0]!.text;
}
