import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { root } from '../../server/scripts/install.mjs';

/** Starts the built demo on a free port with a data folder of its own; resolves once it answers. */
export async function startDemo() {
  const dataDirectory = mkdtempSync(path.join(os.tmpdir(), 'dextral-demo-'));
  const port = await freePort();
  let output = '';
  const server = spawn(process.execPath, ['--enable-source-maps', path.join(root, 'dist/server/main.js'), '--demo'], {
    cwd: root, env: { ...process.env, PORT: String(port), DEXTRAL_DATA_DIR: dataDirectory, DEXTRAL_LOG_LEVEL: 'warn', DEXTRAL_PUBLIC_URL: `http://127.0.0.1:${port}` }, stdio: ['ignore', 'pipe', 'pipe'],
  });
  const ended = new Promise((resolve) => server.on('exit', resolve));
  for (const stream of [server.stdout, server.stderr]) stream.on('data', (text) => { output += text; });
  const url = `http://127.0.0.1:${port}`;
  const deadline = Date.now() + 30_000;
  while (!(await answers(url))) {
    if (server.exitCode !== null || Date.now() > deadline) {
      server.kill('SIGKILL');
      throw new Error(`The demo did not start:\n${output.slice(-4000)}`);
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  const factsFile = path.join(dataDirectory, 'demo.json');
  while (!existsSync(factsFile)) await new Promise((resolve) => setTimeout(resolve, 50));
  const facts = JSON.parse(readFileSync(factsFile, 'utf8'));
  return {
    ...facts, url, dataDirectory, output: () => output,
    async stop() {
      server.kill('SIGTERM');
      await ended;
      rmSync(dataDirectory, { recursive: true, force: true });
    },
  };
}

const answers = (url) => fetch(`${url}/api/v1/health`).then((response) => response.ok, () => false);

function freePort() {
  return new Promise((resolve, reject) => {
    const probe = net.createServer();
    probe.on('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}
