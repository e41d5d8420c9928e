import { spawnSync } from 'node:child_process';
import { existsSync, statSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** Runs a command in the project's folder, its output shown; ends this program when the command fails. */
export function run(command, args, environment = {}) {
  const { status, error } = spawnSync(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...environment } });
  if (error) throw error;
  if (status !== 0) process.exit(status ?? 1);
}

/** Installs the packages unless what is installed is what package-lock.json says. */
export function installPackages() {
  const installed = path.join(root, 'node_modules/.package-lock.json');
  const wanted = path.join(root, 'package-lock.json');
  if (existsSync(installed) && statSync(installed).mtimeMs >= statSync(wanted).mtimeMs) return;
  console.log('Installing packages (about two minutes the first time: SQLite is compiled) …');
  run('npm', ['ci', '--no-audit', '--no-fund']);
}
