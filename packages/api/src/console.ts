import type { LogLevel } from '@nestjs/common';
import { readSettings, type Settings, SettingsError } from './settings/settings.js';

/** What of Nest's own messages is printed once the server is up; what people should read is said here. */
export const logLevels: LogLevel[] = ['fatal', 'error', 'warn'];

export function say(line: string): void {
  process.stdout.write(`${line}\n`);
}

/** Where people reach the server from this machine, or from anywhere where the settings say so. */
export function addressOf({ url, host, port }: Settings): string {
  if (url) return url;
  const here = ['127.0.0.1', '0.0.0.0', '::'].includes(host);
  const name = here ? 'localhost' : host.includes(':') ? `[${host}]` : host;
  return `http://${name}:${port}`;
}

/** Does the work of a process with its settings; where that fails, says why and ends it. */
export async function runProcess(work: (settings: Settings) => Promise<void>): Promise<void> {
  let settings: Settings | null = null;
  try {
    settings = readSettings(process.env);
    await work(settings);
  } catch (error) {
    for (const line of reasons(error, settings)) process.stderr.write(`${line}\n`);
    process.exit(1);
  }
}

/** One sentence where the cause is a known one. */
function reasons(error: unknown, settings: Settings | null): string[] {
  if (error instanceof SettingsError) return error.sentences;
  const { code } = (error ?? {}) as { code?: unknown };
  const known = settings && typeof code === 'string' && sentenceFor(code, settings);
  if (known) return [known];
  return [error instanceof Error ? (error.stack ?? error.message) : String(error)];
}

function sentenceFor(code: string, { port, host, database }: Settings): string | undefined {
  const sentences: Record<string, string> = {
    EADDRINUSE: `Port ${port} of ${host} is in use: stop what uses it, or set PORT to another number.`,
    EADDRNOTAVAIL: `This machine has no address ${host}: set HOST to one it has, such as 127.0.0.1.`,
    ENOTFOUND: `This machine has no address ${host}: set HOST to one it has, such as 127.0.0.1.`,
    EACCES: `Port ${port} of ${host} may not be used by this account: set PORT to a number above 1023.`,
    SQLITE_NOTADB: `The file ${database} is not a database of SQLite: set STEELYARD_DATA to another folder.`,
    SQLITE_READONLY: `The database ${database} may not be written to by this account.`,
    SQLITE_CANTOPEN: `The database ${database} cannot be opened: set STEELYARD_DATA to a folder where it can.`,
  };
  return sentences[code];
}
