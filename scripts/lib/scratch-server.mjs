import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import process from 'node:process';
import { setTimeout as pause } from 'node:timers/promises';
import { root } from './commands.mjs';

const secondsToStart = 60;

/** The built application on a free port, with data of its own in the system's temporary folder. */
export class ScratchServer {
  /** Everything the server has printed, over all its lives. */
  output = '';
  #environment;
  #child;

  constructor(port, data, settings) {
    this.origin = `http://127.0.0.1:${port}`;
    this.data = data;
    this.#environment = { HOST: '127.0.0.1', PORT: String(port), STEELYARD_DATA: data, ...settings };
  }

  static async start(settings = {}) {
    const data = await mkdtemp(join(tmpdir(), 'steelyard-scratch-'));
    const server = new ScratchServer(await freePort(), data, settings);
    await server.launch();
    return server;
  }

  /** Starts it on the port and the data it was made with. */
  async launch() {
    const child = spawn(process.execPath, [join(root, 'packages/api/dist/main.js')], {
      env: { ...process.env, ...this.#environment },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    this.#child = child;
    for (const stream of [child.stdout, child.stderr]) {
      stream.setEncoding('utf8').on('data', (text) => {
        this.output += text;
      });
    }
    for (let tries = 0; tries < secondsToStart * 10 && child.exitCode === null; tries += 1) {
      const answer = await fetch(`${this.origin}/api/health`).catch(() => null);
      if (answer?.ok) return;
      await pause(100);
    }
    await this.stop();
    throw new Error(`The server did not start:\n${this.output}`);
  }

  /** Ends it as a power cut would, with no chance to tidy up; its data stay. */
  async kill() {
    await this.#end('SIGKILL');
  }

  async stop() {
    await this.#end('SIGTERM');
    await rm(this.data, { recursive: true, force: true });
  }

  async #end(signal) {
    const child = this.#child;
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill(signal);
    await once(child, 'exit');
  }
}

async function freePort() {
  const probe = createServer().listen(0, '127.0.0.1');
  await once(probe, 'listening');
  const { port } = probe.address();
  probe.close();
  await once(probe, 'close');
  return port;
}
