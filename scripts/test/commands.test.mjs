import process from 'node:process';
import { describe, expect, test } from 'vitest';
import { run, tool } from '../lib/commands.mjs';

const node = (script, options) => run(process.execPath, ['-e', script], options);

describe('a command', () => {
  test('gives its exit code and all that it printed', async () => {
    const result = await node("console.log('out'); console.error('err'); process.exitCode = 3");
    expect(result.code).toBe(3);
    expect(result.output).toContain('out\n');
    expect(result.output).toContain('err\n');
  });

  test('that is not there fails with a message', async () => {
    expect(await run('no-such-command', [])).toMatchObject({
      code: 127,
      output: expect.stringContaining('ENOENT'),
    });
    expect(await tool('no-such-package', [])).toMatchObject({ code: 127 });
  });

  // What it has started holds its output open: a wait that ends shows that all of it has ended.
  test('that never ends is stopped with everything it has started, and has failed', async () => {
    const endless = 'setInterval(() => {}, 1000);';
    const start = `spawn(process.execPath, ['-e', '${endless}'], { stdio: 'inherit' });`;
    const parent = `const { spawn } = require('node:child_process'); ${start} ${endless}`;
    const { code, output } = await node(parent, { minutes: 0.02 });
    expect(code).not.toBe(0);
    expect(output).toContain('not done after 0.02 minutes');
  });
});
