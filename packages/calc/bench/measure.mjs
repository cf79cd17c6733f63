import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

/** Milliseconds of processor time, the least of a few runs after a warm-up: what other processes do is left out. */
export function milliseconds(work, { runs = 7, warmUps = 3 } = {}) {
  for (let warm = 0; warm < warmUps; warm += 1) work();
  const times = Array.from({ length: runs }, () => {
    const start = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(start);
    return (user + system) / 1000;
  });
  return Math.min(...times);
}

/** The numbers that an R script prints for lines of numbers; undefined where R or a package of it is missing. */
export function inR(script, lines) {
  const path = fileURLToPath(new URL(script, import.meta.url));
  const run = spawnSync('Rscript', [path], {
    input: lines.map((line) => line.join(' ')).join('\n'),
    encoding: 'utf8',
  });
  if (run.status !== 0) return undefined;
  return run.stdout.trim().split(/\s+/).map(Number);
}

export const perSecond = (count, ms) => `${Math.round((1000 * count) / ms).toLocaleString('en-GB')} a second`;

/** One line: what was measured, and whether it keeps to its aim. */
export function report(what, measured, { aim, kept }) {
  console.log(`${kept ? 'kept  ' : 'MISSED'}  ${what}: ${measured} (aim: ${aim})`);
  if (!kept) process.exitCode = 1;
}

export const worstDifference = (ours, theirs) =>
  Math.max(...ours.map((value, index) => Math.abs(value - theirs[index]) / Math.abs(theirs[index])));
