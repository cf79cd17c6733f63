import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import process from 'node:process';
import { fileURLToPath } from 'node:url';

export const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

const verbose = process.argv.includes('--verbose');
const windows = process.platform === 'win32';
const running = new Set();

/**
 * Runs a command to its end, or for `minutes` at most, and keeps what it printed; `--verbose` prints it at once as
 * well. It gets a process group of its own, so that ending it ends what it has started.
 */
export function run(command, args, { env = {}, shell = false, minutes = 30 } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd: root,
      detached: !windows,
      env: { ...process.env, ...env },
      shell,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const keep = (chunk) => {
      output += chunk;
      if (verbose) process.stdout.write(chunk);
    };
    const limit = setTimeout(() => {
      keep(`\nStopped: not done after ${minutes} minutes.\n`);
      end(child, 'SIGKILL');
    }, minutes * 60_000);
    child.stdout.setEncoding('utf8').on('data', keep);
    child.stderr.setEncoding('utf8').on('data', keep);
    track(child);
    child.on('error', ({ message }) => resolve({ code: 127, output: `${output}${message}\n` }));
    child.on('close', (code) => {
      clearTimeout(limit);
      resolve({ code: code ?? 1, output });
    });
  });
}

function end(child, signal) {
  if (windows || child.pid === undefined) child.kill(signal);
  else process.kill(-child.pid, signal);
}

function stopRunning(signal) {
  for (const child of running) end(child, signal);
  process.exit(1);
}

function track(child) {
  const signals = ['SIGINT', 'SIGTERM'];
  if (running.size === 0) for (const signal of signals) process.on(signal, stopRunning);
  running.add(child);
  child.on('close', () => {
    running.delete(child);
    if (running.size === 0) for (const signal of signals) process.off(signal, stopRunning);
  });
}

/** npm as it was called to start this script; else the one on the path, which is a shell script on Windows. */
export function npm(args, options = {}) {
  // A quiet outer npm would silence the inner one, whose messages are wanted when it fails.
  const env = { npm_config_loglevel: 'notice' };
  const called = process.env.npm_execpath;
  if (called?.endsWith('npm-cli.js')) return run(process.execPath, [called, ...args], { ...options, env });
  return run('npm', args, { ...options, env, shell: windows });
}

/** An installed package's command, run by this Node.js: no shell and no path needed. */
export function tool(packageName, args, options) {
  const home = join(root, 'node_modules', packageName);
  if (!existsSync(home)) return Promise.resolve({ code: 127, output: `${packageName} is not installed.\n` });
  const { bin } = JSON.parse(readFileSync(join(home, 'package.json'), 'utf8'));
  const file = typeof bin === 'string' ? bin : Object.values(bin)[0];
  return run(process.execPath, [join(home, file), ...args], options);
}

/** The end of what a command printed, enough to see why it failed. */
export function lastLines(output, count = 40) {
  return output.trimEnd().split('\n').slice(-count).join('\n');
}
