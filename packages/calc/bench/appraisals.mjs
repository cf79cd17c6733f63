import { appraise, cheapest, curve } from '../dist/index.js';
import { milliseconds, report } from './measure.mjs';
import { largeWedge, options } from './trial-requests.mjs';

/** Whole appraisals of mixed designs, curves for the canvas, a large wedge, and a search for the cheapest. */
export function appraisals() {
  const many = milliseconds(() => {
    for (let index = 0; index < 10_000; index += 1) appraise(options[index % options.length]);
  });
  report('10 000 appraisals of six mixed options', `${many.toFixed(0)} ms`, {
    aim: '2 000 ms',
    kept: many < 2000,
  });

  const curves = milliseconds(() => {
    for (const option of options) curve(option, { over: 'units', from: 8, to: 408, points: 200 });
  });
  report('6 options × 200 curve points', `${curves.toFixed(1)} ms`, { aim: '16 ms', kept: curves < 16 });

  for (const [name, part] of [
    ['', {}],
    [', with decay', { decay: true }],
    [', with unequal sizes', { clusterSizeCv: 0.5 }],
    [', with both, in a cohort', { decay: true, clusterSizeCv: 0.5, iac: 0.6 }],
  ]) {
    const request = { ...largeWedge, design: { ...largeWedge.design, ...part } };
    const wedge = milliseconds(() => appraise(request));
    report(`a wedge of 12 × 13 solved${name}`, `${wedge.toFixed(2)} ms`, { aim: '5 ms', kept: wedge < 5 });
  }

  const cluster = { ...options[3], costs: { ...options[3].costs, perCluster: 5500 } };
  for (const [name, search] of [
    ['cluster size', { clusterSize: { from: 1, to: 200 } }],
    ['cluster size and allocation', { clusterSize: { from: 1, to: 200 }, allocation: { from: 0.25, to: 4 } }],
  ]) {
    const spent = milliseconds(() => cheapest(cluster, search));
    report(`the cheapest clusters over ${name}`, `${spent.toFixed(1)} ms`, {
      aim: '100 ms',
      kept: spent < 100,
    });
  }
}
