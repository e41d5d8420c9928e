import { spawn } from 'node:child_process';
import path from 'node:path';
import { buildIfStale } from './build-if-stale.mjs';
import { installPackages, root } from './install.mjs';

/** Everything from a bare checkout to a running demo: install, build, then one process that seeds itself and serves. */
installPackages();
buildIfStale();
const server = spawn(process.execPath, ['--enable-source-maps', path.join(root, 'dist/server/main.js'), '--demo'], {
  stdio: 'inherit', env: { DEXTRAL_LOG_LEVEL: 'warn', ...process.env },
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
