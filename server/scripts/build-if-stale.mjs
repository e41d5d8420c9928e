import path from 'node:path';
import { existsSync } from 'node:fs';
import { root, run } from './install.mjs';
import { newestChange } from './newest.mjs';

const at = (...names) => names.map((name) => path.join(root, name));

/** Builds what is missing or older than its sources. */
export function buildIfStale() {
  const console_ = path.join(root, 'dist/web/index.html');
  if (!existsSync(console_) || newestChange([console_]) < newestChange(at('web', 'shared', 'package.json'))) {
    console.log('Building the console …');
    run('npm', ['run', '--silent', 'build:web']);
  }
  const server = path.join(root, 'dist/server/main.js');
  if (!existsSync(server) || newestChange([server]) < newestChange(at('server', 'shared', 'package.json'))) {
    console.log('Building the server …');
    run('npm', ['run', '--silent', 'build:server']);
  }
}
