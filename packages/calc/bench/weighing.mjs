import { weigh } from '../dist/index.js';
import { milliseconds, report } from './measure.mjs';

const plan = (family, structure, clusterSize) => ({
  family,
  treatments: [0, 1],
  structure,
  overrides: {},
  ...(clusterSize === undefined ? {} : { clusterSize }),
});
const study = {
  question: {
    outcome: { kind: 'continuous', difference: 3 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  },
  ledger: [
    { key: 'sd', family: null, value: 13 },
    { key: 'icc', family: null, value: 0.04 },
    { key: 'iccSubcluster', family: null, value: 0.06 },
    { key: 'clusterAutocorrelation', family: null, value: 0.85 },
    { key: 'clusterSizeCv', family: null, value: 0.35 },
  ],
  costs: {
    costs: {
      currency: 'EUR',
      fixed: 240_000,
      perMonth: 4200,
      perCluster: 5500,
      perClusterPeriod: [900, 4700],
      perMeasurement: 22,
    },
    timeline: { startUp: 8, accrualPerClusterPerMonth: 40, followUp: 4, period: 4, closeOut: 4 },
  },
  hold: { kind: 'power', power: 0.8 },
  options: [
    plan('cluster', {}, 40),
    plan('cluster', { allocation: [2, 1] }, 30),
    plan('cluster-baseline', {}, 40),
    plan('cluster-crossover', {}, 40),
    plan('stepped-wedge', { steps: 4 }, 25),
    plan('three-level-cluster', { subclusterSize: 10, subclustersPerCluster: 4 }),
  ].map((option, index) => ({ id: String(index), name: option.family, plan: option })),
};

/** Six options against limits that all of them break, so that each is searched for its smallest relaxation. */
export function weighing() {
  for (const limits of [
    { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 },
    { clusters: 10, participantsPerCluster: 60, money: 400_000, months: 14 },
  ]) {
    const spent = milliseconds(() => weigh({ ...study, limits }), { warmUps: 20 });
    const names = Object.entries(limits).map(([limit, most]) => `${limit} ${most}`);
    report(`six options weighed against ${names.join(', ')}`, `${spent.toFixed(1)} ms`, {
      aim: '16 ms',
      kept: spent < 16,
    });
  }
}
