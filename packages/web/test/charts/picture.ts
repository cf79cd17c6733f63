import { lightPalette } from '../../src/app/theme/palette';
import type { ChartData, Look } from '../../src/charts/scene/chart-data';

/** Text in which every letter is seven pixels wide. */
export const look: Look = { colours: lightPalette, font: 'Lato', measure: (text) => 7 * text.length };

export const size = { width: 640, height: 320 };

/** Two options over cost and power, with a hold and a limit; the second leaves the limits at its size 20. */
export function picture(): ChartData {
  return {
    x: { title: 'Cost', domain: [0, 100], format: (value) => `${value} k€`, whole: false },
    y: { title: 'Power', domain: [0, 1], format: (value) => `${Math.round(100 * value)} %`, whole: false },
    series: [
      {
        id: 'a',
        letter: 'A',
        name: 'Parallel',
        position: 0,
        outlined: false,
        emphasised: true,
        points: [
          { size: 10, x: 20, y: 0.4 },
          { size: 20, x: 40, y: 0.7 },
          { size: 30, x: 60, y: 0.9 },
        ],
        now: { size: 25, x: 50, y: 0.8 },
        end: null,
      },
      {
        id: 'b',
        letter: 'B',
        name: 'Crossover',
        position: 1,
        outlined: true,
        emphasised: false,
        points: [
          { size: 10, x: 50, y: 0.2 },
          { size: 20, x: 70, y: 0.5 },
          { size: 30, x: 90, y: 0.6 },
        ],
        now: { size: 20, x: 70, y: 0.5 },
        end: { size: 20, label: '≤ 20 clusters' },
      },
    ],
    rules: [
      { axis: 'y', at: 0.8, label: 'hold: 80 %', barred: 'below', dashed: false },
      { axis: 'x', at: 80, label: 'over 80 k€', barred: 'above', dashed: true },
    ],
    front: [
      [
        [20, 0.4],
        [40, 0.7],
        [60, 0.9],
      ],
    ],
  };
}
