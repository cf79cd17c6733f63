import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { createServer } from 'node:net';
import { join } from 'node:path';

interface Answer {
  status: number;
  /** The one it sets. */
  cookie: string;
  body: unknown;
}

/** The built server as a process of its own, on a folder that outlives it. */
export class ServerProcess {
  private printed = '';

  private constructor(
    private readonly child: ChildProcess,
    readonly address: string,
  ) {
    for (const stream of [child.stdout, child.stderr]) {
      stream?.on('data', (chunk) => {
        this.printed += chunk;
        child.emit('printed');
      });
    }
  }

  static async start(folder: string): Promise<ServerProcess> {
    const port = await freePort();
    const child = spawn(process.execPath, [join(__dirname, '../../dist/main.js')], {
      env: {
        ...process.env,
        PORT: String(port),
        HOST: '127.0.0.1',
        STEELYARD_DATA: folder,
        STEELYARD_DEMO: 'off',
      },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    const server = new ServerProcess(child, `http://127.0.0.1:${port}`);
    await server.said(/Ready at/);
    return server;
  }

  /** Waits until it has printed this. */
  async said(pattern: RegExp): Promise<RegExpMatchArray> {
    for (;;) {
      const match = this.printed.match(pattern);
      if (match) return match;
      if (this.child.exitCode !== null) throw new Error(`The server ended:\n${this.printed}`);
      await Promise.race([once(this.child, 'printed'), once(this.child, 'exit')]);
    }
  }

  /** Ends it as a power cut would: at once, in the middle of whatever it does. */
  async kill(): Promise<void> {
    const ended = once(this.child, 'exit');
    this.child.kill('SIGKILL');
    await ended;
  }

  /** Null where the server died before it had answered in full. */
  async ask(method: string, path: string, cookie?: string, body?: object): Promise<Answer | null> {
    const headers = { 'Content-Type': 'application/json', ...(cookie && { Cookie: cookie }) };
    try {
      const response = await fetch(`${this.address}/api${path}`, {
        method,
        headers,
        ...(body && { body: JSON.stringify(body) }),
      });
      const [setCookie = ''] = response.headers.getSetCookie();
      return { status: response.status, cookie: setCookie.split(';')[0] ?? '', body: await response.json() };
    } catch {
      return null;
    }
  }
}

async function freePort(): Promise<number> {
  const probe = createServer().listen(0, '127.0.0.1');
  await once(probe, 'listening');
  const { port } = probe.address() as { port: number };
  probe.close();
  await once(probe, 'close');
  return port;
}
