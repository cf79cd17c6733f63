import { spawnSync } from 'node:child_process';
import { performance } from 'node:perf_hooks';
import { fileURLToPath } from 'node:url';
import { appraise, curve } from '../dist/index.js';

const superiority = { hypothesis: 'superiority', alpha: 0.05, sides: 2 };
const solves = Array.from({ length: 2000 }, (_, index) => ({
  difference: 0.15 + 0.0006 * index,
  sd: 1,
  power: [0.8, 0.85, 0.9, 0.95][index % 4],
}));

const twoMeans = ({ difference, sd, power }) => ({
  outcome: { kind: 'continuous', difference, sd },
  test: superiority,
  design: { family: 'parallel' },
  aim: { find: 'size', power },
});

/** Median milliseconds of `work` over a few runs, after a warm-up. */
function medianMs(work, runs = 9) {
  for (let warm = 0; warm < 3; warm += 1) work();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[Math.floor(runs / 2)];
}

function inR() {
  const script = fileURLToPath(new URL('power-t-test.R', import.meta.url));
  const input = solves.map(({ difference, sd, power }) => `${difference} ${sd} ${power}`).join('\n');
  const run = spawnSync('Rscript', [script], { input, encoding: 'utf8' });
  if (run.status !== 0) return undefined;
  const [seconds, ...sizes] = run.stdout.trim().split(/\s+/).map(Number);
  return { seconds, sizes };
}

const requests = solves.map(twoMeans);
const perSecond = (1000 * requests.length) / medianMs(() => requests.forEach(appraise));
console.log(`Two-sample solves: ${Math.round(perSecond).toLocaleString('en-GB')} a second, whole appraisals`);

const reference = inR();
if (reference === undefined) {
  console.log('R is not installed: no comparison with power.t.test.');
} else {
  const inRPerSecond = solves.length / reference.seconds;
  const worst = Math.max(
    ...requests.map((request, index) => {
      const size = reference.sizes[index];
      return Math.abs(appraise(request).unroundedUnits - size) / size;
    }),
  );
  console.log(
    `R power.t.test:    ${Math.round(inRPerSecond).toLocaleString('en-GB')} a second; ` +
      `Steelyard is ${(perSecond / inRPerSecond).toFixed(1)} times as fast (aim 20)`,
  );
  console.log(`                   largest relative difference of the sizes ${worst.toExponential(1)}`);
}

const money = {
  costs: {
    currency: 'EUR',
    fixed: 240_000,
    perMonth: 4200,
    perRecruited: 420,
    perMeasurement: 165,
    perExposure: [54, 168],
  },
  timeline: { startUp: 4, accrualPerMonth: 6.6, followUp: 1.5, period: 1.5, washout: 0.5, closeOut: 3 },
  attrition: { participants: 0.12 },
};
const base = { ...twoMeans({ difference: 1, sd: 2.1, power: 0.9 }), ...money };
const options = [
  base,
  { ...base, outcome: { ...base.outcome, repeated: { baselines: 1, followUps: 1, correlation: 0.55 } } },
  { ...base, outcome: { kind: 'binary', control: 0.4, active: 0.25 } },
  { ...base, design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.6 } },
  { ...base, design: { family: 'cluster', icc: 0.04, clusterSize: 40 } },
  {
    ...base,
    costs: { ...base.costs, perExposure: [54, 168, 180] },
    design: {
      family: 'multi-arm',
      allocation: [1, 1, 1],
      comparisons: { against: 'control', adjust: 'bonferroni', powerGoal: 'per-comparison' },
    },
  },
];
const curves = medianMs(() => {
  for (const option of options) curve(option, { over: 'units', from: 8, to: 408, points: 200 });
});
console.log(`6 options × 200 curve points: ${curves.toFixed(1)} ms (aim 16)`);
