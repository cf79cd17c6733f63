import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, explain } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';
import { against, alike, categories, clusterRates, noWorse, rates, survival } from './requests.js';

const page = (name: string) =>
  readFileSync(new URL(`../../docs/${name}.md`, import.meta.url), 'utf8').replace(/\s+/g, ' ');
const ninety = (request: AppraisalRequest): AppraisalRequest => ({
  ...request,
  aim: { find: 'size', power: 0.9 },
});
const proportions: AppraisalRequest = {
  ...against(twoMeans, 0.1),
  outcome: { kind: 'binary', control: 0.85, active: 0.85, better: 'higher' },
};
const clusterNoWorse: AppraisalRequest = {
  ...noWorse,
  design: { family: 'cluster', icc: 0.04, clusterSize: 25 },
  aim: { find: 'size', power: 0.8 },
};

/** A page, its example and request, and the figures it prints of the working; a percentage is a share in hundredths. */
const examples: [string, string, AppraisalRequest, string[]][] = [
  [
    'outcomes',
    'Time-to-event',
    ninety(survival),
    ['318', '0.04257', '0.02980', '0.5809', '0.4587', '330.6', '330.4', '0.1100', '90.02 %'],
  ],
  ['outcomes', 'Count', ninety(rates), ['250', '1.333', '1.690', '0.1100', '90.03 %']],
  [
    'outcomes',
    'Ordinal',
    ninety(categories),
    ['214', '31.0 %', '49.7 %', '13.4 %', '5.8 %', '0.8542', '0.1812', '0.5878', '90.05 %'],
  ],
  ['margins', 'Non-inferior means', ninety(noWorse), ['133', '1.226', '264', '1.969', '90.15 %']],
  ['margins', 'Non-inferior proportions', ninety(proportions), ['268', '0.03085', '90.01 %']],
  ['margins', 'Equivalent means', ninety(alike), ['88', '1.508', '174', '1.654', '90.29 %']],
  ['cluster', 'Non-inferiority', clusterNoWorse, ['9', '1.96', '1.320', '16', '2.120', '81.2 %']],
  ['cluster', 'Rates', clusterRates, ['17', '0.1204', '32', '81.9 %']],
];

function shows(figure: string, value: number): boolean {
  const [number = '', percent] = figure.split(' ');
  return (percent ? 100 * value : value).toFixed(number.split('.')[1]?.length ?? 0) === number;
}

describe('a worked example of the documentation', () => {
  it.each(examples)('of %s.md, %s, has the numbers of the working', (name, title, request, figures) => {
    const text = page(name);
    const start = text.indexOf(`**${title}.**`);
    const next = text.indexOf('**', start + title.length + 5);
    const example = text.slice(start, next < 0 ? undefined : next);
    const values = explain(request).map((step) => step.value);
    for (const figure of figures) {
      expect(example).toContain(figure.replace(' %', ''));
      expect(
        values.some((value) => shows(figure, value)),
        figure,
      ).toBe(true);
    }
    const { units, power } = feasible(request);
    expect(shows(figures[0] as string, units)).toBe(true);
    expect(shows(figures.at(-1) as string, power)).toBe(true);
  });
});
