import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { appraise, explain } from '../src/index.js';
import { twoMeans } from './requests.js';

const command = fileURLToPath(new URL('../bin/steelyard-calc.js', import.meta.url));

/** Runs the built command; what it reads on standard input comes only after it has started. */
function run(words: string[], input: string): Promise<{ code: number | null; out: string; err: string }> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [command, ...words]);
    let [out, err] = ['', ''];
    child.stdout.on('data', (chunk) => (out += chunk));
    child.stderr.on('data', (chunk) => (err += chunk));
    child.on('close', (code) => resolve({ code, out, err }));
    setTimeout(() => child.stdin.end(input), 300);
  });
}

describe('the command line', () => {
  it('answers a request that comes late on standard input', async () => {
    const { code, out } = await run(['appraise', '-'], JSON.stringify(twoMeans));
    expect([code, JSON.parse(out)]).toEqual([0, appraise(twoMeans)]);
  });

  it('explains, and answers an array with a line each', async () => {
    const { out } = await run(['explain', '-', '--lines'], JSON.stringify([twoMeans, twoMeans]));
    const lines = out
      .trim()
      .split('\n')
      .map((line) => JSON.parse(line));
    expect(lines).toEqual([explain(twoMeans), explain(twoMeans)]);
  });

  it('ends with 2 and the error as JSON where a request is at fault, with its place in an array', async () => {
    const faulty = { ...twoMeans, outcome: { ...twoMeans.outcome, sd: 0 } };
    const { code, out, err } = await run(['appraise', '-'], JSON.stringify([twoMeans, faulty]));
    expect([code, out]).toEqual([2, '']);
    expect(JSON.parse(err)).toMatchObject({ error: { code: 'schema', path: '1.outcome.sd' } });
  });

  it('says so as JSON where the input is none, and where its words are off', async () => {
    const unreadable = await run(['appraise', '-'], 'not json');
    expect([unreadable.code, JSON.parse(unreadable.err).error.code]).toEqual([2, 'schema']);
    const off = await run(['guess', '-'], '');
    expect([off.code, JSON.parse(off.err).error.message]).toEqual([2, expect.stringContaining('Usage')]);
  });
});
