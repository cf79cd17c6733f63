import { appraise } from '../dist/index.js';
import { inR, milliseconds, perSecond, report, worstDifference } from './measure.mjs';

/** Whole appraisals that find the size of a two-sample t test, beside power.t.test. */
export function twoSample() {
  const solves = Array.from({ length: 2000 }, (_, index) => [
    0.15 + 0.0006 * index,
    1,
    [0.8, 0.85, 0.9, 0.95][index % 4],
  ]);
  const requests = solves.map(([difference, sd, power]) => ({
    outcome: { kind: 'continuous', difference, sd },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    design: { family: 'parallel' },
    aim: { find: 'size', power },
  }));
  const ours = milliseconds(() => requests.forEach(appraise));
  console.log(`        two-sample solves: ${perSecond(solves.length, ours)}, whole appraisals`);

  const [seconds, ...sizes] = inR('power-t-test.R', solves) ?? [];
  if (seconds === undefined) {
    console.log('        R is not installed: no comparison with power.t.test');
    return;
  }
  const times = (1000 * seconds) / ours;
  const difference = worstDifference(
    requests.map((request) => appraise(request).unroundedUnits),
    sizes,
  );
  report('two-sample solves beside power.t.test', `${times.toFixed(1)} × as fast`, {
    aim: '20 ×',
    kept: times >= 20,
  });
  report('largest relative difference of the sizes', difference.toExponential(1), {
    aim: '1e-8',
    kept: difference < 1e-8,
  });
}
